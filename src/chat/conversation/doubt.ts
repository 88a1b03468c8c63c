import type { AskedField, FieldName, Fields, Reading } from '../reader/understood.ts';
import { hintFor } from './lines/problem-hint.ts';
import { noteText } from './lines/notes.ts';
import type { Doubt } from './memory.ts';

/** A reading of which one figure is in doubt: what is kept of it, and the field that is asked for. */
export interface InDoubt extends Doubt {
  readonly field: AskedField;
  /** The reading without its problem and without the figure in doubt. */
  readonly reading: Reading;
}

type Asked = Pick<InDoubt, 'field' | 'settledBy' | 'byBareNumber'>;

/** Whether the problem is one volume beside several vessels. */
export function asksEachOrTotal(reading: Reading, about: string): boolean {
  return about === reading.where.volume_L?.text && noteText(reading, 'each-or-total') !== undefined;
}

/**
 * The one figure that is in doubt, where a correction alone makes the reading whole again. Undefined with several
 * problems, and with one whose field cannot be told: then the whole line is asked for.
 */
export function doubtOf(reading: Reading): InDoubt | undefined {
  const [problem, another] = reading.problems;
  if (problem === undefined || another !== undefined) return undefined;
  if (reading.intent === 'chat' || reading.intent === 'emergency') return undefined;
  const asked = askedFor(reading);
  if (asked === undefined) return undefined;
  const { [asked.field]: _inDoubt, ...fields } = reading.fields as Partial<Record<FieldName, unknown>>;
  // A mass that is in doubt was meant as the amount: with it the message asks what it does.
  const intent = asked.field === 'mass_g' && reading.intent === 'dose' ? 'effect' : reading.intent;
  const kept: Reading = { ...reading, intent, fields: fields as Fields, problems: [], asks: [asked.field] };
  return { ...asked, problems: reading.problems, reading: kept };
}

function askedFor(reading: Reading): Asked | undefined {
  const [{ code, about } = { code: 'not-understood', about: '' } as const] = reading.problems;
  switch (code) {
    case 'ph-out-of-range':
      return { field: 'ph', settledBy: ['ph'], byBareNumber: true };
    case 'volume-not-positive':
      return { field: 'volume_L', settledBy: ['volume_L'], byBareNumber: true };
    case 'strength-out-of-range':
      return reading.fields.additive === undefined
        ? undefined
        : { field: 'strength_percent', settledBy: ['strength_percent'], byBareNumber: true };
    case 'total-below-free':
      return { field: 'free_mg_L', settledBy: ['free_mg_L', 'total_mg_L'], byBareNumber: false };
    case 'ambiguous-number':
      return ofAmbiguous(reading, about);
    case 'negative-value':
    case 'unit-mismatch':
    case 'conflicting-values':
    case 'unknown-additive':
    case 'value-out-of-range':
    case 'not-understood':
    case 'too-long':
      return undefined;
  }
}

/** A figure alone where the volume is missing: it is most likely that, but only its unit tells. */
function ofLoneFigure({ volume_L, mass_g, target }: Fields, about: string): Asked | undefined {
  if (!/^\d+([.,]\d+)?$/.test(about.trim()) || volume_L !== undefined || mass_g !== undefined)
    return undefined;
  const settledBy: FieldName[] = ['volume_L', 'total_mg_L', ...(target ? [] : (['target'] as const))];
  return { field: 'volume_L', settledBy, byBareNumber: false };
}

function ofAmbiguous(reading: Reading, about: string): Asked | undefined {
  if (asksEachOrTotal(reading, about))
    return { field: 'volume_L', settledBy: ['volume_L'], byBareNumber: false };
  const { fields } = reading;
  switch (hintFor(reading, about, '.').kind) {
    case 'split':
      return { field: 'ph', settledBy: ['ph'], byBareNumber: true };
    case 'volume':
      return { field: 'volume_L', settledBy: ['volume_L'], byBareNumber: true };
    case 'mass':
      return { field: 'mass_g', settledBy: ['mass_g'], byBareNumber: false };
    case 'free':
    case 'aim':
    case 'pair':
      if (fields.free_mg_L !== undefined) return undefined;
      return { field: 'free_mg_L', settledBy: ['free_mg_L', 'total_mg_L', 'target'], byBareNumber: false };
    case 'to':
    case 'range':
      return fields.free_mg_L === undefined
        ? { field: 'free_mg_L', settledBy: ['free_mg_L'], byBareNumber: false }
        : undefined;
    case 'powder':
      if (fields.target !== undefined) return undefined;
      return { field: 'target', settledBy: ['target', 'rate_mg_L'], byBareNumber: false };
    case 'salt':
      return { field: 'strength_percent', settledBy: ['strength_percent'], byBareNumber: true };
    case 'water':
      return { field: 'strength_percent', settledBy: ['strength_percent', 'additive'], byBareNumber: true };
    case 'other':
      return ofLoneFigure(fields, about);
    case 'thousands':
    case 'percent':
    case 'SO2-percent':
    case 'degree':
      return undefined;
  }
}
