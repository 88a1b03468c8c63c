import type { Command } from '../../command.ts';
import { readDecimal } from '../../numbers.ts';
import type { Talk } from '../talk.ts';
import { says, saysOnly } from '../talk.ts';
import { set, setWrong } from './set.ts';

/** The dissociation constant that a basis is named by. */
const PK = 1.81;

/** Reads `basis OIV`, `use pK 1.81`. */
export function readBasis(talk: Talk): Command | undefined {
  if (!says(talk, 'basis')) return undefined;
  const figures = talk.said.filter(({ kind }) => kind === 'number');
  const [figure] = figures;
  if (!saysOnly(talk, ['basis', 'oiv', 'is', 'to', 'of', 'work-in'], new Set(figures)) || figures.length > 1)
    return undefined;
  if (says(talk, 'oiv')) return figure ? undefined : set({ of: 'basis', basis: 'oiv' });
  if (figure === undefined) return undefined;
  return readDecimal(figure.text) === PK
    ? set({ of: 'basis', basis: 'pk-1.81' })
    : setWrong(talk, 'basis', [figure]);
}
