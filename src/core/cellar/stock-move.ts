import type { AdditiveNoted, Entry, Happening } from './entry.ts';
import type { StockUnit } from './shelf.ts';

/** What an entry does to the shelf of an additive. */
export interface StockMove {
  readonly shelf: string;
  readonly kind: AdditiveNoted;
  readonly unit: StockUnit;
  readonly does: 'in' | 'out' | 'count';
  /** Whole thousandths of the unit. */
  readonly amount: number;
  readonly lot?: string;
}

/**
 * What an entry does to the stock: what was received comes in; additions, what was used for equipment and what was
 * thrown away go out; a count says what there is. Undefined for everything else, and where the amount or the additive is
 * not known. Amounts are thousandths of grams, millilitres or tablets.
 *
 * @example
 * ```ts
 * stockMove({ kind: 'addition', vessels: ['tank 4'], additive: 'potassium-metabisulfite', mass_g: 256 })?.amount // => 256000
 * stockMove({ kind: 'reading', vessels: ['tank 4'], ph: 3.5 }) // => undefined
 * ```
 */
export function stockMove(entry: Happening | Entry): StockMove | undefined {
  if ((entry.kind !== 'addition' && entry.kind !== 'stock') || entry.additive === undefined) return undefined;
  const measured = amountOf(entry);
  if (measured === undefined) return undefined;
  const { value, unit } = measured;
  const does = entry.kind === 'addition' ? 'out' : DOES[entry.event];
  const kind = kindOf(entry);
  return {
    shelf: shelfName(kind, unit),
    kind,
    unit,
    does,
    amount: Math.round(value * 1000),
    ...(entry.chemical_lot !== undefined && { lot: entry.chemical_lot }),
  };
}

const DOES = { received: 'in', used: 'out', discarded: 'out', counted: 'count' } as const;

interface Amounts {
  readonly mass_g?: number;
  readonly additive_volume_mL?: number;
  readonly tablets?: number;
}

/** Tablets are counted also where the log has the grams that they give; a solution is measured. */
function amountOf(noted: Amounts & AdditiveNoted): { value: number; unit: StockUnit } | undefined {
  const { mass_g, additive_volume_mL, tablet_SO2_g, tablet_salt_g } = noted;
  const size_g = tablet_SO2_g ?? tablet_salt_g;
  const tablets = noted.tablets ?? (size_g && mass_g !== undefined ? mass_g / size_g : undefined);
  if (tablets !== undefined) return { value: tablets, unit: 'tablets' };
  if (additive_volume_mL !== undefined) return { value: additive_volume_mL, unit: 'mL' };
  return mass_g === undefined ? undefined : { value: mass_g, unit: 'g' };
}

/** Tablets of two sizes, and solutions of two strengths, are two things; a powder's assay makes no other powder. */
function kindOf(noted: AdditiveNoted): AdditiveNoted {
  const { additive, strength_percent, strength_of, tablet_SO2_g, tablet_salt_g } = noted;
  const isSolution = additive?.endsWith('-solution') === true;
  return {
    ...(additive !== undefined && { additive }),
    ...(isSolution && strength_percent !== undefined && { strength_percent }),
    ...(isSolution && strength_of !== undefined && { strength_of }),
    ...(tablet_SO2_g !== undefined && { tablet_SO2_g }),
    ...(tablet_salt_g !== undefined && { tablet_salt_g }),
  };
}

function shelfName(kind: AdditiveNoted, unit: StockUnit): string {
  const { additive, strength_percent, strength_of, tablet_SO2_g, tablet_salt_g } = kind;
  const sizes = [strength_percent, strength_of, tablet_SO2_g, tablet_salt_g].map((one) => one ?? '');
  return [additive, unit, ...sizes].join(' ').trimEnd();
}
