import type { Stage } from '../../core/wine.ts';
import type { Board, Finder, Finding } from './board.ts';
import { findingOf, holdsCue, isFound, placeOf, termAt } from './board.ts';
import { findAdditiveVolume } from './finders/additive-volume.ts';
import { findAdditive } from './finders/additive.ts';
import { findAllowance } from './finders/allowance.ts';
import { USUAL_BARREL_L, findBarrels } from './finders/barrels.ts';
import { findKind } from './finders/kind.ts';
import { findLabelled } from './finders/labels.ts';
import { findLetterPair } from './finders/letter-pair.ts';
import { findMass } from './finders/mass.ts';
import { findNumberWord } from './finders/number-word.ts';
import { findOtherAdditive } from './finders/other-additive.ts';
import { findOtherQuantities } from './finders/other-quantities.ts';
import { findOtherFigures } from './finders/other-figures.ts';
import { findPairs } from './finders/pairs.ts';
import { findPastTense } from './finders/past-tense.ts';
import { findPercentAndDegree } from './finders/percent-and-degree.ts';
import { findPowderOrSO2 } from './finders/powder-or-so2.ts';
import { findRate } from './finders/rate.ts';
import { findSolutionUse } from './finders/solution-use.ts';
import { findSpoon } from './finders/spoon.ts';
import { findStage, mostCautious } from './finders/stage.ts';
import { findTablets } from './finders/tablets.ts';
import { findMolecular } from './finders/molecular.ts';
import { findTarget } from './finders/target.ts';
import { findWay } from './finders/way.ts';
import { findAddition } from './finders/addition.ts';
import { findVessel } from './finders/vessel.ts';
import { findVolume } from './finders/volume.ts';
import { settleBounds } from './refine/bounds.ts';
import { settleConflicts } from './refine/conflicts.ts';
import { decideIntent } from './refine/intent.ts';
import { readUnlabelled } from './refine/unlabelled.ts';
import { isForeignTalk } from './message-language.ts';
import { isStranger } from './stranger.ts';
import type { Draft, FieldName, Fields, Place } from './understood.ts';

/** From the most certain to the least: what one has claimed, no later one reads. */
const FINDERS: readonly Finder[] = [
  findStage,
  findPastTense,
  findLetterPair,
  findVessel,
  findOtherFigures,
  findSolutionUse,
  findOtherQuantities,
  findAllowance,
  findSpoon,
  findRate,
  findTablets,
  findBarrels,
  findAdditive,
  findPowderOrSO2,
  findAdditiveVolume,
  findVolume,
  findMass,
  findNumberWord,
  findWay,
  findTarget,
  findMolecular,
  findAddition,
  findLabelled,
  findPercentAndDegree,
  findKind,
  findPairs,
  findOtherAdditive,
  readUnlabelled,
  settleConflicts,
  settleBounds,
];

/** Several vessels with one volume: of each, in all, or asked. */
function shareVolume(board: Board, fields: Record<string, unknown>): void {
  const vessels = findingOf(board, 'vessels')?.value;
  if (vessels === undefined) return;
  const place = findingOf(board, 'volume_L');
  const volume = place?.value;
  const isWorded = vessels[0]?.startsWith('barrel ') === true;
  const isBarrels = isWorded || /^B\d/.test(vessels[0] ?? '');
  if (place === undefined || volume === undefined) {
    if (isWorded) {
      board.marks.barrelsAssumed_L = vessels.length * USUAL_BARREL_L;
      board.marks.barrelsCounted = true;
    }
  } else if (
    !board.marks.statedTotal &&
    (board.marks.statedEach ||
      holdsCue(board, 'each') ||
      (isBarrels && volume <= 700 && !holdsCue(board, 'altogether')))
  ) {
    fields['volume_L'] = volume * vessels.length;
    if (!board.marks.statedEach && !holdsCue(board, 'each'))
      board.notes.push({ id: 'each-or-total', text: placeOf(board, place.from, place.to).text });
  } else if (!board.marks.statedTotal && !holdsCue(board, 'altogether')) {
    delete fields['volume_L'];
    board.marks.eachOrTotal = true;
    board.problems.push({ code: 'ambiguous-number', about: placeOf(board, place.from, place.to).text });
    board.notes.push({ id: 'each-or-total', text: '' });
  }
}

