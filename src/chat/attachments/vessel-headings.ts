import { foldText } from '../reader/fold-text.ts';
import type { VolumeUnit } from '../reader/understood.ts';
import type { TableCell } from './cell.ts';
import { cellText } from './cell-text.ts';

/** What a column of a list of vessels tells. */
export type VesselColumn =
  'vessel' | 'volume' | 'capacity' | 'unit' | 'style' | 'stage' | 'lot' | 'alcohol' | 'organic';

/** A heading as it was understood; `unit` where it names one, `word` as it was written. */
export interface VesselHeading {
  readonly column?: VesselColumn;
  readonly unit?: VolumeUnit | 'gallon';
  readonly word: string;
}

/** What people write above such columns, folded; common practice, no source. */
const WORDS: Readonly<Record<VesselColumn, readonly string[]>> = {
  vessel: [
    'vessel',
    'tank',
    'barrel',
    'vat',
    'cask',
    'container',
    'vessel name',
    'tank name',
    'vessel no',
    'tank no',
    'barrel no',
    'tank number',
    'vessel number',
    'name',
  ],
  volume: ['volume', 'vol', 'content', 'contents', 'current volume', 'wine volume', 'filled', 'fill'],
  capacity: ['capacity', 'cap', 'size', 'tank size', 'max', 'max volume', 'total capacity', 'nominal volume'],
  unit: ['unit', 'units'],
  style: ['style', 'colour', 'color', 'wine colour', 'wine color', 'type', 'kind', 'category', 'class'],
  stage: ['stage', 'status', 'state', 'phase'],
  lot: ['lot', 'batch', 'wine', 'wine lot', 'lot no', 'lot number', 'batch no'],
  alcohol: ['alcohol', 'abv', 'alc', 'alc vol', 'vol alc', 'alcohol vol'],
  organic: ['organic', 'bio'],
};

const UNITS: Readonly<Record<string, VolumeUnit | 'gallon'>> = {
  l: 'L',
  lt: 'L',
  ltr: 'L',
  litre: 'L',
  litres: 'L',
  liter: 'L',
  liters: 'L',
  hl: 'hL',
  hectolitre: 'hL',
  hectolitres: 'hL',
  hectoliter: 'hL',
  hectoliters: 'hL',
  gal: 'gallon',
  gals: 'gallon',
  gallon: 'gallon',
  gallons: 'gallon',
  m3: 'm3',
};

const COLUMN_OF: ReadonlyMap<string, VesselColumn> = new Map(
  (Object.keys(WORDS) as VesselColumn[]).flatMap((column) =>
    WORDS[column].map((word) => [word, column] as const),
  ),
);

const US = /\bu\.?s\.?(?=\s*gal)/;
const UK = /\b(?:uk|u\.k\.|imp|imperial)(?=\s*gal)/;

/** The unit that some words name, whole or beside others: `hl`, `US gal`, `volume l`. */
export function volumeUnitIn(
  text: string,
): { readonly unit: VolumeUnit | 'gallon'; readonly rest: string } | undefined {
  const folded = foldText(text).text.replaceAll(/m³/g, 'm3');
  const parted = folded
    .replaceAll(/[^\p{L}\p{N}]+/gu, ' ')
    .trim()
    .split(' ');
  const named = parted.flatMap((word) => UNITS[word] ?? []);
  const [unit] = named;
  if (unit === undefined || named.length > 1) return undefined;
  const rest = parted.filter(
    (word) => UNITS[word] === undefined && !/^(us|uk|imp|imperial|in|of)$/.test(word),
  );
  const gallon = US.test(folded) ? 'galUS' : UK.test(folded) ? 'galUK' : unit;
  return { unit: unit === 'gallon' ? gallon : unit, rest: rest.join(' ') };
}

/** What a heading of a list of vessels says; without a column where it says nothing that we take. */
export function readVesselHeading(cell: TableCell): VesselHeading {
  const word = cellText(cell).trim();
  const plain = foldText(word)
    .text.replaceAll(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
  const column = COLUMN_OF.get(plain);
  if (column !== undefined) return { column, word };
  const named = volumeUnitIn(word);
  if (named === undefined) return { word };
  const measured = named.rest === '' ? 'volume' : COLUMN_OF.get(named.rest);
  return measured === 'volume' || measured === 'capacity'
    ? { column: measured, unit: named.unit, word }
    : { word };
}
