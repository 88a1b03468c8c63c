import type { WineTraits } from '../../core/cellar/entry.ts';
import type { ReaderSettings, VolumeUnit } from '../reader/understood.ts';
import type { TableCell } from './cell.ts';
import { cellText, isBlank } from './cell-text.ts';
import { isText } from './read-field.ts';
import { readAlcoholCell, readTraitCell, readVesselCell, readVolumeCell } from './vessel-cells.ts';
import type { VesselColumn, VesselHeading } from './vessel-headings.ts';
import { readVesselHeading, volumeUnitIn } from './vessel-headings.ts';
import type { VesselRow } from './vessel-row.ts';

/** What the headings of a list of vessels say of its rows. */
export interface VesselTable {
  readonly headings: readonly VesselHeading[];
  /** Headings of columns that are not taken. */
  readonly notTaken: readonly string[];
  /** The unit of volumes that have none of their own, where one is assumed. */
  readonly assumedUnit?: VolumeUnit;
}

/** The headings of a list of vessels; undefined where the first row has none, or two that say the same. */
export function readVesselHeadings(
  row: readonly TableCell[],
  settings: ReaderSettings,
): VesselTable | undefined {
  const headings = row.map(readVesselHeading);
  const columns = headings.flatMap(({ column }) => column ?? []);
  if (!columns.includes('vessel') || columns.length < 2 || new Set(columns).size < columns.length)
    return undefined;
  const isUnitless = headings.some(
    ({ column, unit }) => (column === 'volume' || column === 'capacity') && unit === undefined,
  );
  return {
    headings,
    notTaken: headings.flatMap(({ column, word }) => (column === undefined && word !== '' ? [word] : [])),
    ...(isUnitless && !columns.includes('unit') && { assumedUnit: unitOf(settings) }),
  };
}

/** The unit that volumes are read in where none stands beside them. */
function unitOf({ volumeUnit }: ReaderSettings): VolumeUnit {
  return volumeUnit === 'barrel' ? 'L' : volumeUnit;
}

/** A dash or a question mark for what nobody knows. */
const isNothing = (cell: TableCell): boolean =>
  isBlank(cell) || /^\s*(?:[-–—?]|n\/?a)\s*$/i.test(cellText(cell));

/** The longest name of a lot; own threshold, in UTF-16 units. */
const LONGEST_LOT = 100;

/** What a row below such headings tells; undefined where any cell of it is not understood. */
export function readVesselRow(
  cells: readonly TableCell[],
  { headings }: VesselTable,
  settings: ReaderSettings,
): Omit<VesselRow, 'line'> | undefined {
  if (cells.slice(headings.length).some((cell) => !isBlank(cell))) return undefined;
  // A spreadsheet makes dates of numbers such as 3.5, and nobody can tell which it was.
  if (headings.some(({ column }, i) => column !== undefined && cells[i] instanceof Date)) return undefined;
  const cellOf = (column: VesselColumn): TableCell => {
    const cell = cells[headings.findIndex((one) => one.column === column)];
    return isNothing(cell) ? undefined : cell;
  };
  const headingOf = (column: VesselColumn): VesselHeading | undefined =>
    headings.find((one) => one.column === column);

  const vessels = readVesselCell(cellOf('vessel'), headingOf('vessel')?.word ?? '', settings);
  if (vessels === undefined) return undefined;

  const unitCell = cellOf('unit');
  const rowUnit = unitCell === undefined ? undefined : volumeUnitIn(cellText(unitCell));
  if (unitCell !== undefined && rowUnit?.rest !== '') return undefined;
  const litres = (column: 'volume' | 'capacity'): number | 'wrong' | undefined => {
    const cell = cellOf(column);
    if (cell === undefined) return undefined;
    const unit = headingOf(column)?.unit ?? rowUnit?.unit ?? unitOf(settings);
    return readVolumeCell(cell, unit, settings) ?? 'wrong';
  };
  const [volume_L, capacity_L] = [litres('volume'), litres('capacity')];
  if (volume_L === 'wrong' || capacity_L === 'wrong' || capacity_L === 0) return undefined;

  const stageCell = cellOf('stage');
  const isEmpty = volume_L === 0 || /^\s*empty\s*$/i.test(cellText(stageCell));
  if (isEmpty && (volume_L ?? 0) > 0) return undefined;
  const traits = traitsOf([cellOf('style'), isEmpty ? undefined : stageCell], settings);
  const alcoholCell = cellOf('alcohol');
  const alcohol_percent = alcoholCell === undefined ? undefined : readAlcoholCell(alcoholCell);
  const organic = organicOf(cellOf('organic'));
  const lot = cellText(cellOf('lot')).trim();
  if (traits === undefined || organic === 'wrong' || !isText(lot, LONGEST_LOT)) return undefined;
  if (alcoholCell !== undefined && alcohol_percent === undefined) return undefined;
  return {
    vessels,
    traits: { ...traits, ...(alcohol_percent !== undefined && { alcohol_percent }), ...organic },
    ...(volume_L !== undefined && volume_L > 0 && { volume_L }),
    ...(capacity_L !== undefined && { capacity_L }),
    ...(lot !== '' && { lot }),
    ...(isEmpty && { empty: true }),
  };
}

/** What the cells with words say; undefined where one is not understood or they contradict each other. */
function traitsOf(cells: readonly TableCell[], settings: ReaderSettings): WineTraits | undefined {
  let traits: WineTraits = {};
  for (const cell of cells) {
    if (cell === undefined) continue;
    const words = readTraitCell(cell, settings);
    if (words === undefined) return undefined;
    const contradicts = (Object.keys(words) as (keyof typeof words)[]).some(
      (key) => traits[key] !== undefined && traits[key] !== words[key],
    );
    if (contradicts) return undefined;
    traits = { ...traits, ...words };
  }
  return traits;
}

function organicOf(cell: TableCell): { organic?: boolean } | 'wrong' {
  const text = cellText(cell).trim();
  if (text === '') return {};
  if (/^(?:yes|y|x|true|organic|bio)$/i.test(text)) return { organic: true };
  return /^(?:no|n|false)$/i.test(text) ? { organic: false } : 'wrong';
}
