import { expect, test } from 'vitest';
import { withCapital } from '../../../src/chat/replies/capital.ts';
import { expressionText, resultText, shortExpression } from '../../../src/chat/replies/working-text.ts';

test.each([
  ['0.8 mg/L * (10^(3.58 - 1.81) + 1)', '0,8 mg/L × (10^(3,58 − 1,81) + 1)'],
  ['6 g / (2 L)', '6 g ÷ 2 L'],
  ['1450 galUS * 3.78541 L/galUS', '1_450 gal × 3,78541'],
  ['26.91 mg/L * 5488.8 L / (1000 mg/g)', '26,91 mg/L × 5_488,8 L ÷ 1_000'],
  ['26.91 mg/L * 1450 galUS', '26,91 mg/L × 1_450 gal'],
  ['5 mg/L * 20 galUK', '5 mg/L × 20 imp gal'],
  ['0.4497 g / (0.44 g * 0.57629)', '0,4497 g ÷ (0,44 g × 0,57629)'],
])('expressionText() writes %s as %s', (expression, text) => {
  expect(expressionText(expression, ',').replaceAll('\u202f', '_')).toBe(text);
});

test('expressionText() keeps every digit of a figure, so that anyone can reckon after it', () => {
  expect(expressionText('0.0001234567 g * 0.57629', '.')).toBe('0.0001234567 g × 0.57629');
  expect(expressionText('0.00000012 g / 3', '.')).toBe('0.00000012 g ÷ 3');
});

test.each([
  ['47.91 mg/L - 21 mg/L', '47.91 - 21'],
  ['20 mg/L / (1 - 1 / 3)', '20 / (1 - 1 / 3)'],
  ['57.6 g * 1000 mg/g / (2000 L)', '57.6 * 1000 / 2000'],
  ['15 mg/L * (4000 L / 2) / (1000 mg/g)', '15 * (4000 / 2) / 1000'],
  ['75 g / (15 g / (100 mL))', '75 g / (15 g / (100 mL))'],
])('shortExpression() leaves the units of %s out where mg/L is among them', (expression, text) => {
  expect(shortExpression(expression)).toBe(text);
});

test('a working says ppm where the person wrote ppm', () => {
  expect(expressionText('47.9 mg/L - 21 mg/L', '.', 'ppm')).toBe('47.9 ppm − 21 ppm');
  expect(resultText({ value: 26.9, unit: 'mg/L' }, '.', 'ppm')).toBe('26.9 ppm');
});

test('resultText() writes a number with its unit, and a bare one without', () => {
  expect([
    resultText({ value: 256.3, unit: 'g' }, ','),
    resultText({ value: 1.773, unit: '' }, '.'),
    resultText({ value: 1450, unit: 'galUS' }, '.'),
  ]).toEqual(['256,3 g', '1.773', '1\u202f450 gal']);
});

test.each([
  ['nothing to add.', 'Nothing to add.'],
  ['élevage', 'Élevage'],
  ['⚠ ventilate', '⚠ Ventilate'],
  ['pH 3.5', 'pH 3.5'],
  ['a) powder', 'a) powder'],
  ['m = 256 g', 'm = 256 g'],
  ['12 g', '12 g'],
  ['', ''],
])('withCapital() writes %s as %s', (text, capital) => {
  expect(withCapital(text)).toBe(capital);
});
