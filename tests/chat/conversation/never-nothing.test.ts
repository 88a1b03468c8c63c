import fc from 'fast-check';
import { expect, test } from 'vitest';
import { answerReading } from '../../../src/chat/conversation/answer-reading.ts';
import { readRoster } from '../../../src/chat/conversation/cellar/roster.ts';
import { NO_FACTS, type Here } from '../../../src/chat/conversation/here.ts';
import { FRESH_MEMORY } from '../../../src/chat/conversation/memory.ts';
import { mannerOf } from '../../../src/chat/conversation/manner.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { ASKED_FIELDS } from '../../../src/chat/reader/understood.ts';
import type { Fields, Reading } from '../../../src/chat/reader/understood.ts';
import { say } from './talk.ts';

const INTENTS = [
  'dose',
  'effect',
  'added',
  'reading',
  'solution',
  'titration',
  'command',
  'emergency',
  'chat',
] as const;

/** Fields as they may be put together by a slip of our own, fitting or not; figures made up. */
const anyFields: fc.Arbitrary<Fields> = fc.record(
  {
    vessel: fc.constant('tank 4'),
    volume_L: fc.constantFrom(20, 4000),
    ph: fc.constantFrom(3.2, 3.6, 4.1),
    free_mg_L: fc.constantFrom(0, 21, 60),
    total_mg_L: fc.constantFrom(80, 200),
    stage: fc.constantFrom('must', 'fermenting', 'malolactic', 'base', 'finished', 'bottled'),
    category: fc.constantFrom('sweet', 'sparkling', 'fortified'),
    target: fc.constantFrom({ free_mg_L: 30 }, { add_mg_L: 25 }, { molecular_mg_L: 0.8 }),
  },
  { requiredKeys: [] },
);

/** Additives as core takes them: a solution with its strength, a tablet with its size. */
const anyAdditive = fc.constantFrom<Fields>(
  {},
  { additive: 'potassium-metabisulfite' },
  { additive: 'potassium-bisulfite-solution', strength_percent: 18 },
  { additive: 'ammonium-bisulfite-solution', strength_percent: 30 },
  { additive: 'tablet', tablet_SO2_g: 5 },
  { additive: 'sulfur-dioxide-gas' },
);

const anyAmount = fc.constantFrom<Fields>({}, { mass_g: 0.3 }, { mass_g: 80 }, { rate_mg_L: 50 });

const anyReading: fc.Arbitrary<Reading> = fc
  .record({
    intent: fc.constantFrom(...INTENTS),
    some: anyFields,
    additive: anyAdditive,
    amount: anyAmount,
    asks: fc.subarray([...ASKED_FIELDS]),
    spoon: fc.boolean(),
  })
  .map(({ intent, some, additive, amount, asks, spoon }) => ({
    intent,
    asks,
    spoon,
    fields: { ...some, ...additive, ...amount },
  }))
  .map(({ intent, fields, asks, spoon }) => ({
    intent,
    fields,
    assumed: fields.additive === undefined ? { additive: 'potassium-metabisulfite' as const } : {},
    asks,
    problems: [],
    setAside: [],
    notes: spoon ? [{ id: 'spoon' as const, text: '1 tsp' }] : [],
    marks: {},
    where: {},
  }));

const AT = Date.UTC(2026, 9, 5, 8);

/** A cellar in which nothing was ever said. */
const HERE: Here = {
  ...NO_FACTS,
  message: {
    cellar: 'harbour cellar',
    chat: 'one',
    person: 'Ana',
    id: '1',
    at: AT,
    language: 'en',
    content: { kind: 'text', text: '' },
  },
  memory: FRESH_MEMORY,
  settings: DEFAULT_SETTINGS,
  me: 1,
  isNewPerson: true,
  roster: readRoster(undefined),
  role: 'keeper',
  nextEntry: 1,
  isZoneAsked: false,
  chatLanguage: 'en',
  done: new Set(),
};

test('no reading of any intent gets a reply without an answer, a question, a problem or a line of talk', () => {
  const check = (reading: Reading): void => {
    const manner = mannerOf(reading, '.', HERE);
    const cautioned = new Set<string>();
    const turn = { settings: DEFAULT_SETTINGS, manner, ref: '1.1', here: HERE, cautioned };
    const { lines, inRound, buttons } = answerReading(reading, 'en', turn);
    const told = lines.filter(({ room }) => ['first', 'question', 'effect'].includes(room));
    expect(told.length).toBeGreaterThan(0);
    expect(inRound.length).toBeGreaterThan(0);
    expect(say({ language: 'en', lines: told, buttons }).text).toMatch(/\p{L}/u);
  };
  fc.assert(fc.property(anyReading, check), { numRuns: 4000, seed: 20261005 });
});
