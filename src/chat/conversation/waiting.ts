import type { AdditiveId } from '../../core/additives/additive-id.ts';
import { ADDITIVES } from '../../core/additives/additives.ts';
import { STAGES_WITHOUT_TARGET } from '../../core/wine.ts';
import type { AskedField, Fields, Reading } from '../reader/understood.ts';
import type { Memory, Waiting } from './memory.ts';
import type { Settings } from './settings.ts';

/** How long a question waits for its answer, in milliseconds (half an hour). */
export const WAITS_ms = 30 * 60 * 1000;

/** The sizes of small plain tablets in grams of salt, and of effervescent ones in grams of SO2: common practice, no source. */
const TABLET_SALT_g = [0.44, 0.55] as const;
const TABLET_SO2_g = [2, 5] as const;

/** What is meant where only "sulfites", "sulfite solution" or the like was said, beside the usual additive. */
const SOLUTIONS_AT_HAND: readonly AdditiveId[] = ['potassium-bisulfite-solution', 'sulfur-dioxide-solution'];

/** The question that still waits at a moment; undefined when there is none or its half hour is over. */
export function stillWaiting(memory: Memory, at: number): Waiting | undefined {
  const { waiting } = memory;
  return waiting !== undefined && at - waiting.askedAt <= WAITS_ms ? waiting : undefined;
}

/** Whether a question for that field may wait: one for a target only at a stage that has usual ones. */
export function mayWaitFor(field: AskedField, { fields }: Reading): boolean {
  return field !== 'target' || !STAGES_WITHOUT_TARGET.includes(fields.stage ?? 'finished');
}

/** The field that a reply to this reading asks for: the first that is missing, where it may wait at all. */
export function waitsFor(reading: Reading): AskedField | undefined {
  const [field] = reading.asks;
  return field !== undefined && mayWaitFor(field, reading) ? field : undefined;
}

/** The values to choose from where a field has few, in the order of their letters. */
export function choicesFor(field: AskedField, reading: Reading, settings: Settings): readonly Fields[] {
  if (field === 'volume_L') return (reading.marks.volumeChoices ?? []).map((volume_L) => ({ volume_L }));
  if (field === 'tablet_salt_g') return TABLET_SALT_g.map((tablet_salt_g) => ({ tablet_salt_g }));
  if (field === 'tablet_SO2_g') return TABLET_SO2_g.map((tablet_SO2_g) => ({ tablet_SO2_g }));
  if (field !== 'additive') return [];
  if (reading.asks.includes('tablet_salt_g') || reading.fields.tablet_salt_g !== undefined)
    return [{ additive: 'potassium-metabisulfite' }, { additive: 'sodium-metabisulfite' }];
  const stock: AdditiveId = settings.usualAdditive.startsWith('sodium')
    ? 'sodium-metabisulfite-solution'
    : 'potassium-metabisulfite-solution';
  // Who said "solution" means no powder.
  const usual = isOfSolution(reading) && isPowder(settings.usualAdditive) ? [] : [settings.usualAdditive];
  return [...new Set([...usual, stock, ...SOLUTIONS_AT_HAND])].map((additive) => ({ additive }));
}

/** Whether a solution is spoken of whose name is missing: so it was called, or it was measured in millilitres. */
export function isOfSolution({ marks, fields }: Reading): boolean {
  return marks.unnamedSolution === true || fields.additive_volume_mL !== undefined;
}

function isPowder(additive: AdditiveId): boolean {
  return ADDITIVES[additive].kind === 'powder';
}

/** `a`, `b`, `c` … → the fields that the letter stands for. */
export function lettersOf(choices: readonly Fields[]): Readonly<Record<string, Fields>> {
  return Object.fromEntries(choices.map((fields, at) => [letterAt(at), fields]));
}

/** The letter of a choice by its place: 0 → `a`. */
export function letterAt(place: number): string {
  return String.fromCodePoint(0x61 + place);
}
