import { expect, test } from 'vitest';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { startTalk, textOf } from './talk.ts';

const OIV = { ...DEFAULT_SETTINGS, basis: 'oiv' } as const;

// The pK between four values of OIV-MA-AS323-04C, Table II (from memory); the other needs are plain arithmetic.
test.each([
  [
    'T4 40 hl pH 3.5 free 10 13% 22C',
    'By the OIV table for 13 %, 22 °C (pK 2.055); with pK 1.81 it would need 40 free.',
  ],
  ['100 g kmbs in 20 hl pH 3.5 free 10 13% 22C', 'By the OIV table for 13 %, 22 °C (pK 2.055).'],
  ['T4 40 hl pH 3.5 free 10', 'By OIV at 12 %, 20 °C it would be about 11 mg/L less.'],
  ['T4 40 hl pH 3.5 free 10 13% 14C', 'By OIV at 13 %, 20 °C it would be about 12 mg/L less.'],
])('with the OIV basis it is said what it rests on, or would: %s', async (message, said) => {
  expect(textOf(await startTalk(OIV).write(message))).toContain(said);
});

test('with the usual constant no table is spoken of', async () => {
  expect(textOf(await startTalk().write('T4 40 hl pH 3.5 free 10 13% 22C'))).not.toContain('OIV');
});

test('a vessel of a round has what may forbid its addition right under its line', async () => {
  const text = textOf(await startTalk().write('T1 40 hl pH 3.4 free 10\nT2 40 hl pH 3.4 free 10 smbs'));
  const lines = text.split('\n');
  const at = lines.findIndex((line) => line.startsWith('T2'));
  expect(lines[at + 1]).toMatch(/^⚠ Sodium metabisulfite: many rules bar it from wine/);
});
