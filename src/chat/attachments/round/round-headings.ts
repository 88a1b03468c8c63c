import { foldText } from '../../reader/fold-text.ts';
import type { TableCell } from '../cell.ts';
import { cellText } from '../cell-text.ts';

/** What a column of a round tells beside the vessel and its volume. */
export type RoundColumn =
  'ph' | 'free' | 'total' | 'temperature' | 'target' | 'molecular' | 'add' | 'additive';

/** What people write above such columns, folded, without the unit behind; common practice, no source. */
const WORDS: Readonly<Record<RoundColumn, readonly string[]>> = {
  ph: ['ph', 'ph value', 'ph now'],
  free: [
    'free',
    'free so2',
    'fso2',
    'f so2',
    'so2 free',
    'free sulfur dioxide',
    'free sulphur dioxide',
    'free now',
  ],
  total: [
    'total',
    'total so2',
    'tso2',
    't so2',
    'so2 total',
    'total sulfur dioxide',
    'total sulphur dioxide',
  ],
  temperature: ['temperature', 'temp', 't c', 'temp c', 'temperature c'],
  target: [
    'target',
    'target free',
    'target free so2',
    'free target',
    'aim',
    'aim free',
    'goal',
    'target fso2',
  ],
  molecular: [
    'molecular',
    'target molecular',
    'molecular target',
    'target mol',
    'mol so2',
    'target molecular so2',
  ],
  add: ['add', 'addition', 'to add', 'add so2', 'so2 addition', 'so2 to be added'],
  additive: ['additive', 'chemical', 'sulfite', 'sulphite', 'with', 'so2 source'],
};

const COLUMN_OF: ReadonlyMap<string, RoundColumn> = new Map(
  (Object.keys(WORDS) as RoundColumn[]).flatMap((column) =>
    WORDS[column].map((word) => [word, column] as const),
  ),
);

/** Units that change no figure of such a column. */
const UNIT = /\s(?:mg l|mg per l|mg litre|mg liter|ppm)$/;

/** What a heading of a round says; undefined where it says nothing that a dose needs. */
export function readRoundHeading(cell: TableCell): RoundColumn | undefined {
  const plain = foldText(cellText(cell))
    .text.replaceAll(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
  return COLUMN_OF.get(plain) ?? COLUMN_OF.get(plain.replace(UNIT, ''));
}
