import { foldText } from '../../reader/fold-text.ts';
import type { TableCell } from '../cell.ts';
import { cellText } from '../cell-text.ts';

/** What a column of a round tells beside the vessel and its volume. */
export type RoundColumn =
  'ph' | 'free' | 'total' | 'temperature' | 'target' | 'molecular' | 'add' | 'additive';

/**
 * What people write above such columns, folded, without the unit behind; common practice, no source. `Molecular` alone is
 * what was reckoned of a sample, and `addition` what was made: neither asks for anything.
 */
const WORDS: Readonly<Record<RoundColumn, readonly string[]>> = {
  ph: ['ph', 'ph value', 'ph now'],
  free: ['free', 'fso2', 'f so2', 'so2 free', 'free now'],
  total: ['total', 'tso2', 't so2', 'so2 total'],
  temperature: ['temperature', 'temp', 't c', 'temp c', 'temperature c'],
  target: ['target', 'target free', 'free target', 'aim', 'aim free', 'goal', 'target fso2'],
  molecular: ['target molecular', 'molecular target', 'target mol'],
  add: ['add', 'to add'],
  additive: ['additive', 'chemical', 'sulfite', 'sulphite', 'with', 'so2 source'],
};

const COLUMN_OF: ReadonlyMap<string, RoundColumn> = new Map(
  (Object.keys(WORDS) as RoundColumn[]).flatMap((column) =>
    WORDS[column].map((word) => [word, column] as const),
  ),
);

/** Units that change no figure of such a column. */
const UNIT = /\s(?:mg l|mg per l|mg litre|mg liter|ppm)$/;

/** The name in full. */
const SPELLED_OUT = /sul(?:f|ph)ur dioxide/;

/** What a heading of a round says; undefined where it says nothing that a dose needs. */
export function readRoundHeading(cell: TableCell): RoundColumn | undefined {
  const plain = foldText(cellText(cell))
    .text.replaceAll(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
  const short = plain.replace(SPELLED_OUT, 'so2').replace(UNIT, '');
  return COLUMN_OF.get(short) ?? COLUMN_OF.get(short.replace(/ so2$/, ''));
}
