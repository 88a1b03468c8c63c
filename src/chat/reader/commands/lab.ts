import { isWithinBounds } from '../../../core/bounds.ts';
import { decimalAt, type Finding } from '../board.ts';
import type { Command } from '../command.ts';
import type { Piece } from '../own-pieces.ts';
import type { Talk } from './talk.ts';
import { says, saysOnly } from './talk.ts';

/** Most targets that stand side by side on a phone (own threshold). */
const TARGETS_MOST = 4;

/** Highest molecular target that a table is made for, mg/L (own threshold; what fits no wine is a slip). */
const MOLECULAR_MOST_mg_L = 5;

/** Small words that may stand beside any of them. */
const SMALL = ['ask', 'show', 'for', 'of', 'in', 'on', 'is', 'wine', 'now', 'this'] as const;

/** `table 0.5 0.8 pH 3.2-3.8`: targets, and behind the word pH from where to where. */
function readTable(talk: Talk): Command | undefined {
  const { board, said } = talk;
  if (board.findings.length > 0 || !says(talk, 'lab-table')) return undefined;
  const figures = said.filter(({ kind }) => kind === 'number');
  const dashes = said.filter(({ kind, text }) => kind === 'mark' && /^[-–]$/.test(text));
  const others = new Set<Piece>([...figures, ...dashes]);
  if (!saysOnly(talk, ['lab-table', 'lab-molecular', 'lab-so2', 'ph', 'to', ...SMALL], others))
    return undefined;
  const ph = said.findIndex(({ ids }) => ids.includes('ph'));
  const value = (piece: Piece): number => decimalAt(board, piece.from).value;
  const isOfPH = (piece: Piece): boolean => ph >= 0 && said.indexOf(piece) > ph;
  const behind = figures.filter(isOfPH).map(value);
  const molecular_mg_L = figures.filter((piece) => !isOfPH(piece)).map(value);
  const [from, to = from, third] = behind;
  const isWrong =
    third !== undefined ||
    (ph >= 0 && from === undefined) ||
    behind.some((one) => !isWithinBounds('ph', one)) ||
    molecular_mg_L.length > TARGETS_MOST ||
    molecular_mg_L.some((one) => !(one > 0 && one <= MOLECULAR_MOST_mg_L));
  if (isWrong) return undefined;
  const range =
    from === undefined || to === undefined ? {} : { ph_from: Math.min(from, to), ph_to: Math.max(from, to) };
  return { name: 'table', molecular_mg_L, ...range };
}

/** The vessels that are named, each once. */
function vesselsOf(findings: readonly Finding[]): readonly string[] {
  const names = findings.flatMap(({ field, value }) =>
    field === 'vessel' ? [value as string] : field === 'vessels' ? [...(value as readonly string[])] : [],
  );
  return names.length === findings.length || findings.some(({ field }) => field === 'vessels')
    ? [...new Set(names)]
    : [];
}

/** `blend T4 T7`: which share of the second brings the first within bounds; `blend T4`: of which other. */
function readBlend(talk: Talk): Command | undefined {
  if (!says(talk, 'lab-blend') || !saysOnly(talk, ['lab-blend', 'with', 'and', ...SMALL])) return undefined;
  const [vessel, other, third] = vesselsOf(talk.board.findings);
  if (vessel === undefined || third !== undefined) return undefined;
  return { name: 'blend', vessel, ...(other !== undefined && { other }) };
}

/** Reads what is asked of the laboratory and of a wine's own ways: `range`, `table 0.8`, `molecular T4`, `forecast T4`. */
export function readLab(talk: Talk): Command | undefined {
  const { board, isOfVessel } = talk;
  const table = readTable(talk) ?? readBlend(talk);
  if (table) return table;
  const isAlone = isOfVessel || board.findings.length === 0;
  if (isAlone && says(talk, 'lab-range') && saysOnly(talk, ['lab-range', ...SMALL])) return { name: 'range' };
  if (!isOfVessel) return undefined;
  if (says(talk, 'lab-forecast') && saysOnly(talk, ['lab-forecast', 'lab-so2', ...SMALL]))
    return { name: 'forecast' };
  if (says(talk, 'lab-molecular') && saysOnly(talk, ['lab-molecular', 'lab-so2', ...SMALL]))
    return { name: 'molecular' };
  if (says(talk, 'lab-too-much') && saysOnly(talk, ['lab-too-much', 'lab-so2', ...SMALL]))
    return { name: 'too-much' };
  return undefined;
}
