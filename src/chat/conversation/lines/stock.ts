import type { Addition } from '../../../core/cellar/entry.ts';
import { isLot, lotsLeft, type LotLeft } from '../../../core/cellar/lots-left.ts';
import type { Shelf, StockUnit } from '../../../core/cellar/shelf.ts';
import { stockMove } from '../../../core/cellar/stock-move.ts';
import { DAY_ms } from '../../../core/time/durations.ts';
import { dayText } from '../../replies/moment-text.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import { drawnBy, openLots } from '../drawn.ts';
import type { Here } from '../here.ts';
import { tellingOf } from '../telling.ts';
import { line } from './line.ts';

/** A powder that came in longer ago may have lost strength, in days (common practice, no source for the figure). */
const OLD_days = 365;

/** Less than this share of what came in last is running low (own threshold). */
const LOW_share = 0.1;

/**
 * Values that say how much of what there is, and in what it is counted.
 *
 * @param thousandths of the shelf's unit
 */
export function stockValues(
  { kind, unit }: Pick<Shelf, 'kind' | 'unit'>,
  thousandths: number,
  mark: DecimalMark,
): Record<'additive' | 'strength' | 'size' | 'amount' | 'unit', string> {
  const size_g = kind.tablet_SO2_g ?? kind.tablet_salt_g;
  const { strength_percent } = kind;
  return {
    additive: kind.additive ?? '',
    strength: strength_percent === undefined ? 'none' : numberText(strength_percent, 2, mark),
    size: size_g === undefined ? 'none' : numberText(size_g, 2, mark),
    ...stockAmount(thousandths, unit, mark),
    // The name of effervescent tablets says already what they are.
    ...(kind.additive === 'tablet' && { unit: 'none' }),
  };
}

/**
 * An amount of the store, with a minus where it is below zero; the word for tablets is the sentence's.
 *
 * @param thousandths of `unit`
 */
export function stockAmount(
  thousandths: number,
  unit: StockUnit,
  mark: DecimalMark,
): Record<'amount' | 'unit', string> {
  const value = Math.abs(thousandths) / 1000;
  const sign = thousandths < 0 ? '−' : '';
  if (unit === 'tablets') {
    return { amount: `${sign}${numberText(value, 2, mark)}`, unit: value === 1 ? 'tablet' : 'tablets' };
  }
  const isLarge = value >= 1000;
  const shown = isLarge ? value / 1000 : value;
  const large = unit === 'g' ? 'kg' : 'L';
  const decimals = isLarge ? 2 : value < 10 ? 2 : 0;
  return { amount: `${sign}${numberText(shown, decimals, mark)} ${isLarge ? large : unit}`, unit: 'none' };
}

/** What stands on a shelf: how much in all, each lot that has something left, and what is to be said of it. */
export function shelfLines(shelf: Shelf, here: Pick<Here, 'settings' | 'message' | 'memory'>): Line[] {
  const mark = here.memory.decimalMark ?? '.';
  const telling = tellingOf(here);
  const { balance } = lotsLeft(shelf);
  const open = openLots(shelf);
  const counted = shelf.counted_at === undefined ? 'none' : dayText(shelf.counted_at, telling);
  const head = line('first', balance < 0 ? 'stock-negative' : 'stock-shelf', {
    ...stockValues(shelf, balance, mark),
    counted,
  });
  const old = open.filter(({ at }) => here.message.at - at > OLD_days * DAY_ms);
  return [
    head,
    ...open.map((lot) => lotLine(lot, shelf, here)),
    ...(old.length > 0 && shelf.unit === 'g' ? [line('warning', 'stock-old')] : []),
  ];
}

function lotLine(lot: LotLeft, { unit }: Shelf, here: Pick<Here, 'settings' | 'message' | 'memory'>): Line {
  return line('first', 'stock-lot', {
    ...stockAmount(lot.left, unit, here.memory.decimalMark ?? '.'),
    lot: lot.lot ?? 'none',
    supplier: lot.supplier ?? 'none',
    day: dayText(lot.at, tellingOf(here)),
  });
}

/** What an addition leaves in the store, where there is a shelf of it: the lot that it is taken from, and what is odd. */
export function drawnLines(
  note: { readonly happening: Addition; readonly at: number },
  here: Here,
): { readonly odd: Line[]; readonly left: Line[] } {
  const drawn = drawnBy(note, here);
  if (drawn?.before === undefined || drawn.after === undefined) return { odd: [], left: [] };
  const { before, after } = drawn;
  const mark = here.memory.decimalMark ?? '.';
  const { balance } = lotsLeft(after);
  const values = { ...stockValues(after, balance, mark), counted: 'none' };
  if (balance < 0) return { odd: [line('effect', 'stock-negative', values)], left: [] };
  const was = lotsLeft(before).balance;
  const low = LOW_share * (before.lots.at(-1)?.received ?? 0);
  const isLow = balance < low && was >= low;
  return {
    odd: isLow ? [line('effect', 'stock-low', values)] : [],
    left: [...(isLow ? [] : [line('effect', 'stock-left', values)]), ...ofWhichLot(note.happening, before)],
  };
}

/** From which lot it was taken, where nobody has said so and several are open, or where the one that was said is none. */
function ofWhichLot({ chemical_lot }: Addition, before: Shelf): Line[] {
  const open = openLots(before);
  const values = { lot: open[0]?.lot ?? 'none', other: open.at(-1)?.lot ?? '4471' };
  if (chemical_lot === undefined) return open.length > 1 ? [line('assumed', 'stock-oldest-lot', values)] : [];
  const isKnown = before.lots.some((lot) => isLot(lot, chemical_lot));
  return isKnown ? [] : [line('assumed', 'stock-lot-unknown', { lot: chemical_lot })];
}

/** That a dose is more than there is of it; it is said, and holds nobody up. */
export function shortLines(dose: Omit<Addition, 'kind' | 'vessels'> | undefined, here: Here): Line[] {
  const move = dose && stockMove({ kind: 'addition', vessels: [], ...dose });
  const shelf = move && here.shelves.find((one) => one.shelf === move.shelf);
  if (move === undefined || shelf === undefined) return [];
  const { balance } = lotsLeft(shelf);
  if (balance >= move.amount) return [];
  const mark = here.memory.decimalMark ?? '.';
  return [line('condition', 'stock-short', stockValues(shelf, Math.max(0, balance), mark))];
}
