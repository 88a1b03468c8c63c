import { ADDITIVES } from '../../core/additives/additives.ts';
import type { DoseChoice } from '../../core/dose/answer.ts';
import { mustFigures } from '../../core/dose/must-ranges.ts';
import type { AskedField, Fields, Reading } from '../reader/understood.ts';
import { numberText } from '../replies/number-text.ts';
import { vesselName } from '../replies/vessel-name.ts';
import { volumeText } from '../replies/volume-text.ts';
import type { Button } from '../replies/reply.ts';
import type { SentenceKey } from '../replies/sentence-keys.ts';
import { perLitre, type Manner } from './manner.ts';
import { letterAt } from './waiting.ts';

/** What a button does to a reading; its key is `does:ref`, of a choice `does:ref:which`. */
export type Does =
  | 'w' | 's' | 't' | 'm' | 'nf' | 'red' | 'white' | 'c' | 'l'
  | 'p' | 'k' | 'f' | 'fy' | 'a' | 'y' | 'o' | 'n' | 'i' | 'gb' | 'ga' | 'gd'; // prettier-ignore

/** What a button does to an entry of the log; its key is `does:entry`. */
export type DoesToEntry = 'u' | 'd' | 'r';

/** At most so many buttons stand under a dose for a vessel, and under one for none, which cannot be noted. */
const MOST_BUTTONS = { vessel: 6, none: 4 } as const;

/** What stands on a button, by what it does. */
export const LABELS = {
  k: 'button-keep-result',
  a: 'button-added',
  f: 'button-full-dose',
  fy: 'button-all-the-same',
  y: 'button-mine',
  o: 'button-order',
  n: 'button-note',
  i: 'button-take',
  gb: 'button-sampled-before',
  ga: 'button-sampled-after',
  gd: 'button-dose-anyway',
  nf: 'button-not-finished',
  red: 'button-red',
  white: 'button-white',
  w: 'button-working',
  s: 'button-safety',
  t: 'button-target',
  m: 'button-more',
} as const satisfies Partial<Record<Does, SentenceKey>>;

const ENTRY_LABELS = {
  u: 'button-undo',
  d: 'button-done',
  r: 'button-remind',
} as const satisfies Record<DoesToEntry, SentenceKey>;

/** The plain buttons of a remembered reading, marked 1, 2, 3 … as they stand. */
export function buttonsFor(ref: string, does: readonly (keyof typeof LABELS)[]): Button[] {
  return does.map((one, at) => ({
    key: `${one}:${ref}`,
    mark: String(at + 1),
    label: LABELS[one],
    values: {},
  }));
}

/** A button for each of several titrations, which keeps it as a reading of its vessel; marked as they stand. */
export function keepButtons(
  results: readonly { readonly ref: string; readonly vessel: string; readonly of: 'free' | 'total' }[],
): Button[] {
  return results.map(({ ref, vessel, of }, at) => ({
    key: `k:${ref}`,
    mark: String(at + 1),
    label: 'button-keep-of' as const,
    values: { vessel: vesselName(vessel), of },
  }));
}

/** The buttons of an entry of the log, marked 1, 2, 3 … as they stand. */
export function entryButtons(entry: number, does: readonly DoesToEntry[]): Button[] {
  return does.map((one, at) => ({
    key: `${one}:${entry}`,
    mark: String(at + 1),
    label: ENTRY_LABELS[one],
    values: { entry: String(entry) },
  }));
}

/** Which buttons apply under a dose. */
export interface Applies {
  /** Whether the dose is for a vessel and one amount, so that it can be noted when it went in. */
  readonly mayBeNoted: boolean;
  /** Whether it is a smaller dose in place of one that passes a limit. */
  readonly isCapped?: true;
  readonly stageAssumed: boolean;
  readonly mayBeRed: boolean;
  /** Whether a vessel is named whose colour nobody has told. */
  readonly colourUnknown: boolean;
  readonly cautionsShort: boolean;
}

