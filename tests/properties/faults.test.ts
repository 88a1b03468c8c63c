import { expect, test } from 'vitest';
import type { Handled } from '../../src/chat/conversation/ports.ts';
import type { Reading } from '../../src/chat/reader/understood.ts';
import { play } from '../fuzz/conversation-of.ts';
import type { Turn } from '../fuzz/conversation-of.ts';
import { faults } from '../fuzz/faults.ts';

/** What is tried on any message has to notice when something is wrong: here it is wrong on purpose. */
async function turnOf(text: string): Promise<Turn> {
  const { value } = await play({ language: 'en', turns: [{ text, minutes: 0 }] }).next();
  return value as Turn;
}

function withReading(handled: Handled, change: Partial<Reading>): Handled {
  const { understood } = handled;
  if (understood === undefined) return handled;
  const readings = understood.readings.map((reading) => ({ ...reading, ...change }));
  return { ...handled, understood: { ...understood, readings } };
}

const DOSE = await turnOf('T4 1450 gal pH 3.58 free 21');
const NOTED = await turnOf('T4 now free 38 total 96 pH 3.6');
const PROBLEM: Partial<Reading> = { problems: [{ code: 'too-long', about: '' }] };
const REPLY = DOSE.handled.replies[0]!;

test('a good answer has no faults', () => {
  expect(faults(DOSE)).toEqual([]);
});

test.each<[string, Handled]>([
  ['an answer beside a problem', withReading(DOSE.handled, PROBLEM)],
  [
    'a question beside a problem',
    withReading(DOSE.handled, { problems: [{ code: 'too-long', about: '' }], asks: ['ph'] }),
  ],
  ['an amount without volume', withReading(DOSE.handled, { fields: { ph: 3.58, free_mg_L: 21 } })],
  ['an amount while ph is asked', withReading(DOSE.handled, { asks: ['ph'] })],
  ['dose-weigh beside a problem', withReading(DOSE.handled, PROBLEM)],
  ['button-added in an emergency', withReading(DOSE.handled, { intent: 'emergency' })],
  ['a reading noted beside a problem', withReading(NOTED.handled, PROBLEM)],
  ['a reading noted in an emergency', withReading(NOTED.handled, { intent: 'emergency' })],
  ['an answer to chat', withReading(DOSE.handled, { intent: 'chat' })],
  ['no reply', { ...DOSE.handled, replies: [] }],
  ['an empty reply', { ...DOSE.handled, replies: [{ ...REPLY, lines: [] }] }],
  [
    'the assumed target is not said',
    { ...DOSE.handled, replies: [{ ...REPLY, lines: REPLY.lines.filter((line) => line.room === 'first') }] },
  ],
  [
    'the reply says NaN',
    { ...DOSE.handled, replies: [{ ...REPLY, lines: REPLY.lines.map((line) => withNaN(line)) }] },
  ],
  ['answer.mass_g is NaN', { ...DOSE.handled, answers: [{ warnings: [], steps: [], mass_g: Number.NaN }] }],
  ['answer.mass_g is negative: -1', { ...DOSE.handled, answers: [{ warnings: [], steps: [], mass_g: -1 }] }],
  ['1 readings, 0 answers', { ...DOSE.handled, answers: [] }],
  ['handled twice, it comes out differently', { ...DOSE.handled, writes: [] }],
])('the fault is noticed: %s', (fault, handled) => {
  expect(faults({ ...DOSE, handled })).toContain(fault);
});

function withNaN<T extends { readonly values: Readonly<Record<string, string>> }>(line: T): T {
  return { ...line, values: Object.fromEntries(Object.keys(line.values).map((key) => [key, 'NaN'])) };
}
