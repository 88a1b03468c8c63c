import type { CappedDose, DoseAnswer } from '../../../core/dose/answer.ts';
import { KEPT_FOR_METHOD_mg_L } from '../../../core/limits/check-limit.ts';
import type { Limit, LimitNote } from '../../../core/limits/limit.ts';
import { limitsFor } from '../../../core/limits/limits-for.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { Manner } from '../manner.ts';
import type { Settings } from '../settings.ts';
import { toDoseRequest } from '../to-requests.ts';
import { apartFromLimit } from './apart-from-limit.ts';
import { line, listLine, part } from './line.ts';
import { limitFigure, ruleValues } from './rule.ts';
import { vesselText } from './vessel.ts';

/** A smaller dose, or none, keeps a wine under a limit. */
export type Capped = DoseAnswer & { readonly capped: CappedDose };

/** Whether a dose passes a limit that was read, and nobody has asked for it all the same. */
export function isCapped(answer: DoseAnswer): answer is Capped {
  return answer.capped !== undefined;
}

/** The limit that a dose is capped by. */
function limitOf({ capped, limits = [] }: Capped): Limit | undefined {
  return limits.find(({ rule }) => rule === capped.rule);
}

/** The rule with its figure, and where the wine stands to it with the full dose, as values of a sentence. */
export function limitValues(reading: Reading, answer: Capped, manner: Manner): Line['values'] {
  const { capped } = answer;
  const limit = limitOf(answer);
  const { total_mg_L, free_mg_L = 0 } = reading.fields;
  const now_mg_L = limit?.of === 'free' ? free_mg_L : (total_mg_L ?? free_mg_L);
  return {
    ...ruleValues(capped.rule, manner.mark),
    vessel: vesselText(reading),
    of: limit?.of ?? 'total',
    least: limit?.of === 'total' && total_mg_L === undefined ? 'yes' : 'no',
    limit: limit === undefined ? '' : limitFigure(limit, manner.mark),
    unit: manner.unit,
    standing: limit !== undefined && now_mg_L > limit.limit_mg_L ? 'over' : 'at',
    now: numberText(now_mg_L, 1, manner.mark),
    after: apartFromLimit(now_mg_L + (answer.dose_mg_L ?? 0), limit?.limit_mg_L ?? 0, manner.mark),
  };
}

/** What the smaller dose gives, and the rule that it keeps, as values of a sentence. */
function cappedValues(reading: Reading, answer: Capped, manner: Manner): Line['values'] {
  const limit = limitValues(reading, answer, manner);
  const { total_mg_L, free_mg_L = 0 } = reading.fields;
  const before_mg_L = limit['of'] === 'free' ? free_mg_L : (total_mg_L ?? free_mg_L);
  return { ...limit, after: concentrationText(before_mg_L + answer.capped.dose_mg_L, manner.mark) };
}

/** Under its line in a round: what the smaller dose gives, and the rule that it keeps. */
export function cappedInRound(reading: Reading, answer: Capped, manner: Manner): Line {
  return line('first', 'round-capped', cappedValues(reading, answer, manner));
}

/** The first line of a smaller dose: the amount, what it gives, and the rule that it keeps. */
export function cappedFirst(first: Line, reading: Reading, answer: Capped, manner: Manner): Line {
  const { key, values } = first;
  return { ...line('first', 'dose-capped', cappedValues(reading, answer, manner)), list: [{ key, values }] };
}

/** How much is kept below the limit, and why. */
export function keptLine(reading: Reading, answer: Capped, manner: Manner): Line {
  const { capped } = answer;
  const limit = limitValues(reading, answer, manner);
  if (limit['standing'] === 'over')
    return line('first', 'dose-over-already', { region: limit['region'] ?? '' });
  const reserve_mg_L = capped.kept_mg_L - KEPT_FOR_METHOD_mg_L;
  const said = (value: number): string => numberText(value, 1, manner.mark);
  return line('first', 'dose-capped-kept', {
    kept: said(capped.kept_mg_L),
    error: said(KEPT_FOR_METHOD_mg_L),
    of: limit['of'] ?? 'total',
    reserve: reserve_mg_L > 0 ? said(reserve_mg_L) : 'none',
    unit: manner.unit,
  });
}

/** What is unknown of the wine and decides its limit: it was taken at its strictest. */
export function lawAssumedLines(
  reading: Reading,
  settings: Pick<Settings, 'basis' | 'region' | 'targets'>,
): Line[] {
  const { notes } = limitsFor(toDoseRequest(reading, settings));
  const parts = notes
    .filter(({ code }) => UNKNOWN.includes(code))
    .map(({ code }) => part('law-unknown', { code }));
  return listLine('assumed', 'law-assumed', parts);
}

const UNKNOWN: readonly LimitNote['code'][] = [
  'colour-assumed',
  'sugar-assumed',
  'sparkling-class-assumed',
  'density-assumed',
];

/** Whether a sweet wine is of a designation is asked and never inferred. */
export function designationLines(
  reading: Reading,
  settings: Pick<Settings, 'basis' | 'region' | 'targets'>,
): Line[] {
  const { notes } = limitsFor(toDoseRequest(reading, settings));
  if (notes.every(({ code }) => code !== 'designation-unknown')) return [];
  const vessel = vesselText(reading);
  return [
    line('assumed', 'designation-asked', {
      region: settings.region,
      wine: vessel,
    }),
  ];
}
