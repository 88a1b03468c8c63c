import type { Stage } from '../../core/wine.ts';
import type { Board, Finding } from './board.ts';
import { findingOf, holdsCue, isCue, placeOf } from './board.ts';
import { USUAL_BARREL_L } from './finders/barrels.ts';
import { mostCautious } from './finders/stage.ts';
import { isOfEach, shareCounted } from './share-counted.ts';
import type { Draft, FieldName, Fields, Intent, Place } from './understood.ts';

/** Several vessels with one volume: of each, in all, or asked. */
function shareVolume(board: Board, fields: Record<string, unknown>): void {
  const vessels = findingOf(board, 'vessels')?.value;
  if (vessels === undefined) return shareCounted(board, fields);
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
      (isBarrels && isOfEach(volume, vessels.length) && !holdsCue(board, 'altogether')))
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

/** What may be said of each of several vessels. */
const AMOUNTS = ['mass_g', 'additive_volume_mL', 'tablets'] as const;

/** `10 g kmbs each B1-B6`, `10 g per barrel, 12 barrels`: the amount is of each, and as a volume does it stands for all. */
function shareAmount(board: Board, fields: Record<string, unknown>): void {
  const count = findingOf(board, 'vessels')?.value.length ?? board.marks.containers ?? 1;
  if (count < 2) return;
  for (const field of AMOUNTS) {
    const place = findingOf(board, field);
    if (place === undefined) continue;
    const isBeside = [1, 2, 3].some(
      (k) => isCue(board, place.to + k, 'each') || isCue(board, place.to + k, 'per-barrel'),
    );
    const isAlone = findingOf(board, 'volume_L') === undefined && holdsCue(board, 'each');
    if (isBeside || isAlone) fields[field] = place.value * count;
  }
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
  shareAmount(board, fields);
  return fields;
}

function placesOf(board: Board): Partial<Record<FieldName, Place>> {
  const places: Partial<Record<FieldName, Place>> = {};
  for (const { field, from, to } of board.findings) places[field] ??= placeOf(board, from, to);
  return places;
}

/** Intents whose moment is kept; beside any other its figures are set aside. */
const WITH_MOMENT: readonly Intent[] = ['dose', 'added', 'reading', 'titration', 'command'];

/** The moment, the lot and the remark, where the message is one that keeps them. */
function circumstancesOf(board: Board, intent: Intent): Partial<Draft> {
  const { when, chemicalLot, remark } = board;
  const keepsWhen = when !== undefined && WITH_MOMENT.includes(intent);
  const keepsLot = chemicalLot !== undefined && (intent === 'added' || intent === 'command');
  if (when && !keepsWhen && /\d/.test(when.text)) board.setAside.push(when.text);
  if (chemicalLot && !keepsLot) board.setAside.push(chemicalLot.words);
  return {
    ...(keepsWhen && { when }),
    ...(keepsLot && { chemical_lot: chemicalLot.code }),
    ...(remark !== undefined && intent !== 'chat' && { remark }),
  };
}

/** What stands on a board, as the draft of a reading with that intent. */
export function draftOfBoard(board: Board, intent: Intent): Draft {
  const fields = fieldsOf(board);
  const circumstances = circumstancesOf(board, intent);
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
    ...circumstances,
  };
}
