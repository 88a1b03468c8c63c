import { ADDITIVES } from '../../core/additives/additives.ts';
import type { DoseChoice } from '../../core/dose/answer.ts';
import type { AskedField, Fields } from '../reader/understood.ts';
import { numberText, type DecimalMark } from '../replies/number-text.ts';
import type { Button } from '../replies/reply.ts';
import type { SentenceKey } from '../replies/sentence-keys.ts';
import { perLitre, type Manner } from './manner.ts';
import { letterAt } from './waiting.ts';

/** What a button does; its key is `does:ref`, of a choice `does:ref:which`. */
export type Does = 'w' | 's' | 't' | 'm' | 'nf' | 'red' | 'c' | 'l';

/** At most so many buttons stand under a dose. */
export const MOST_BUTTONS = 4;

/** What stands on a button, by what it does. */
export const LABELS = {
  nf: 'button-not-finished',
  red: 'button-red',
  w: 'button-working',
  s: 'button-safety',
  t: 'button-target',
  m: 'button-more',
} as const satisfies Partial<Record<Does, SentenceKey>>;

/** The plain buttons of a remembered reading, marked 1, 2, 3 … as they stand. */
export function buttonsFor(ref: string, does: readonly (keyof typeof LABELS)[]): Button[] {
  return does.map((one, at) => ({
    key: `${one}:${ref}`,
    mark: String(at + 1),
    label: LABELS[one],
    values: {},
  }));
}

/** Which buttons apply under a dose. */
export interface Applies {
  readonly stageAssumed: boolean;
  readonly mayBeRed: boolean;
  readonly cautionsShort: boolean;
}

/**
 * The weightiest four under a dose: the stage, the colour, the cautions where they stand in one line, the working,
 * another target; `More` comes last and leads to all the rest.
 */
export function doseButtons(ref: string, applies: Applies): Button[] {
  const all = [
    ...(applies.stageAssumed ? (['nf'] as const) : []),
    ...(applies.mayBeRed ? (['red'] as const) : []),
    ...(applies.cautionsShort ? (['s'] as const) : []),
    'w' as const,
    't' as const,
  ];
  return buttonsFor(ref, [...all.slice(0, MOST_BUTTONS - 1), 'm']);
}

/** A button for each way out of a choice that may be taken, the other colour, then all the rest. */
export function choiceButtons(
  ref: string,
  choices: readonly DoseChoice[],
  mayBeRed: boolean,
  manner: Manner,
): Button[] {
  const ways = choices.flatMap((choice, place) => {
    if (choice.over_limit) return [];
    const label =
      choice.target === undefined ? ('button-choice-leave' as const) : ('button-choice-to' as const);
    return [{ key: `c:${ref}:${place}`, label, values: { free: perLitre(choice.free_mg_L, manner) } }];
  });
  const others = [...(mayBeRed ? (['red'] as const) : []), 'm' as const].map((does) => ({
    key: `${does}:${ref}`,
    label: LABELS[does],
    values: {},
  }));
  return [...ways, ...others].map((button, at) => ({ ...button, mark: String(at + 1) }));
}

/** A button for each value of the field that is asked, marked with its letter. */
export function letterButtons(
  ref: string,
  field: AskedField,
  choices: readonly Fields[],
  mark: DecimalMark,
): Button[] {
  return choices.map((fields, at) => ({
    key: `l:${ref}:${letterAt(at)}`,
    mark: letterAt(at),
    label: labelOf(field, fields, choices),
    values: { value: choiceText(fields, mark) },
  }));
}

/** Among solutions a powder is named as one; the salts of a tablet are none. */
function labelOf(field: AskedField, { additive }: Fields, choices: readonly Fields[]): string {
  const amongSolutions = choices.some((one) => one.additive?.endsWith('-solution'));
  const isPowder = additive !== undefined && ADDITIVES[additive].kind === 'powder';
  return amongSolutions && isPowder ? 'choice-powder' : `choice-${field}`;
}

function choiceText({ additive, tablet_salt_g, tablet_SO2_g }: Fields, mark: DecimalMark): string {
  return additive ?? numberText(tablet_salt_g ?? tablet_SO2_g ?? 0, 2, mark);
}

/** A button's key taken apart: what it does, to which reading, and which of several it is. */
export interface Pressed {
  readonly does: Does;
  readonly ref: string;
  readonly which: string;
}

/** Takes a button's key apart; undefined for one that we never made. */
export function parseKey(key: string): Pressed | undefined {
  const match = /^(w|s|t|m|nf|red|c|l):(\d{1,9}\.\d{1,9})(?::([a-z]|\d))?$/.exec(key);
  if (!match) return undefined;
  return { does: match[1] as Does, ref: match[2] ?? '', which: match[3] ?? '' };
}
