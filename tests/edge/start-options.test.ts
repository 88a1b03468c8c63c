import { expect, test } from 'vitest';
import { readStartOptions } from '../../src/edge/start-options.ts';

test.each([
  [[], { does: 'serve' }],
  [['--demo'], { does: 'demo' }],
  [['--rebuild'], { does: 'rebuild' }],
  [['--backup'], { does: 'backup' }],
  [['--restore', 'data/backups/copy.db'], { does: 'restore', copy: 'data/backups/copy.db' }],
])('%j is read as %j', (args, options) => {
  expect(readStartOptions(args)).toEqual(options);
});

test.each([
  [['--dmo'], /^Unknown option '--dmo'\.\nnpm start /],
  [['demo'], /^Unexpected argument 'demo'\.\n/],
  [['--demo=yes'], /^Option '--demo' does not take an argument\.\n/],
  [['--restore'], /^Option '--restore <value>' argument missing\.\n/],
  [['--restore', ''], /^Which backup\?\n/],
  [['--restore', 'a.db', 'b.db'], /^Unexpected argument 'b\.db'\.\n/],
  [['--demo', '--rebuild'], /^One at a time, please\.\n/],
])('%j gets a sentence, and what there is', (args, sentence) => {
  expect(() => readStartOptions(args)).toThrow(sentence);
});