/** One numbered barrel without a size counts as a usual one. */
function assumeBarrel(board: Board): void {
  const vessel = findingOf(board, 'vessel')?.value;
  if (vessel?.startsWith('barrel ') && !isFound(board, 'volume_L') && !board.marks.casksWithoutSize)
    board.marks.barrelsAssumed_L ??= USUAL_BARREL_L;
}

function fieldsOf(board: Board): Fields {
  const fields: Record<string, unknown> = {};
  for (const { field, value } of board.findings) if (field !== 'stage') fields[field] ??= value;
  const stages = board.findings
    .filter((finding): finding is Finding<'stage'> => finding.field === 'stage')
    .map(({ value }) => value as Stage);
  const stage = mostCautious(stages);
  if (stage) fields['stage'] = stage;
  shareVolume(board, fields);
  return fields;
}

function placesOf(board: Board): Partial<Record<FieldName, Place>> {
  const places: Partial<Record<FieldName, Place>> = {};
  for (const { field, from, to } of board.findings) places[field] ??= placeOf(board, from, to);
  return places;
}

/** `puncheon 3`: the word names the vessel, and says too that its size is not a barrel's. */
function noteCask(board: Board): void {
  const named = findingOf(board, 'vessel');
  if (
    named &&
    board.terms
      .slice(named.from, named.to + 1)
      .some((_, k) => termAt(board, named.from + k).tags.includes('vessel:cask'))
  )
    board.marks.casksWithoutSize = true;
}

/** More figures than one reading can hold; own threshold, so that no text takes long. */
const MOST_FIGURES = 100;

const holdsTooMany = ({ terms }: Board): boolean =>
  terms.length > MOST_FIGURES && terms.filter(({ kind }) => kind === 'number').length > MOST_FIGURES;

/** Nobody can tell which of so many figures is which. */
const tooManyFigures = (board: Board): Draft => ({
  intent: 'dose',
  fields: {},
  problems: [{ code: 'ambiguous-number', about: placeOf(board, 0, 5).text }],
  setAside: [],
  notes: [],
  marks: {},
  where: {},
});

/** Words of another language beside a reading: what they said is not in it, and that has to be told. */
function noteUnread(board: Board, intent: Draft['intent']): void {
  if (intent === 'chat' || !isForeignTalk(board.terms, board.settings.language)) return;
  const unread = board.terms.flatMap((_, i) => (isStranger(board, i) ? [placeOf(board, i, i).text] : []));
  if (unread.length > 0) board.notes.push({ id: 'unread-words', text: unread.slice(0, 6).join(', ') });
}

/**
 * Runs every finder and refiner over a board, and says what the message wants.
 *
 * @param board The table with the terms of one line or message; it is written on.
 */
export function readDraft(board: Board): Draft {
  if (holdsTooMany(board)) return tooManyFigures(board);
  for (const find of FINDERS) find(board);
  noteCask(board);
  assumeBarrel(board);
  const intent = decideIntent(board);
  const fields = fieldsOf(board);
  if (intent === 'dose' && isFound(board, 'mass_g'))
    board.notes.push({ id: 'mass-beside-readings', text: '' });
  if (board.marks.fruitByWeight) board.notes.push({ id: 'fruit-by-weight', text: '' });
  noteUnread(board, intent);
  const { strengthAsSalt, volumeUnit, containers, concentrationUnit } = board.marks;
  return {
    intent,
    fields,
    problems: board.problems,
    setAside: board.setAside,
    notes: board.notes,
    marks: board.marks,
    where: placesOf(board),
    ...(strengthAsSalt && { strength_of: 'salt' as const }),
    ...(volumeUnit && { volumeUnit }),
    ...(containers !== undefined && { containers }),
    ...(concentrationUnit && { concentrationUnit }),
  };
}
