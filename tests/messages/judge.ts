import { readFileSync } from 'node:fs';
import { readMessage } from '../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../src/chat/reader/reader-defaults.ts';
import type { Language, Reading } from '../../src/chat/reader/understood.ts';

/** What one reading of a message has to be; volumes of barrels without a size count among the fields. */
export interface Expected {
  readonly intent: string;
  readonly fields: Readonly<Record<string, unknown>>;
  readonly asks: readonly string[];
  readonly problems: readonly string[];
  readonly command?: unknown;
  readonly when?: unknown;
  readonly chemical_lot?: string;
  readonly remark?: string;
  readonly titration?: unknown;
}

/** What stands beside the fields of a reading, and is compared where a file of labels is about it. */
const BESIDE = ['command', 'when', 'chemical_lot', 'remark', 'titration'] as const;

/** One labelled message: a single reading, or a round with what its first line shares. */
export interface Labelled {
  readonly id: string;
  readonly language: Language;
  readonly text: string;
  readonly expect: Expected | { readonly lines: readonly Expected[]; readonly shared: Expected['fields'] };
  readonly note?: string;
}

/** The labelled messages of a file beside this one. All of them are invented for this project. */
export function labelledIn(name: string): readonly Labelled[] {
  const text = readFileSync(new URL(name, import.meta.url), 'utf8');
  return text
    .split('\n')
    .filter(Boolean)
    .map((line) => JSON.parse(line) as Labelled);
}

/** Figures to six digits, so that a litre is compared and not its last bit. */
function rounded(value: unknown): unknown {
  if (typeof value === 'number') return Number(value.toPrecision(6));
  if (Array.isArray(value)) return value.map(rounded);
  if (value === null || typeof value !== 'object') return value;
  return Object.fromEntries(
    Object.entries(value)
      .toSorted(([a], [b]) => (a < b ? -1 : 1))
      .map(([key, one]) => [key, rounded(one)]),
  );
}

function besideOf(one: Partial<Record<(typeof BESIDE)[number], unknown>>): unknown {
  return Object.fromEntries(BESIDE.flatMap((name) => (one[name] === undefined ? [] : [[name, one[name]]])));
}

/** The reading in the form of a label. Beside a problem only its codes count, as nothing is computed there. */
function shown({ intent, fields, assumed, asks, problems }: Reading, expected: Expected): unknown {
  const codes = problems.map(({ code }) => code);
  if (expected.problems.length > 0)
    return { problems: expected.problems.filter((code) => codes.includes(code as 'too-long')) };
  if (expected.intent === 'chat' || expected.intent === 'emergency')
    return { intent, fields: rounded(fields) };
  const volume = assumed.volume_L === undefined ? {} : { volume_L: assumed.volume_L };
  return { intent, fields: rounded({ ...volume, ...fields }), asks, problems: codes };
}

function wanted(expected: Expected): unknown {
  if (expected.problems.length > 0) return { problems: expected.problems };
  if (expected.intent === 'chat' || expected.intent === 'emergency')
    return { intent: expected.intent, fields: {} };
  const { intent, fields, asks, problems } = expected;
  return { intent, fields: rounded(fields), asks, problems };
}

/** What was read of a labelled message, beside what should have been: its fields, and what stands beside them. */
export function judge({ language, text, expect }: Labelled): {
  readonly read: unknown;
  readonly wanted: unknown;
  readonly beside: { readonly read: unknown; readonly wanted: unknown };
} {
  const { readings, shared } = readMessage(text, { ...READER_DEFAULTS, language });
  const single = 'lines' in expect ? expect.lines : [expect];
  const read = readings.map((reading, i) => shown(reading, single[i] ?? single[0]!));
  return {
    read: { readings: read, shared: rounded(shared) },
    wanted: { readings: single.map(wanted), shared: 'lines' in expect ? rounded(expect.shared) : {} },
    beside: { read: readings.map(besideOf), wanted: single.map(besideOf) },
  };
}
