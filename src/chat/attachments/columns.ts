import type { EntryField } from './entry-fields.ts';

/** Columns for the eye, which follow from others and are not read again. */
export type ShownColumn =
  | 'done'
  | 'noted'
  | 'late'
  | 'person'
  | 'wine-lot'
  | 'wine'
  | 'us-gallons'
  | 'stock-left'
  | 'calculated'
  | 'struck-reason';

/** Columns that are read again: the fields of entries, who noted them, and what took them back. */
export type RecordColumn = EntryField | 'name' | 'struck_by';

/** A column of the export: either for the eye, or with a name of its own that no language changes. */
export type Column = {
  readonly letters: number; // how wide, in characters
  readonly decimals?: number;
} & ({ readonly shown: ShownColumn } | { readonly record: RecordColumn });

/**
 * The columns of an export, in their order: what a bookkeeper or an inspector looks for first, what only a machine
 * wants last. The choice follows the record duties that are known: kinds, quantities, date of receipt and supplier of
 * chemicals (US, 27 CFR 24.320), volumes in litres or wine gallons and entry by the third business day (27 CFR
 * 24.300), operations a batch (EU, Delegated Regulation 2018/273, Articles 28 and 29), records within three days
 * (Australia, Label Integrity Program). None of them names these columns, and none was found that asks less.
 */
export const COLUMNS: readonly Column[] = [
  { record: 'entry', letters: 8 },
  { record: 'kind', letters: 11 },
  { shown: 'done', letters: 17 },
  { shown: 'noted', letters: 17 },
  { shown: 'late', letters: 8 },
  { shown: 'person', letters: 14 },
  { record: 'vessels', letters: 18 },
  { record: 'to', letters: 12 },
  { record: 'event', letters: 11 },
  { shown: 'wine-lot', letters: 18 },
  { shown: 'wine', letters: 14 },
  { record: 'additive', letters: 26 },
  { record: 'strength_percent', letters: 10 },
  { record: 'chemical_lot', letters: 14 },
  { record: 'supplier', letters: 18 },
  { record: 'mass_g', letters: 11, decimals: 2 },
  { record: 'additive_volume_mL', letters: 11, decimals: 1 },
  { record: 'tablets', letters: 9 },
  { shown: 'stock-left', letters: 12, decimals: 2 },
  { record: 'SO2_g', letters: 11, decimals: 2 },
  { record: 'added_mg_L', letters: 11, decimals: 1 },
  { record: 'planned_mg_L', letters: 11, decimals: 1 },
  { record: 'planned_free_mg_L', letters: 11, decimals: 1 },
  { record: 'volume_L', letters: 12, decimals: 1 },
  { shown: 'us-gallons', letters: 12, decimals: 1 },
  { record: 'ph', letters: 8, decimals: 2 },
  { record: 'free_mg_L', letters: 10, decimals: 1 },
  { record: 'total_mg_L', letters: 10, decimals: 1 },
  { record: 'temperature_C', letters: 11, decimals: 1 },
  { record: 'alcohol_percent', letters: 10, decimals: 1 },
  { record: 'sugar_g_L', letters: 10, decimals: 1 },
  { record: 'over_rule', letters: 18 },
  { record: 'order', letters: 9 },
  { record: 'remark', letters: 30 },
  { record: 'corrects', letters: 9 },
  { record: 'reason', letters: 22 },
  { record: 'struck_by', letters: 9 },
  { shown: 'struck-reason', letters: 22 },
  { shown: 'calculated', letters: 14 },
  { record: 'at', letters: 30 },
  { record: 'noted_at', letters: 30 },
  { record: 'by', letters: 8 },
  { record: 'name', letters: 14 },
  { record: 'style', letters: 8 },
  { record: 'category', letters: 10 },
  { record: 'product', letters: 10 },
  { record: 'organic', letters: 8 },
  { record: 'stage', letters: 11 },
  { record: 'designated_mg_L', letters: 11, decimals: 1 },
  { record: 'uplift', letters: 8 },
  { record: 'quality', letters: 8 },
  { record: 'pdo', letters: 8 },
  { record: 'bulk', letters: 8 },
  { record: 'density_kg_L', letters: 10, decimals: 4 },
  { record: 'reserve_mg_L', letters: 11, decimals: 1 },
  { record: 'lot', letters: 18 },
  { record: 'capacity_L', letters: 12, decimals: 1 },
  { record: 'until', letters: 30 },
  { record: 'strength_of', letters: 10 },
  { record: 'tablet_SO2_g', letters: 10 },
  { record: 'tablet_salt_g', letters: 10 },
  { record: 'key', letters: 30 },
];