/**
 * The weightiest under a dose: that it went in, that somebody does it now, the stage, the colour, the cautions where they
 * stand in one line, the working, another target; `More` comes last and leads to all the rest.
 */
export function doseButtons(ref: string, applies: Applies): Button[] {
  const all = [
    ...(applies.mayBeNoted ? (['a', 'y'] as const) : []),
    ...(applies.isCapped ? (['f'] as const) : []),
    ...(applies.stageAssumed && !applies.isCapped ? (['nf'] as const) : []),
    ...(applies.mayBeRed || applies.colourUnknown ? (['red'] as const) : []),
    ...(applies.colourUnknown ? (['white'] as const) : []),
    ...(applies.cautionsShort ? (['s'] as const) : []),
    'w' as const,
    't' as const,
  ];
  const most = applies.mayBeNoted ? MOST_BUTTONS.vessel : MOST_BUTTONS.none;
  return buttonsFor(ref, [...all.slice(0, most - 1), 'm']);
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

/** A button for each figure that was published for must of fruit in the state that was told; none where none was. */
export function publishedButtons(ref: string, { marks, fields }: Reading, manner: Manner): Button[] {
  const { fruitState } = marks;
  if (fields.stage !== 'must' || fruitState === undefined || fields.product !== undefined) return [];
  return mustFigures(fruitState, fields.style).map((add_mg_L, place) => ({
    key: `p:${ref}:${place}`,
    mark: String(place + 1),
    label: 'button-published' as const,
    values: { add: perLitre(add_mg_L, manner) },
  }));
}

/** A button for each value of the field that is asked, marked with its letter. */
export function letterButtons(
  ref: string,
  field: AskedField,
  choices: readonly Fields[],
  manner: Manner,
): Button[] {
  return choices.map((fields, at) => ({
    key: `l:${ref}:${letterAt(at)}`,
    mark: letterAt(at),
    label: labelOf(field, fields, choices),
    values: { value: choiceText(fields, manner) },
  }));
}

/** Among solutions a powder is named as one; the salts of a tablet are none. */
function labelOf(field: AskedField, { additive }: Fields, choices: readonly Fields[]): string {
  const amongSolutions = choices.some((one) => one.additive?.endsWith('-solution'));
  const isPowder = additive !== undefined && ADDITIVES[additive].kind === 'powder';
  return amongSolutions && isPowder ? 'choice-powder' : `choice-${field}`;
}

function choiceText(
  { additive, tablet_salt_g, tablet_SO2_g, volume_L }: Fields,
  { mark, volumeUnit }: Manner,
): string {
  if (volume_L !== undefined) return volumeText(volume_L, volumeUnit, mark);
  return additive ?? numberText(tablet_salt_g ?? tablet_SO2_g ?? 0, 2, mark);
}

/** A button's key taken apart: what it does, to which reading, and which of several it is. */
export interface Pressed {
  readonly does: Does;
  readonly ref: string;
  readonly which: string;
}

/** Takes a button's key apart; undefined for one that is of no reading, or that we never made. */
export function parseKey(key: string): Pressed | undefined {
  const match =
    /^(p|k|w|s|t|m|nf|red|white|c|l|fy|f|a|y|o|n|i|gb|ga|gd):(\d{1,9}\.\d{1,9})(?::([a-z]|\d))?$/.exec(key);
  if (!match) return undefined;
  return { does: match[1] as Does, ref: match[2] ?? '', which: match[3] ?? '' };
}

/** The key of a button of an entry taken apart; undefined for any other. */
export function parseEntryKey(
  key: string,
): { readonly does: DoesToEntry; readonly entry: number } | undefined {
  const match = /^(u|d|r):(\d{1,9})$/.exec(key);
  return match ? { does: match[1] as DoesToEntry, entry: Number(match[2]) } : undefined;
}
