import type { AdditiveId } from '../../core/additives/additive-id.ts';
import { BOUNDS } from '../../core/bounds.ts';
import type { BoundedField } from '../../core/bounds.ts';
import type { Entry, Happening, StockEvent, VesselEvent } from '../../core/cellar/entry.ts';
import type { Category, Product, Stage, Style } from '../../core/wine.ts';

type FieldsOf<T> = T extends unknown ? keyof T : never;

/** Every field that an entry of any kind can have; what a vessel's usual additive is stands in the additive's own. */
export type EntryField = Exclude<FieldsOf<Entry>, 'usual'>;

/** What a field holds. Choices are an object for its keys, so that the type check misses none. */
export type FieldForm =
  | { readonly is: 'text' | 'names' | 'count' | 'time' | 'yes-no' }
  /** A number in the unit of the field's name, `min` and `max` included. */
  | { readonly is: 'number'; readonly min: number; readonly max: number }
  | { readonly is: 'choice'; readonly of: Readonly<Record<string, true>> };

const number = (min: number, max: number): FieldForm => ({ is: 'number', min, max });
const bounded = (field: BoundedField): FieldForm => number(BOUNDS[field].min, BOUNDS[field].max);

/**
 * The form of each field. Figures lie in the bounds of core where it has some; other limits are own thresholds that
 * keep nonsense of a foreign hand out.
 */
export const FIELD_FORMS: Readonly<Record<EntryField, FieldForm>> = {
  entry: { is: 'count' },
  kind: {
    is: 'choice',
    of: {
      addition: true,
      reading: true,
      vessel: true,
      order: true,
      correction: true,
      other: true,
      stock: true,
    } satisfies Record<Happening['kind'], true>,
  },
  key: { is: 'text' },
  at: { is: 'time' },
  noted_at: { is: 'time' },
  by: { is: 'count' },
  vessels: { is: 'names' },
  to: { is: 'text' },
  event: {
    is: 'choice',
    of: {
      told: true,
      racked: true,
      topped: true,
      acid: true,
      moved: true,
      blended: true,
      emptied: true,
      lot: true,
      later: true,
      unwatched: true,
      watched: true,
      forgotten: true,
      received: true,
      used: true,
      discarded: true,
      counted: true,
    } satisfies Record<VesselEvent | StockEvent, true>,
  },
  additive: {
    is: 'choice',
    of: {
      'potassium-metabisulfite': true,
      'sodium-metabisulfite': true,
      'potassium-metabisulfite-solution': true,
      'sodium-metabisulfite-solution': true,
      'potassium-bisulfite-solution': true,
      'ammonium-bisulfite-solution': true,
      'sulfur-dioxide-solution': true,
      'sulfur-dioxide-gas': true,
      tablet: true,
    } satisfies Record<AdditiveId, true>,
  },
  strength_percent: number(0, 100),
  strength_of: { is: 'choice', of: { salt: true } },
  tablet_SO2_g: bounded('tablet_SO2_g'),
  tablet_salt_g: bounded('tablet_salt_g'),
  chemical_lot: { is: 'text' },
  supplier: { is: 'text' },
  mass_g: number(0, 100_000_000),
  additive_volume_mL: number(0, 10_000_000_000),
  tablets: bounded('tablets'),
  SO2_g: number(0, 100_000_000),
  added_mg_L: bounded('added_mg_L'),
  planned_mg_L: number(0, 10_000),
  planned_free_mg_L: number(0, 10_000),
  volume_L: bounded('volume_L'),
  capacity_L: number(0, 10_000_000),
  ph: bounded('ph'),
  free_mg_L: bounded('free_mg_L'),
  total_mg_L: bounded('total_mg_L'),
  temperature_C: bounded('temperature_C'),
  alcohol_percent: bounded('alcohol_percent'),
  sugar_g_L: bounded('sugar_g_L'),
  style: { is: 'choice', of: { red: true, white: true, rosé: true } satisfies Record<Style, true> },
  category: {
    is: 'choice',
    of: { sweet: true, sparkling: true, fortified: true } satisfies Record<Category, true>,
  },
  product: {
    is: 'choice',
    of: { cider: true, mead: true, 'fruit-wine': true, 'alcohol-free': true } satisfies Record<Product, true>,
  },
  organic: { is: 'yes-no' },
  stage: {
    is: 'choice',
    of: {
      must: true,
      fermenting: true,
      malolactic: true,
      base: true,
      finished: true,
      bottled: true,
    } satisfies Record<Stage, true>,
  },
  designated_mg_L: number(0, 1000),
  uplift: { is: 'yes-no' },
  quality: { is: 'yes-no' },
  pdo: { is: 'yes-no' },
  bulk: { is: 'yes-no' },
  density_kg_L: number(0.9, 1.3),
  reserve_mg_L: number(0, 1000),
  over_rule: { is: 'text' },
  lot: { is: 'text' },
  until: { is: 'time' },
  order: { is: 'count' },
  remark: { is: 'text' },
  corrects: { is: 'count' },
  reason: { is: 'text' },
};
