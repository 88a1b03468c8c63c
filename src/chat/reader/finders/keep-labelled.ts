import { celsiusSaid } from '../celsius-said.ts';
import type { Board, Said } from '../board.ts';
import { decimalAt, figureAt, find, hasTag, isMark, placeOf, refuse } from '../board.ts';
import type { LabelId } from '../words/words.ts';
import { concentrationAt, mg_L_IN } from '../units.ts';
import { mayBeOrder } from '../refine/may-be-order.ts';
import type { Beside } from './figure-beside.ts';

/** A figure without the word free is free SO2 up to this; above it may be total (mg/L). */
export const MOST_UNLABELLED_FREE_mg_L = 60;

/** Writes the figure that a label names as its field, in the field's unit; or refuses it. */
export function keepFigure(board: Board, label: LabelId, beside: Beside, from: number, to: number): void {
  const said: Said = 'labelled';
  const figure = label === 'ph' ? decimalAt(board, beside.at) : figureAt(board, beside.at);
  const conc = concentrationAt(board, beside.at + 1);
  if (Number.isNaN(figure.value) || figure.unsure)
    return refuse(board, 'ambiguous-number', beside.at, beside.to);
  const isSO2 = label === 'free' || label === 'total' || label === 'so2';
  if (conc && (label === 'ph' || label === 'temperature' || label === 'alcohol'))
    return refuse(board, 'unit-mismatch', from, to);
  if (isSO2 && (isMark(board, beside.at + 1, '%') || isMark(board, beside.at + 1, '°') || conc?.id === 'g/L'))
    return refuse(board, 'unit-mismatch', from, to);
  if (conc?.id === 'ppm' || conc?.id === 'mg/L' || conc?.id === 'g/hL')
    board.marks.concentrationUnit ??= conc.id;
  if (figure.value < 0 && label !== 'temperature') return refuse(board, 'negative-value', from, to);
  const value = figure.value * (isSO2 && conc ? (mg_L_IN[conc.id] ?? 1) : 1);
  if (label === 'ph') find(board, 'ph', value, said, from, to);
  else if (label === 'free') find(board, 'free_mg_L', value, said, from, to);
  else if (label === 'total') find(board, 'total_mg_L', value, said, from, to);
  else if (label === 'alcohol') find(board, 'alcohol_percent', value, said, from, to);
  else if (label === 'sugar')
    find(
      board,
      'sugar_g_L',
      isMark(board, beside.at + 1, '%')
        ? value * 10
        : conc && conc.id !== 'g/L'
          ? (value * (mg_L_IN[conc.id] ?? 1)) / 1000
          : value,
      said,
      from,
      to,
    );
  else if (label === 'temperature') {
    const unit = [beside.at + 1, beside.at + 2, beside.at + 3]
      .map((k) =>
        k > beside.to
          ? undefined
          : hasTag(board, k, 'unit:F')
            ? 'F'
            : hasTag(board, k, 'unit:C')
              ? 'C'
              : undefined,
      )
      .find(Boolean);
    find(
      board,
      'temperature_C',
      celsiusSaid(figure.value, unit ?? board.settings.temperatureUnit),
      said,
      from,
      to,
    );
  } else if (label === 'so2') keepBareSO2(board, beside.at, value, { from, to });
  else if (label === 'volume') refuse(board, 'ambiguous-number', from, to);
}

/** `SO2 18` is free SO2 up to 60 and said; above it may be total: ask. */
function keepBareSO2(
  board: Board,
  at: number,
  value: number,
  { from, to }: { readonly from: number; readonly to: number },
): void {
  if (value > MOST_UNLABELLED_FREE_mg_L || mayBeOrder(board, at))
    return refuse(board, 'ambiguous-number', from, to);
  board.notes.push({ id: 'free-unlabelled', text: placeOf(board, from, to).text });
  find(board, 'free_mg_L', value, 'bare', from, to);
}
