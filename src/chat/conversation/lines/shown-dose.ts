import type { DoseAnswer } from '../../../core/dose/answer.ts';

/** What a reply has somebody weigh: the dose, or the smaller one that keeps under a limit where the dose does not. */
export interface ShownDose extends Pick<
  DoseAnswer,
  'measure' | 'per_vessel' | 'stock' | 'measure_gives_mg_L' | 'dose_mg_L' | 'free_after_mg_L'
> {
  readonly isLimited?: true;
}

/** The dose of an answer as it is shown first; of a capped one nothing of the full dose is left. */
export function shownDose(answer: DoseAnswer): ShownDose {
  return answer.capped === undefined ? answer : { ...answer.capped, isLimited: true };
}
