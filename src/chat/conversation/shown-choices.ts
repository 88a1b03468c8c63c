import type { DoseChoice } from '../../core/dose/answer.ts';
import { concentrationText } from '../replies/quantity-text.ts';

/** A way out of a choice, with its place among all that were reckoned. */
export interface ShownChoice {
  readonly choice: DoseChoice;
  readonly place: number;
}

/** The ways out to show: two that would read alike (a full target of 60.1 beside 60) are one, the full target. */
export function shownChoices(choices: readonly DoseChoice[]): readonly ShownChoice[] {
  const free = ({ free_mg_L }: DoseChoice): string => concentrationText(free_mg_L, '.');
  return choices
    .map((choice, place) => ({ choice, place }))
    .filter(({ choice, place }) => {
      const next = choices[place + 1];
      return choice.target === undefined || next === undefined || free(next) !== free(choice);
    });
}
