import type { ReaderSettings } from '../../reader/understood.ts';
import type { TableCell } from '../cell.ts';
import { cellText, isBlank } from '../cell-text.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import { readTraitCell, readVesselCell, readVolumeCell } from '../vessel-cells.ts';
import { readVesselHeading, volumeUnitIn, type VesselHeading } from '../vessel-headings.ts';
import { readRoundHeading, type RoundColumn } from './round-headings.ts';

/** The headings of a round: what each column tells of a vessel, or of its wine. */
export type RoundHeading = VesselHeading & { readonly of?: RoundColumn };

/** What stands before the figure of a column in a line, so that the reader knows it. */
const BEFORE: Readonly<Record<RoundColumn, string>> = {
  additive: '',
  ph: 'pH ',
  free: 'free ',
  total: 'total ',
  temperature: '',
  target: 'target ',
  molecular: 'target molecular ',
  add: 'add ',
};

/** A figure as people write it in a cell, with a unit that changes nothing. */
const FIGURE = /^\d{1,4}(?:[.,]\d{1,4})?(?:\s*(?:mg\/?l|ppm))?$/i;
const TEMPERATURE = /^-?\d{1,2}(?:[.,]\d)?(?:\s*°?\s*[CF])?$/i;
/** The name of an additive, with its strength perhaps. */
const ADDITIVE = /^[\p{L}\p{N}%.,() -]{1,60}$/u;

const isNothing = (cell: TableCell): boolean =>
  isBlank(cell) || /^\s*(?:[-–—?]|n\/?a)\s*$/i.test(cellText(cell));

/** The headings of a round; undefined where the row names no vessel, or nothing that a dose needs. */
export function readRoundHeadings(row: readonly TableCell[]): readonly RoundHeading[] | undefined {
  const headings = row.map((cell): RoundHeading => {
    const of = readRoundHeading(cell);
    return of === undefined ? readVesselHeading(cell) : { word: cellText(cell).trim(), of };
  });
  const names = headings.flatMap(({ column, of }) => of ?? column ?? []);
  const isRound = headings.some(({ of }) => of === 'ph' || of === 'free' || of === 'add');
  if (!isRound || !names.includes('vessel') || new Set(names).size < names.length) return undefined;
  return headings;
}

/** A row as the line that a message would have; undefined where a cell of it is not what its column holds. */
export function roundLine(
  cells: readonly TableCell[],
  headings: readonly RoundHeading[],
  settings: ReaderSettings,
): string | undefined {
  if (headings.some(({ column, of }, i) => (column ?? of) !== undefined && cells[i] instanceof Date))
    return undefined;
  const cellOf = (name: string): TableCell => {
    const cell = cells[headings.findIndex(({ column, of }) => (of ?? column) === name)];
    return isNothing(cell) ? undefined : cell;
  };
  const headingOf = (name: string): RoundHeading | undefined =>
    headings.find(({ column, of }) => (of ?? column) === name);
  const parts: (string | undefined)[] = [
    vesselPart(cellOf('vessel'), headingOf('vessel')?.word ?? '', settings),
    volumePart(cellOf('volume'), headingOf('volume'), cellOf('unit'), settings),
    traitPart(cellOf('style'), settings),
    ...columnsIn(headingOf('add')?.word ?? '').map((of) =>
      figurePart(of, cellOf(of), headingOf(of)?.word ?? ''),
    ),
  ];
  return parts.includes(undefined) ? undefined : parts.filter((one) => one !== '').join(' ');
}

/**
 * The columns in the order of a line. An addition whose heading does not say SO2 stands right before the additive: there the
 * reader asks whether it is SO2 or the powder itself.
 */
function columnsIn(headingOfAdd: string): RoundColumn[] {
  const columns = Object.keys(BEFORE) as RoundColumn[];
  if (/so2/i.test(headingOfAdd)) return columns;
  return [...columns.filter((of) => of !== 'additive'), 'additive'];
}

function vesselPart(cell: TableCell, heading: string, settings: ReaderSettings): string | undefined {
  const vessels = readVesselCell(cell, heading, settings);
  if (vessels === undefined) return undefined;
  const [only, another] = vessels;
  return another === undefined && only !== undefined ? vesselName(only) : cellText(cell).trim();
}

function volumePart(
  cell: TableCell,
  heading: RoundHeading | undefined,
  unitCell: TableCell,
  settings: ReaderSettings,
): string | undefined {
  if (cell === undefined) return '';
  const ofRow = unitCell === undefined ? undefined : volumeUnitIn(cellText(unitCell))?.unit;
  if (unitCell !== undefined && ofRow === undefined) return undefined;
  const usual = settings.volumeUnit === 'barrel' ? 'L' : settings.volumeUnit;
  const volume_L = readVolumeCell(cell, heading?.unit ?? ofRow ?? usual, settings);
  if (volume_L === undefined) return undefined;
  const text = cellText(cell).trim();
  if (typeof cell !== 'number' && volumeUnitIn(text) !== undefined) return text;
  return `${text} ${WORDS[heading?.unit ?? ofRow ?? usual]}`;
}

/** How the reader is told a unit. */
const WORDS: Readonly<Record<NonNullable<VesselHeading['unit']>, string>> = {
  L: 'L',
  hL: 'hL',
  mL: 'mL',
  m3: 'm3',
  gallon: 'gal',
  galUS: 'US gal',
  galUK: 'imperial gal',
  barrel: 'barrels',
};

/** `red`, `white`; what says nothing of the wine's colour or sort is left out of a line that is read again. */
function traitPart(cell: TableCell, settings: ReaderSettings): string {
  if (cell === undefined) return '';
  return readTraitCell(cell, settings) === undefined ? '' : cellText(cell).trim();
}

function figurePart(of: RoundColumn, cell: TableCell, heading: string): string | undefined {
  if (cell === undefined) return '';
  const text = typeof cell === 'number' ? String(Number(cell.toPrecision(10))) : cellText(cell).trim();
  if (of === 'additive') return ADDITIVE.test(text) ? text : undefined;
  if (of === 'temperature')
    return TEMPERATURE.test(text)
      ? `${text.replace(/[\s°CF]+$/i, '')} °${/f$/i.test(text) ? 'F' : 'C'}`
      : undefined;
  if (!FIGURE.test(text)) return undefined;
  const unit =
    of !== 'add' ? '' : `${/[a-z]$/i.test(text) ? '' : ' mg/L'}${/so2/i.test(heading) ? ' SO2' : ''}`;
  // Without the word the reader judges by the figure: up to 2 a target is molecular.
  const what = of === 'target' && /free|fso2/i.test(heading) ? 'free ' : '';
  return `${BEFORE[of]}${what}${text}${unit}`;
}
