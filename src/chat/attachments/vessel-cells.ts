import type { WineTraits } from '../../core/cellar/entry.ts';
import { BOUNDS } from '../../core/bounds.ts';
import { litresFrom } from '../../core/units/volume.ts';
import type { VolumeUnitId } from '../../core/units/volume.ts';
import type { ReaderSettings, VolumeUnit } from '../reader/understood.ts';
import type { TableCell } from './cell.ts';
import { cellText } from './cell-text.ts';
import { readWords } from './read-words.ts';
import { volumeUnitIn } from './vessel-headings.ts';

/** The vessel or vessels that a cell names, by the reader's names; undefined where it names none or says more. */
export function readVesselCell(
  cell: TableCell,
  heading: string,
  settings: ReaderSettings,
): readonly string[] | undefined {
  const written = cellText(cell).trim();
  // `4` below `Tank` is tank 4; below `Vessel` nobody knows what to call it.
  const text = /^\d{1,4}$/.test(written) ? `${heading.split(/\s/)[0]} ${written}` : written;
  const draft = readWords(text, settings);
  const vessels =
    draft?.fields.vessels ?? (draft?.fields.vessel === undefined ? undefined : [draft.fields.vessel]);
  const place = draft?.where.vessel ?? draft?.where.vessels;
  return vessels !== undefined && place?.text === text ? vessels : undefined;
}

/**
 * The litres of a cell: with a unit of its own, else in the column's. Undefined where it is no volume, or one that may
 * be two (`5.200`).
 */
export function readVolumeCell(
  cell: TableCell,
  unit: VolumeUnit | 'gallon',
  settings: ReaderSettings,
): number | undefined {
  const gallon = settings.gallon === 'US' ? 'galUS' : 'galUK';
  const columnUnit = unit === 'gallon' ? gallon : unit;
  if (typeof cell === 'number') return within(cell, columnUnit);
  const text = cellText(cell).trim();
  if (/^0+(?:[.,]0+)?$/.test(text)) return 0;
  const named = volumeUnitIn(text);
  const whole = named === undefined ? `${text} ${UNIT_WORDS[columnUnit]}` : text;
  const draft = readWords(whole, settings);
  const others = Object.keys(draft?.fields ?? {}).filter((field) => field !== 'volume_L');
  if (draft === undefined || draft.problems.length + draft.setAside.length + others.length > 0)
    return undefined;
  return draft.marks.volumeUnit === undefined ? undefined : draft.fields.volume_L;
}

function within(value: number, unit: VolumeUnit): number | undefined {
  if (unit === 'barrel' || !Number.isFinite(value) || value < 0) return undefined;
  const volume_L = litresFrom(value, unit satisfies VolumeUnitId);
  return volume_L <= BOUNDS.volume_L.max ? volume_L : undefined;
}

/** How the reader is told a unit. */
const UNIT_WORDS: Readonly<Record<VolumeUnit, string>> = {
  L: 'L',
  hL: 'hL',
  mL: 'mL',
  m3: 'm3',
  galUS: 'US gal',
  galUK: 'imperial gal',
  barrel: 'barrels',
};

/** The per cent of alcohol that a cell tells; undefined where it tells none. */
export function readAlcoholCell(cell: TableCell): number | undefined {
  const [, figure] =
    /^(\d{1,2}(?:[.,]\d{1,4})?)\s*(?:%\s*)?(?:vol\.?|abv|alc\.?)?$/i.exec(cellText(cell).trim()) ?? [];
  const value = typeof cell === 'number' ? cell : Number(figure?.replace(',', '.') ?? NaN);
  return value >= 0 && value <= MOST_ALCOHOL_percent ? value : undefined;
}

/** Above it a figure is no alcohol of a wine; own threshold, that of messages. */
const MOST_ALCOHOL_percent = 25;

type Words = Pick<WineTraits, 'style' | 'category' | 'product' | 'organic' | 'stage'>;

/** Words for a wine whose fermentations are over that say nothing in a message of their own; common practice. */
const FINISHED = /^(?:finished|complete|completed|mlf? (?:finished|complete|done))$/i;

/** What words in a cell say of a wine; undefined where they say nothing, or something else as well. */
export function readTraitCell(cell: TableCell, settings: ReaderSettings): Words | undefined {
  const text = cellText(cell).trim();
  if (FINISHED.test(text)) return { stage: 'finished' };
  const draft = readWords(text, settings);
  if (draft === undefined || draft.problems.length + draft.setAside.length > 0) return undefined;
  const { style, category, product, organic, stage, ...others } = draft.fields;
  const words = {
    ...(style && { style }),
    ...(category && { category }),
    ...(product && { product }),
    ...(organic && { organic }),
    ...(stage && { stage }),
  };
  return Object.keys(words).length > 0 && Object.keys(others).length === 0 ? words : undefined;
}
