import type { WineTraits } from './entry.ts';

/** All that is told of a wine beside its readings, by name. */
export const TRAIT_NAMES = [
  'style',
  'category',
  'product',
  'organic',
  'stage',
  'alcohol_percent',
  'sugar_g_L',
  'designated_mg_L',
  'uplift',
  'quality',
  'pdo',
  'bulk',
  'density_kg_L',
  'reserve_mg_L',
] as const satisfies readonly (keyof WineTraits)[];
