import type { Target } from '../../../core/wine.ts';
import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { doseOf } from '../dose-of.ts';
import type { Here } from '../here.ts';
import { limitNamed } from '../lines/choice.ts';
import { line } from '../lines/line.ts';
import { vesselText } from '../lines/vessel.ts';
import { mannerOf, molecularPerLitre } from '../manner.ts';

/** What was chosen: a target to reckon with, or lines where nothing is reckoned; undefined for no such choice. */
export function chosen(
  reading: Reading,
  place: number,
  here: Here,
): { readonly target: Target } | { readonly lines: Line[] } | undefined {
  const answer = doseOf(reading, here.settings);
  const choice = answer.choices?.[place];
  if (choice === undefined) return undefined;
  const manner = mannerOf(reading, here.memory.decimalMark ?? '.', here);
  const vessel = vesselText(reading);
  if (choice.target === undefined) {
    const molecular = molecularPerLitre(choice.molecular_mg_L, manner);
    return { lines: [line('first', 'choice-left', { vessel, molecular }), line('first', 'ways-out')] };
  }
  if (choice.over_limit)
    return { lines: [line('first', 'choice-over', { vessel, ...limitNamed(answer, manner) })] };
  return { target: choice.target };
}
