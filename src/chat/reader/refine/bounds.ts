import type { ProblemCode } from '../../../core/problem.ts';
import type { Target } from '../../../core/wine.ts';
import { isWithinBounds } from '../../../core/bounds.ts';
import type { Board } from '../board.ts';
import { placeOf } from '../board.ts';
import type { FieldName, Fields } from '../understood.ts';

/** The least and most of each field that a cellar has; own thresholds, to keep slips out. No source. */
const CELLAR_BOUNDS: Readonly<Record<string, readonly [number, number]>> = {
  volume_L: [0, 10_000_000],
  free_mg_L: [0, 1000],
  total_mg_L: [0, 1000],
  temperature_C: [-15, 60],
  alcohol_percent: [0, 25],
  sugar_g_L: [0, 600],
  designated_mg_L: [0, 500],
  density_kg_L: [0.9, 1.3],
  reserve_mg_L: [0, 300],
  mass_g: [0, 100_000_000],
  additive_volume_mL: [0, 10_000_000_000],
  rate_mg_L: [0, 100_000],
  added_mg_L: [0, 1000],
  tablets: [0, 10_000],
  tablet_SO2_g: [0.1, 100],
  tablet_salt_g: [0.05, 2],
  binding_allowance_percent: [0, 400],
  binding_share: [0, 0.8],
};

const targetFigure = (target: Target): readonly [number, number] => {
  if ('molecular_mg_L' in target) return [target.molecular_mg_L, 10];
  return 'free_mg_L' in target ? [target.free_mg_L, 1000] : [target.add_mg_L, 1000];
};

/** What is wrong with a figure that no cellar has, said in a message or in an answer; undefined where nothing is. */
export function problemOf(field: FieldName, value: Fields[FieldName]): ProblemCode | undefined {
  if (field === 'target') {
    const [figure, most] = targetFigure(value as Target);
    if (figure < 0) return 'negative-value';
    return figure > most ? 'value-out-of-range' : undefined;
  }
  if (typeof value !== 'number') return undefined;
  if (field === 'ph') return isWithinBounds('ph', value) ? undefined : 'ph-out-of-range';
  const bounds = CELLAR_BOUNDS[field];
  if (!bounds) return undefined;
  if (field === 'volume_L' && value <= 0) return 'volume-not-positive';
  if (value < 0 && field !== 'temperature_C') return 'negative-value';
  return value >= bounds[0] && value <= bounds[1] ? undefined : 'value-out-of-range';
}

/** Refuses what cannot be true: a pH of 36, a tank of 50 million litres. */
export function settleBounds(board: Board): void {
  for (const finding of board.findings.slice()) {
    const code = problemOf(finding.field, finding.value);
    if (code === undefined) continue;
    board.problems.push({ code, about: placeOf(board, finding.from, finding.to).text });
    board.findings.splice(board.findings.indexOf(finding), 1);
  }
}
