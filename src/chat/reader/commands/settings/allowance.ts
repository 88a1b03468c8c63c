import type { Command } from '../../command.ts';
import { readDecimal } from '../../numbers.ts';
import type { Piece } from '../../own-pieces.ts';
import type { Talk } from '../talk.ts';
import { says, saysOnly } from '../talk.ts';
import { set, setWrong } from './set.ts';

/** More nobody adds for what binds; own threshold. */
const MOST_percent = 100;

const inOrder = (pieces: readonly Piece[]): Piece[] => pieces.toSorted((a, b) => a.from - b.from);

/** Reads `allowance 30%`, `no allowance`, where nothing else is said. */
export function readAllowance(talk: Talk): Command | undefined {
  if (!says(talk, 'allowance')) return undefined;
  const figures = talk.said.filter(({ kind }) => kind === 'number');
  const signs = talk.said.filter(({ text }) => text === '%' || text === '-' || text === '+');
  const allowed = ['allowance', 'usual-bare', 'default', 'is', 'of', 'to', 'percent', 'no', 'off'] as const;
  if (!saysOnly(talk, allowed, new Set([...figures, ...signs]))) return undefined;
  const isOff = says(talk, 'no', 'off');
  const [figure] = figures;
  if (figure === undefined) return isOff ? set({ of: 'allowance', percent: 0 }) : undefined;
  if (isOff || figures.length > 1) return undefined;
  const percent = /^\d+([.,]\d+)?$/.test(figure.text) ? readDecimal(figure.text) : Number.NaN;
  const isNegative = signs.some(({ text }) => text === '-');
  return percent >= 0 && percent <= MOST_percent && !isNegative
    ? set({ of: 'allowance', percent })
    : setWrong(talk, 'allowance', inOrder([figure, ...signs]));
}
