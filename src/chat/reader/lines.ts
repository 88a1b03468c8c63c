import type { Term } from './split-terms.ts';

/** The terms of each line that has any. */
export function linesOf(terms: readonly Term[]): Term[][] {
  const lines: Term[][] = [[]];
  for (const term of terms) {
    if (term.kind === 'break') lines.push([]);
    else lines.at(-1)!.push(term);
  }
  return lines.filter((line) => line.length > 0);
}
