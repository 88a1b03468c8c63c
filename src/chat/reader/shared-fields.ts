import type { Fields } from './understood.ts';

/** Facts that may hold for several tanks: never a measured figure of one. */
export function sharedFields({
  ph: _ph,
  free_mg_L: _free,
  total_mg_L: _total,
  volume_L: _volume,
  ...fields
}: Fields): Fields {
  return fields;
}
