import type { Term } from './split-terms.ts';

/** The terms of each line that has any. */
export function linesOf(terms: readonly Term[]): Term[][] {
  let line: Term[] = [];
  const lines: Term[][] = [line];
  for (const term of terms) {
    if (term.kind === 'break') lines.push((line = []));
    else line.push(term);
  }
  return lines.filter(({ length }) => length > 0);
}
