import { expect, test } from 'vitest';
import { withCapital } from '../../../src/chat/replies/capital.ts';
import { expressionText, resultText, shortExpression } from '../../../src/chat/replies/working-text.ts';

test.each([
  ['0.8 mg/L * (10^(3.58 - 1.81) + 1)', '0,8 mg/L × (10^(3,58 − 1,81) + 1)'],
  ['6 g / (2 L)', '6 g ÷ (2 L)'],
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
  ['47.91 mg/L - 21 mg/L', 'mg/L', '47.91 - 21'],
  ['20 mg/L / (1 - 1 / 3)', 'mg/L', '20 / (1 - 1 / 3)'],
  ['57.6 g / (20 hL)', 'mg/L', '57.6 g / (20 hL)'],
  ['15 mg/L * 40 hL', 'g', '15 mg/L * 40 hL'],
])('shortExpression() leaves the unit out of %s only where all is %s', (expression, unit, text) => {
  expect(shortExpression(expression, unit)).toBe(text);
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
