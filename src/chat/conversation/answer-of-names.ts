import type { AdditiveId } from '../../core/additives/additive-id.ts';
import { foldText } from '../reader/fold-text.ts';
import { joinNumbers } from '../reader/join-numbers.ts';
import { lexiconOf } from '../reader/lexicon.ts';
import { readDraft } from '../reader/read-draft.ts';
import { setBoard } from '../reader/read-message.ts';
import { splitTerms } from '../reader/split-terms.ts';
import type { AskedField, Draft, FieldName, Reading, ReaderSettings } from '../reader/understood.ts';
import type { Waiting } from './memory.ts';
import { isOfSolution } from './waiting.ts';

/** More words than this are no answer but talk; own threshold. */
const MOST_TERMS = 7;

/** A line of a round has not more. */
const MOST_TERMS_A_LINE = 40;

/** What an answer to a question for a name may hold: alone none of it is a message with a business of its own. */
const ANSWERS: Readonly<Partial<Record<AskedField, readonly FieldName[]>>> = {
  vessel: ['vessel', 'vessels'],
  additive: ['additive', 'strength_percent'],
  strength_percent: ['additive', 'strength_percent'],
};

const STOCK_OF: Readonly<Partial<Record<AdditiveId, AdditiveId>>> = {
  'potassium-metabisulfite': 'potassium-metabisulfite-solution',
  'sodium-metabisulfite': 'sodium-metabisulfite-solution',
};

function draftOf(text: string, most: number, settings: ReaderSettings): Draft | undefined {
  const folded = foldText(text);
  const terms = joinNumbers(splitTerms(folded, lexiconOf(folded, settings.language)));
  return terms.length > most ? undefined : readDraft(setBoard(text, folded, terms, settings));
}

/**
 * The answer to a question for a vessel, an additive or its strength, which alone would be talk: `T4`, `kmbs`,
 * `potassium bisulfite salt 30%`. Undefined where it names none of what is asked.
 */
export function answerOfNames(
  text: string,
  { field, reading }: Pick<Waiting, 'field' | 'reading'>,
  settings: ReaderSettings,
): Partial<Reading> | undefined {
  const wanted = ANSWERS[field];
  const draft = wanted && !text.includes('?') ? draftOf(text, MOST_TERMS, settings) : undefined;
  if (wanted === undefined || draft === undefined || draft.problems.length > 0) return undefined;
  const names = Object.keys(draft.fields) as FieldName[];
  if (names.length === 0 || !names.every((name) => wanted.includes(name))) return undefined;
  const { additive, strength_percent } = draft.fields;
  const stock = additive === undefined ? undefined : STOCK_OF[additive];
  // Who said "solution" before names its salt now.
  if (stock === undefined || strength_percent !== undefined || !isOfSolution(reading)) return draft;
  return { ...draft, fields: { ...draft.fields, additive: stock } };
}

/** The vessel that a line names, and in which words; undefined where it names none. */
export function vesselIn(
  text: string,
  settings: ReaderSettings,
): { readonly vessel: string; readonly written: string } | undefined {
  const draft = draftOf(text, MOST_TERMS_A_LINE, settings);
  const vessel = draft?.fields.vessel ?? draft?.fields.vessels?.join();
  const place = draft?.where.vessel ?? draft?.where.vessels;
  return vessel === undefined ? undefined : { vessel, written: place?.text ?? vessel };
}
