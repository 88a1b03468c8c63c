import type { Command } from '../command.ts';
import type { Talk } from './talk.ts';

/** A name with an ending, as files have it. */
const FILE = /^[^\n]{1,300}\.[a-z]{3,4}$/i;

/** Reads `import cellar.csv`, also with a path; `import` alone names no file yet. */
export function readImport({ board, said }: Talk): Command | undefined {
  const at = said.findIndex(({ ids }) => !ids.includes('filler'));
  const piece = said[at];
  if (piece?.ids.includes('import') !== true) return undefined;
  const end = board.folded.at[board.terms[piece.to]?.end ?? 0] ?? board.message.length;
  const file = board.message
    .slice(end)
    .trim()
    .replaceAll(/^["“„«']+|["”“»']+$/g, '')
    .trim();
  if (file === '') return { name: 'import', file };
  return FILE.test(file) ? { name: 'import', file } : undefined;
}
