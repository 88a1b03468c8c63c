import { expect, test } from 'vitest';
import { readOptions } from '../../../src/edge/ask/options.ts';
import { OperatorError } from '../../../src/edge/operator-error.ts';

test('a message stands on the command line, in one piece or several', () => {
  expect(readOptions(['T4 40 hl pH 3.4', 'free 15'])).toMatchObject({
    jsonl: false,
    text: 'T4 40 hl pH 3.4 free 15',
  });
});

test.each([
  [['--language', 'es'], { language: 'es' }],
  [['--basis', 'oiv'], { basis: 'oiv' }],
  [['--additive', 'sodium-metabisulfite'], { usualAdditive: 'sodium-metabisulfite' }],
  [['--units', 'us'], { volumeUnit: 'galUS', gallon: 'US', temperatureUnit: 'F' }],
  [['--units=imperial'], { volumeUnit: 'galUK', gallon: 'imperial' }],
  [['--region', 'eu'], { region: 'eu' }],
  [['--region=OIV'], { region: 'oiv' }],
  [
    [],
    {
      region: 'oiv',
      language: 'en',
      basis: 'pk-1.81',
      usualAdditive: 'potassium-metabisulfite',
      volumeUnit: 'L',
    },
  ],
])('options become settings: %j', (options, settings) => {
  expect(readOptions(['--jsonl', ...options]).settings).toMatchObject(settings);
});

test.each([
  [['--data', 'a.db', 'hi'], { data: 'a.db', text: 'hi' }],
  [['--data=a.db', '--jsonl'], { data: 'a.db', jsonl: true }],
  [['--data', 'a.db', '--log'], { data: 'a.db', print: 'log' }],
  [['--vessels', '--data', 'a.db'], { data: 'a.db', print: 'vessels' }],
])('a file is answered on, or printed: %j', (args, options) => {
  expect(readOptions(args)).toMatchObject(options);
});

test.each([
  [['--colour', 'hi']],
  [['--language', 'xx', 'hi']],
  [['--basis', 'mine', 'hi']],
  [['--additive', 'sulfur-dioxide-solution', 'hi']],
  [['--units', 'cups', 'hi']],
  [['--language']],
  [[]],
  [['--jsonl', 'hi']],
  [['--data', 'a.db']],
  [['--data', ' ', 'hi']],
  [['--log']],
  [['--data', 'a.db', '--log', '--vessels']],
  [['--data', 'a.db', '--log', 'hi']],
  [['--data', 'a.db', '--jsonl', '--vessels']],
])('what there is not is refused with a sentence: %j', (args) => {
  expect(() => readOptions(args)).toThrow(OperatorError);
});

test('a market that is not on file is told with all that are', () => {
  expect(() => readOptions(['--region', 'atlantis', 'hi'])).toThrow(
    /--region must be one of oiv, eu, uk, us, ca,/,
  );
});

test('a dash in front of a message is no option after two of them', () => {
  expect(readOptions(['--', '-5 free']).text).toBe('-5 free');
});
