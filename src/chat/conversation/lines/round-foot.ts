import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import type { DoseAnswer } from '../../../core/dose/answer.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import { measureText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { Here } from '../here.ts';
import { mannerOf } from '../manner.ts';
import type { Said } from '../next-memory.ts';
import type { Note } from '../note.ts';
import { additiveOf } from '../to-requests.ts';
import { assumedLines } from './assumed.ts';
import { redFigures, redTargetText } from './condition.ts';
import { line, listLine, part } from './line.ts';
import { roundCautions } from './round-cautions.ts';

type Part = Omit<Line, 'room'>;

/** One vessel of a round: its name at the head of its line, and what was said to it. */
export interface SaidInRound extends Said {
  readonly name: string;
  /** What the log notes of it. */
  readonly notes: readonly Note[];
}

/** What holds for a whole round, said once under its lines: the stage, what was assumed, the cautions. */
export function roundFoot(
  said: readonly SaidInRound[],
  cautioned: ReadonlySet<string>,
  mark: DecimalMark,
  here: Here,
): Line[] {
  const answered = said.filter(({ outcome }) => outcome.answer !== null);
  const holds = (intent: Said['reading']['intent']): boolean =>
    said.some(
      ({ reading }) => reading.intent === intent && reading.problems.length + reading.asks.length === 0,
    );
  const assumesStage = answered.some(({ reading }) => reading.assumed.stage !== undefined);
  const weighs = answered.some(({ reading }) => reading.intent === 'dose' || reading.intent === 'effect');
  const assumed = said
    .filter(({ reading }) => reading.problems.length === 0)
    .flatMap(({ reading }) => assumedLines(reading, mannerOf(reading, mark, here)));
  const weighed = answered.flatMap(
    ({ reading, outcome }) =>
      outcome.cautioned ?? (hasShortCautions(outcome.lines) ? (additiveOf(reading)?.id ?? []) : []),
  );
  return [
    ...(assumesStage ? [line('condition', 'condition-stage')] : []),
    ...stockLines(said, mark),
    ...(holds('added') ? [line('effect', 'measure-tomorrow')] : []),
    ...(weighs ? [line('effect', 'round-effect')] : []),
    ...(said.some(({ notes }) => notes.length > 0) && !holds('added') ? [line('effect', 'round-kept')] : []),
    ...(said.some(({ reading }) => reading.problems.length > 0) ? [line('question', 'round-again')] : []),
    ...mergeLists(assumed),
    ...lowLines(said),
    ...mixedLines(said),
    ...roundCautions([...new Set<AdditiveId>(weighed)], cautioned),
  ];
}

/** Whether a vessel's line gives an amount. */
const isWeighed = ({ outcome }: SaidInRound): boolean =>
  outcome.inRound.some(({ key }) => key.startsWith('round-dose'));

function hasShortCautions(lines: readonly Line[]): boolean {
  return lines.some(({ key }) => key === 'cautions-short');
}

function doseOf({ reading, outcome }: Said): DoseAnswer | undefined {
  const { answer } = outcome;
  return reading.intent === 'dose' && answer !== null && 'warnings' in answer ? answer : undefined;
}

/** Amounts too small for most scales once more as a stock, with their vessels; and what "if red" is for. */
function stockLines(said: readonly SaidInRound[], mark: DecimalMark): Line[] {
  const small = said.flatMap((one) => {
    const answer = doseOf(one);
    const each = answer?.per_vessel ?? answer;
    const { measure, stock } = each ?? {};
    if (!measure || !stock || !isWeighed(one)) return [];
    return [{ vessel: one.name, measure, stock }];
  });
  const strength = numberText(small[0]?.stock.strength_percent ?? 0, 1, mark);
  const isRest = small.some(({ measure }) => measure.unit === 'tablets');
  const list = small.map(({ vessel, stock }) =>
    part('round-stock-of', { vessel, amount: measureText(stock.measure, mark) }),
  );
  const reds = said
    .filter(isWeighed)
    .map((one) => redFigures(doseOf(one) ?? { warnings: [] }))
    .find((one) => one !== undefined);
  const red = reds === undefined ? undefined : redTargetText(reds, mark);
  return [
    ...(red === undefined ? [] : [line('condition', 'round-red', { red })]),
    ...listLine('effect', isRest ? 'round-rest' : 'round-stock', list).map((one) => ({
      ...one,
      values: { strength },
    })),
  ];
}

/** The lines of a round that one mixed sample stands for. */
function mixedLines(said: readonly SaidInRound[]): Line[] {
  const mixed = said.filter(({ reading }) => reading.marks.mixedSample !== undefined);
  return listLine(
    'caution',
    'round-mixed',
    mixed.map(({ name }) => part('round-name', { name })),
  );
}

/** The vessels whose free SO2 is so low that much may bind. */
function lowLines(said: readonly SaidInRound[]): Line[] {
  const low = said.filter((one) =>
    doseOf(one)?.warnings.some(({ code }) => code === 'free-low-may-bind-all'),
  );
  return listLine(
    'caution', // never folded away: a round has no button `More`
    'round-low',
    low.map(({ name }) => part('round-name', { name })),
  );
}

/** The lists of all readings as one list of each kind; what is alike is said once, with all the words it is about. */
function mergeLists(lines: readonly Line[]): Line[] {
  const byKey = Map.groupBy(lines, ({ key }) => key);
  return [...byKey.entries()].flatMap(([key, alike]) => {
    const parts = mergeParts(alike.flatMap(({ list }) => list ?? []));
    return parts.length === 0 ? [] : [{ room: 'assumed' as const, key, values: {}, list: parts }];
  });
}

/** Notes that say the same of every vessel: its figures stand in its line. */
const OF_EVERY_LINE: Readonly<Record<string, Part>> = {
  'note-ph-unlabelled': part('note-round-ph'),
  'note-free-unlabelled': part('note-round-free'),
};

function mergeParts(parts: readonly Part[]): Part[] {
  const alike = Map.groupBy(parts, ({ key, values: { text: _text, ...rest } }) => key + JSON.stringify(rest));
  return [...alike.values()].flatMap((same) => {
    const [first, another] = same;
    if (!first) return [];
    const once = another === undefined ? undefined : OF_EVERY_LINE[first.key];
    if (once) return [once];
    const texts = [...new Set(same.flatMap(({ values }) => values['text'] ?? []))];
    return texts.length === 0 ? [first] : [{ ...first, values: { ...first.values, text: texts.join(', ') } }];
  });
}
