import { DISSOCIATION_CONSTANTS } from '../../../core/chemistry/dissociation.ts';
import { freeSO2Needed } from '../../../core/chemistry/free-so2-needed.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import { concentrationText } from '../../replies/quantity-text.ts';
import type { Answer } from '../ports.ts';
import type { Manner } from '../manner.ts';
import { line } from './line.ts';

/** Which table the figures rest on where it is not the usual constant, and what that one would make of the need. */
export function basisLines(reading: Reading, answer: Answer, manner: Manner): Line[] {
  const { alcohol_percent, temperature_C, ph } = reading.fields;
  if (!('basis' in answer) || answer.basis !== 'oiv') return [];
  const said = (value: number | undefined, decimals: number): string =>
    numberText(value ?? 0, decimals, manner.mark);
  const values = {
    percent: said(alcohol_percent, 2),
    celsius: said(temperature_C, 1),
    pK: said(answer.pK, 3),
  };
  const target = reading.fields.target ?? reading.assumed.target;
  if (ph === undefined || target === undefined || !('molecular_mg_L' in target))
    return [line('assumed', 'basis-oiv', values)];
  const free_mg_L = freeSO2Needed(target.molecular_mg_L, ph, DISSOCIATION_CONSTANTS['pk-1.81'].pK);
  const free = concentrationText(free_mg_L, manner.mark);
  return [line('assumed', 'basis-oiv-need', { ...values, free })];
}
