import type { ReaderSettings } from '../reader/understood.ts';
import { isText } from './read-field.ts';
import { readWords } from './read-words.ts';
import type { VesselRow } from './vessel-row.ts';

/** A line without headings, `T4; 5200 L; red; lot Blanca 2026`, and what in it is not taken: readings, unknown words. */
export interface VesselLine {
  readonly row: Omit<VesselRow, 'line'>;
  readonly notTaken: readonly string[];
}

const LOT = /(?:^|[;,\t|])\s*(?:lot|batch)\s*[:#]?\s+([^;,\t|]+)$/i;
const CAPACITY = /(?:^|[;,\t|])\s*(?:capacity|cap\.?|holds)\s*:?\s+([^;\t|]+?)\s*(?=$|[;\t|]|,\s)/i;
const EMPTY = /(?:^|[;,\t|])\s*empty\s*$/i;
/** What a sample tells: it has a time, which a list does not name. */
const SAMPLED = ['ph', 'free_mg_L', 'total_mg_L', 'temperature_C'] as const;

/** What a line of a list says of one vessel; undefined where it names none, or not all of it is understood. */
export function readVesselLine(text: string, settings: ReaderSettings): VesselLine | undefined {
  let rest = text.trim();
  const cut = (pattern: RegExp): string | undefined => {
    const found = pattern.exec(rest);
    if (found === null) return undefined;
    rest = rest.slice(0, found.index) + rest.slice(found.index + found[0].length);
    return (found[1] ?? '').trim();
  };
  const lot = cut(LOT);
  const isEmpty = cut(EMPTY) !== undefined;
  const capacity = cut(CAPACITY);
  const capacity_L = capacity === undefined ? undefined : readWords(capacity, settings)?.fields.volume_L;
  const draft = readWords(rest, settings);
  if (draft === undefined || draft.problems.length + draft.setAside.length > 0) return undefined;
  if (draft.notes.some(({ id }) => !HARMLESS.includes(id)) || !isText(lot ?? '', LONGEST_LOT))
    return undefined;
  const { vessel, vessels, volume_L, ph, free_mg_L, total_mg_L, temperature_C, ...others } = draft.fields;
  const names = vessels ?? (vessel === undefined ? [] : [vessel]);
  const { style, category, product, organic, stage, alcohol_percent, sugar_g_L, ...strange } = others;
  const isContrary = isEmpty && volume_L !== undefined;
  const isLost = capacity !== undefined && capacity_L === undefined;
  if (names.length === 0 || Object.keys(strange).length > 0 || isContrary || isLost) return undefined;
  // A capacity that stands between other words would be read as what is in the tank.
  if (volume_L !== undefined && /\b(?:capacity|cap|holds|max)\b/i.test(rest)) return undefined;
  const traits = {
    ...(style && { style }),
    ...(category && { category }),
    ...(product && { product }),
    ...(organic && { organic }),
    ...(stage && { stage }),
    ...(alcohol_percent !== undefined && { alcohol_percent }),
    ...(sugar_g_L !== undefined && { sugar_g_L }),
  };
  const told = { ph, free_mg_L, total_mg_L, temperature_C };
  return {
    row: {
      vessels: names,
      traits,
      ...(volume_L !== undefined && { volume_L: volume_L / names.length }),
      ...(capacity_L !== undefined && { capacity_L }),
      ...(lot !== undefined && { lot }),
      ...(isEmpty && { empty: true }),
    },
    notTaken: [...SAMPLED.filter((field) => told[field] !== undefined), ...draft.strangers],
  };
}

const LONGEST_LOT = 100;
/** How something was read that changes nothing here: equal barrels, a figure whose word was missing, a variety. */
const HARMLESS: readonly string[] = ['each-or-total', 'ph-unlabelled', 'volume-sum', 'unread-words'];
