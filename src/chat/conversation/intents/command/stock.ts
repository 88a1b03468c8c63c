import type { CellarView } from '../../../../core/cellar/cellar-store.ts';
import { additiveOf } from '../../../../core/cellar/apply-addition.ts';
import type { StockMovement } from '../../../../core/cellar/entry.ts';
import { lotsLeft } from '../../../../core/cellar/lots-left.ts';
import { stockMove } from '../../../../core/cellar/stock-move.ts';
import type { Command } from '../../../reader/command.ts';
import type { Fields, Reading } from '../../../reader/understood.ts';
import { momentText } from '../../../replies/moment-text.ts';
import type { Line } from '../../../replies/reply.ts';
import { entryButtons } from '../../buttons.ts';
import { drawnBy } from '../../drawn.ts';
import type { Here } from '../../here.ts';
import { line, part } from '../../lines/line.ts';
import { besideAmount, notedAmount } from '../../lines/noted-amount.ts';
import { shelfLines, stockAmount, stockValues } from '../../lines/stock.ts';
import { noting, type Note } from '../../note.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { tellingOf } from '../../telling.ts';
import { whenOf } from '../../when.ts';
import { withShelves } from '../../with-shelves.ts';
import { whenIsUnclear } from '../when-unclear.ts';

type StockNote = Extract<Command, { name: 'stock-note' }>;

/** What stands in the chemical store: all of it, or one additive. */
export async function showStock(
  additive: Fields['additive'],
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const shelves = (await view.shelves()).filter(
    ({ kind }) => additive === undefined || kind.additive === additive,
  );
  const lines = shelves.flatMap((shelf) => shelfLines(shelf, here));
  const none =
    additive === undefined ? line('first', 'stock-none') : line('first', 'stock-none-of', { additive });
  // What is said of old powder is said once.
  const old = lines.findIndex(({ key }) => key === 'stock-old');
  const once = lines.filter(({ key }, at) => key !== 'stock-old' || at === old);
  return replying(here, { lines: lines.length === 0 ? [none] : once });
}

/**
 * Something that came into the chemical store, went out of it otherwise than into wine, or was counted: noted at once,
 * with what there is now. Undefined where something in the message is wrong.
 */
export async function noteStock(
  reading: Reading,
  command: StockNote,
  from: Here,
  view: CellarView,
): Promise<Handled | undefined> {
  if (reading.problems.length > 0) return undefined;
  const here = await withShelves(from, view);
  const lacks = lackOf(reading, command);
  if (lacks !== undefined)
    return replying(here, {
      lines: [
        line('first', 'stock-lacks', {
          what: lacks,
          event: command.event,
          additive: reading.fields.additive ?? '',
        }),
      ],
    });
  const unclear = whenIsUnclear(reading, { here });
  if (unclear) return replying(here, { lines: unclear.lines });
  const { at, is } = whenOf(reading, here);
  const note: Note = { happening: movementOf(reading, command), at };
  const { writes, ...said } = replying(here, {
    lines: [...notedLines(note, command, here), ...(is === 'noon' ? [line('assumed', 'when-noon')] : [])],
    buttons: entryButtons(here.nextEntry, ['u']),
  });
  return { ...said, writes: [...noting(here, [note]), ...writes] };
}

/** What has to be known of it and was not said. */
function lackOf({ fields, marks }: Reading, { event, several }: StockNote): string | undefined {
  if (several) return 'one';
  const { additive, mass_g, additive_volume_mL, tablets, tablet_SO2_g, tablet_salt_g } = fields;
  if (additive === undefined || marks.unnamedAdditive) return 'additive';
  const isDissolved = additive.endsWith('-solution');
  if (isDissolved && fields.strength_percent === undefined) return 'strength';
  const isTablet = additive === 'tablet' || marks.campden === true || tablets !== undefined;
  if (isTablet && tablet_SO2_g === undefined && tablet_salt_g === undefined) return 'size';
  if (isDissolved && mass_g !== undefined) return 'volume';
  const amount = tablets ?? additive_volume_mL ?? mass_g;
  return amount === undefined || (amount === 0 && event !== 'counted') ? 'amount' : undefined;
}

function movementOf(reading: Reading, { event, supplier, purpose }: StockNote): StockMovement {
  const { fields, chemical_lot, remark, strength_of } = reading;
  const { mass_g, additive_volume_mL, tablets } = fields;
  const said = [purpose, remark].filter((one) => one !== undefined).join('; ');
  return {
    kind: 'stock',
    event,
    vessels: [],
    ...additiveOf(fields),
    ...(strength_of !== undefined && { strength_of }),
    ...(chemical_lot !== undefined && { chemical_lot }),
    ...(mass_g !== undefined && { mass_g }),
    ...(additive_volume_mL !== undefined && { additive_volume_mL }),
    ...(tablets !== undefined && { tablets }),
    ...(supplier !== undefined && { supplier }),
    ...(said !== '' && { remark: said }),
  };
}

function notedLines(note: Note, { event, supplier, purpose }: StockNote, here: Here): Line[] {
  const { happening, at } = note;
  if (happening.kind !== 'stock') return [];
  const mark = here.memory.decimalMark ?? '.';
  const amount = notedAmount(happening, mark) ?? part('amount-unknown');
  const { remark: _remark, ...beside } = happening;
  const first: Line = {
    ...line('first', 'stock-noted', {
      entry: String(here.nextEntry),
      event,
      supplier: supplier ?? 'none',
      purpose: purpose ?? 'none',
      when: momentText(at, tellingOf(here)),
    }),
    list: [amount, ...besideAmount(beside)],
  };
  const drawn = drawnBy(note, here);
  if (drawn === undefined) return [first];
  if (drawn.after === undefined) return [first, line('effect', 'stock-not-kept')];
  const { before, after } = drawn;
  const { balance } = lotsLeft(after);
  const values = { ...stockValues(after, balance, mark), counted: 'none' };
  const now = line('effect', balance < 0 ? 'stock-negative' : 'stock-left', values);
  if (event !== 'counted') return [first, now];
  const was = before === undefined ? undefined : lotsLeft(before).balance;
  const off = was === undefined ? 0 : balance - was;
  // Where all of it was counted the first line says what there is.
  const rest = happening.chemical_lot === undefined ? [] : [now];
  if (was === undefined || off === 0) return [first, ...rest];
  const { unit } = stockMove(happening) ?? after;
  const corrected = line('effect', 'stock-corrected', {
    was: stockAmount(was, unit, mark).amount,
    ...stockAmount(Math.abs(off), unit, mark),
    way: off > 0 ? 'more' : 'less',
  });
  return [first, corrected, ...rest];
}
