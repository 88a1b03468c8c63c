import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import type { Line } from '../../replies/reply.ts';
import type { DecimalMark } from '../../replies/number-text.ts';
import { mannerOf } from '../manner.ts';
import type { Said } from '../next-memory.ts';
import type { Settings } from '../settings.ts';
import { additiveOf } from '../to-requests.ts';
import { assumedLines } from './assumed.ts';
import { cautionLines } from './cautions.ts';
import { line } from './line.ts';

type Part = Omit<Line, 'room'>;

/** What holds for a whole round, said once under its lines: the stage, what was assumed, the cautions. */
export function roundFoot(
  said: readonly Said[],
  cautioned: ReadonlySet<string>,
  mark: DecimalMark,
  settings: Settings,
): Line[] {
  const answered = said.filter(({ outcome }) => outcome.answer !== null);
  const assumesStage = answered.some(({ reading }) => reading.assumed.stage !== undefined);
  const assumed = said
    .filter(({ reading }) => reading.problems.length === 0)
    .flatMap(({ reading }) => assumedLines(reading, mannerOf(reading, mark, settings)));
  const weighed = answered.flatMap(
    ({ reading, outcome }) =>
      outcome.cautioned ?? (hasShortCautions(outcome.lines) ? (additiveOf(reading)?.id ?? []) : []),
  );
  return [
    ...(assumesStage ? [line('condition', 'condition-stage')] : []),
    ...(answered.length > 0 ? [line('effect', 'round-effect')] : []),
    ...mergeLists(assumed),
    ...[...new Set<AdditiveId>(weighed)].flatMap((id) => cautionLines(id, !cautioned.has(id))),
  ];
}

function hasShortCautions(lines: readonly Line[]): boolean {
  return lines.some(({ key }) => key === 'cautions-short');
}

/** The lists of all readings as one list of each kind; what is alike is said once, with all the words it is about. */
function mergeLists(lines: readonly Line[]): Line[] {
  const byKey = Map.groupBy(lines, ({ key }) => key);
  return [...byKey.entries()].flatMap(([key, alike]) => {
    const parts = mergeParts(alike.flatMap(({ list }) => list ?? []));
    return parts.length === 0 ? [] : [{ room: 'assumed' as const, key, values: {}, list: parts }];
  });
}

function mergeParts(parts: readonly Part[]): Part[] {
  const alike = Map.groupBy(parts, ({ key, values: { text: _text, ...rest } }) => key + JSON.stringify(rest));
  return [...alike.values()].flatMap((same) => {
    const [first] = same;
    if (!first) return [];
    const texts = [...new Set(same.flatMap(({ values }) => values['text'] ?? []))];
    return texts.length === 0 ? [first] : [{ ...first, values: { ...first.values, text: texts.join(', ') } }];
  });
}
