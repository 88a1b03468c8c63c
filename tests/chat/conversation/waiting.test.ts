import { describe, expect, test } from 'vitest';
import { emptyReading } from '../../../src/chat/reader/empty-reading.ts';
import { waitsFor } from '../../../src/chat/conversation/waiting.ts';
import { lastOf, startTalk, textOf } from './talk.ts';

const MINUTE_ms = 60_000;
const READING = emptyReading('dose');
const fieldsAfter = async (...messages: readonly string[]): Promise<unknown> =>
  (await lastOf(messages)).understood?.readings[0]?.fields;

describe('a message completes the reading that waits', () => {
  test.each([
    [['T4 pH 3.5 free 20', '40 hl'], { vessel: 'tank 4', ph: 3.5, free_mg_L: 20, volume_L: 4000 }],
    [['T4 40 hl pH 3.5', '18'], { vessel: 'tank 4', ph: 3.5, free_mg_L: 18, volume_L: 4000 }],
    [
      ['T4 40 hl pH 3.5', 'free 18 total 60'],
      { vessel: 'tank 4', ph: 3.5, free_mg_L: 18, total_mg_L: 60, volume_L: 4000 },
    ],
    [
      ['T4 40 hl free 18', 'pH 3.5 red'],
      { vessel: 'tank 4', ph: 3.5, free_mg_L: 18, volume_L: 4000, style: 'red' },
    ],
    [['pH 3.5 free 20', 'T4 40 hl'], { vessel: 'tank 4', ph: 3.5, free_mg_L: 20, volume_L: 4000 }],
    [['T4 40 hl pH 3.5', 'T4 free 18'], { vessel: 'tank 4', ph: 3.5, free_mg_L: 18, volume_L: 4000 }],
    [
      ['100 g kmbs T4', '20 hl'],
      { vessel: 'tank 4', additive: 'potassium-metabisulfite', mass_g: 100, volume_L: 2000 },
    ],
    [['added kmbs to tank 6', '82 g'], { vessel: 'tank 6', additive: 'potassium-metabisulfite', mass_g: 82 }],
  ])('%j', async (messages, fields) => {
    expect(await fieldsAfter(...messages)).toEqual(fields);
  });
});

describe('a message starts a new reading', () => {
  test.each([
    ['another vessel', ['T4 pH 3.5 free 20', 'T5 40 hl'], { vessel: 'tank 5', volume_L: 4000 }],
    [
      'several vessels in place of one',
      ['T4 pH 3.5 free 20', 'B1-B2 225 L'],
      { vessels: ['B1', 'B2'], volume_L: 450 },
    ],
    ['a value that contradicts', ['T4 pH 3.5 free 20', 'pH 3.6 40 hl'], { ph: 3.6, volume_L: 4000 }],
    [
      'another intent',
      ['T4 pH 3.5 free 20', 'added 82 g kmbs T4'],
      { vessel: 'tank 4', additive: 'potassium-metabisulfite', mass_g: 82 },
    ],
  ])('with %s', async (_, messages, fields) => {
    expect(await fieldsAfter(...messages)).toEqual(fields);
  });
});

test.each([
  [30, true],
  [31, false],
])(
  'a question waits half an hour: after %i minutes a volume alone completes: %s',
  async (minutes, completes) => {
    const talk = startTalk();
    await talk.write('T4 pH 3.5 free 20');
    talk.at += minutes * MINUTE_ms;
    expect(/weigh/.test(textOf(await talk.write('40 hl')))).toBe(completes);
  },
);

test('one question stands in a reply, for the first field that is missing', async () => {
  const talk = startTalk();
  expect(textOf(await talk.write('free 21 ppm')).match(/\?/g)).toHaveLength(1);
  expect((await talk.memory()).waiting?.field).toBe('volume_L');
});

test('a slip in an answer leaves the question waiting', async () => {
  const talk = startTalk();
  await talk.write('T4 40 hl free 20');
  await talk.write('36');
  expect((await talk.memory()).waiting?.field).toBe('ph');
  expect(textOf(await talk.write('3.5'))).toContain('T4: weigh');
});

test('a total below the free that comes later is a problem, not a dose', async () => {
  const talk = startTalk();
  await talk.write('T4 40 hl pH 3.5 total 15');
  const { understood, answers } = await talk.write('20');
  expect(understood?.readings[0]?.problems[0]?.code).toBe('total-below-free');
  expect(answers).toEqual([null]);
});

describe('a number that nothing asks for', () => {
  test.each(['T7 20 hl pH 3.6 free 3, in ML', 'T3 3000 L must pH 3.4', 'T4 20 hl still fermenting'])(
    'is asked about after: %s',
    async (message) => {
      const talk = startTalk();
      await talk.write(message);
      expect((await talk.memory()).waiting).toBeUndefined();
      const { understood, answers } = await talk.write('30');
      expect(understood?.readings[0]).toMatchObject({
        fields: {},
        problems: [{ code: 'ambiguous-number', about: '30' }],
      });
      expect(answers).toEqual([null]);
    },
  );

  test('presses a button where buttons stand, and never while a field waits', async () => {
    const talk = startTalk();
    await talk.write('1450 gal pH 3.4 free 21');
    const { lastButtons } = await talk.memory();
    const number = lastButtons.findIndex((key) => key.startsWith('w:')) + 1;
    expect(textOf(await talk.write(String(number)))).toMatch(/the working/i);
    await talk.write('T4 pH 3.5 free 20');
    expect((await talk.write('2')).understood?.readings[0]?.fields.volume_L).toBe(2);
  });
});

test('letters choose while their field waits, small or capital', async () => {
  for (const letter of ['b', 'B', ' b ']) {
    const talk = startTalk();
    await talk.write('2 campden in 10 L');
    expect((await talk.write(letter)).understood?.readings[0]?.fields.additive).toBe('sodium-metabisulfite');
  }
});

test('a letter is no choice where none waits', async () => {
  expect((await startTalk().write('b')).understood?.readings[0]?.fields).toEqual({});
});

test.each([
  [{ stage: 'must' }, ['target'], undefined],
  [{ stage: 'malolactic' }, ['target'], undefined],
  [{ stage: 'must' }, ['volume_L', 'target'], 'volume_L'],
  [{ category: 'fortified' }, ['target'], 'target'],
  [{}, [], undefined],
] as const)('of %j, which asks %j, there waits: %s', (fields, asks, field) => {
  expect(waitsFor({ ...READING, fields, asks })).toBe(field);
});

test('a number with a plus is what is to be added, also where a target is asked', async () => {
  const talk = startTalk();
  await talk.write('port 20 hl pH 3.6 free 12');
  expect((await talk.write('+25')).understood?.readings[0]?.fields.target).toEqual({ add_mg_L: 25 });
});

test('while another target is asked a bare number is the target, though buttons stand above', async () => {
  const talk = startTalk();
  await talk.write('T4 40 hl pH 3.5 free 20');
  await talk.press('t:1.1');
  expect((await talk.write('3')).understood?.readings[0]?.fields.target).toEqual({ free_mg_L: 3 });
});

test('another target is asked for and waits, without the one before', async () => {
  const talk = startTalk();
  await talk.write('T4 40 hl pH 3.5 free 20 target 35');
  await talk.press('t:1.1');
  expect((await talk.write('40')).understood?.readings[0]?.fields.target).toEqual({ free_mg_L: 40 });
});
