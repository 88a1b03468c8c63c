import type { AdditiveNoted, Happening, StockEvent } from '../../core/cellar/entry.ts';
import type { EntryField } from './entry-fields.ts';

/** The kind of an entry. */
export type Kind = Happening['kind'];

type Held<H> = Exclude<keyof H, 'kind' | 'usual'> | ('usual' extends keyof H ? keyof AdditiveNoted : never);

const ADDITIVE = {
  additive: 'may',
  strength_percent: 'may',
  strength_of: 'may',
  tablet_SO2_g: 'may',
  tablet_salt_g: 'may',
  chemical_lot: 'may',
} as const satisfies Record<keyof AdditiveNoted, 'may'>;

const TRAITS = {
  style: 'may',
  category: 'may',
  product: 'may',
  organic: 'may',
  stage: 'may',
  alcohol_percent: 'may',
  sugar_g_L: 'may',
  designated_mg_L: 'may',
  uplift: 'may',
  quality: 'may',
  pdo: 'may',
  bulk: 'may',
  density_kg_L: 'may',
  reserve_mg_L: 'may',
} as const;

const AMOUNT = {
  mass_g: 'may',
  additive_volume_mL: 'may',
  tablets: 'may',
  SO2_g: 'may',
  added_mg_L: 'may',
  volume_L: 'may',
} as const;

const FIELDS: { readonly [H in Happening as H['kind']]: Readonly<Record<Held<H>, 'must' | 'may'>> } = {
  addition: {
    vessels: 'must',
    ...ADDITIVE,
    ...AMOUNT,
    planned_mg_L: 'may',
    planned_free_mg_L: 'may',
    order: 'may',
    over_rule: 'may',
    remark: 'may',
  },
  reading: {
    vessels: 'must',
    ...TRAITS,
    ph: 'may',
    free_mg_L: 'may',
    total_mg_L: 'may',
    temperature_C: 'may',
    volume_L: 'may',
    remark: 'may',
  },
  vessel: {
    event: 'must',
    vessels: 'must',
    ...TRAITS,
    ...ADDITIVE,
    to: 'may',
    volume_L: 'may',
    capacity_L: 'may',
    lot: 'may',
    until: 'may',
    remark: 'may',
  },
  order: { vessels: 'must', ...ADDITIVE, ...AMOUNT, remark: 'may' },
  correction: { vessels: 'must', corrects: 'must', reason: 'must' },
  other: { vessels: 'must', remark: 'must', mass_g: 'may', additive_volume_mL: 'may' },
  stock: {
    event: 'must',
    vessels: 'must',
    ...ADDITIVE,
    mass_g: 'may',
    additive_volume_mL: 'may',
    tablets: 'may',
    supplier: 'may',
    remark: 'may',
  },
};

const STOCK_EVENTS: Readonly<Record<StockEvent, true>> = {
  received: true,
  used: true,
  discarded: true,
  counted: true,
};

/** Whether something of that name happens to what an entry of the kind is about. */
export function isEventOf(kind: Kind, event: unknown): boolean {
  const isOfStock = typeof event === 'string' && Object.hasOwn(STOCK_EVENTS, event);
  return event === undefined || (kind === 'stock') === isOfStock;
}

/** What every entry has beside what it holds. */
const NOTING = {
  entry: 'must',
  kind: 'must',
  key: 'must',
  at: 'must',
  noted_at: 'must',
  by: 'must',
} as const;

/** The fields of an entry of a kind, and whether it must have each; a missing list of vessels or text is an empty one. */
export function fieldsOfKind(kind: Kind): Readonly<Partial<Record<EntryField, 'must' | 'may'>>> {
  return { ...NOTING, ...FIELDS[kind] };
}

/** The fields of a vessel entry that belong to its usual additive. */
export const USUAL_FIELDS: readonly (keyof AdditiveNoted)[] = [
  'additive',
  'strength_percent',
  'strength_of',
  'tablet_SO2_g',
  'tablet_salt_g',
  'chemical_lot',
];
