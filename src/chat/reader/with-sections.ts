import type { Term } from './split-terms.ts';
import type { Draft, FieldName } from './understood.ts';

/** What a heading may say of the wines below it, and nothing else. */
const OF_KIND: ReadonlySet<string> = new Set<FieldName>(['style', 'category', 'product', 'organic', 'stage']);

const holdsNumber = (terms: readonly Term[]): boolean => terms.some(({ kind }) => kind === 'number');

/**
 * The lines of a round with several headings (`Reds` … `Whites` …): each heading stands with the lines below it, up to
 * the next, so that no wine is taken for one of another colour. Lines with one heading at most stay as they are.
 *
 * @param lines The terms of each line.
 * @param read Reads a line on its own.
 */
export function withSections(
  lines: readonly (readonly Term[])[],
  read: (terms: readonly Term[]) => Draft,
): readonly (readonly Term[])[] {
  const isHeading = (terms: readonly Term[]): boolean => {
    if (holdsNumber(terms)) return false;
    const { fields, problems } = read(terms);
    const keys = Object.keys(fields);
    return problems.length === 0 && keys.length > 0 && keys.every((key) => OF_KIND.has(key));
  };
  const [first] = lines;
  if (first === undefined || lines.filter((terms) => !holdsNumber(terms)).length < 2 || !isHeading(first))
    return lines;
  const headings = new Set(lines.filter(isHeading));
  if (headings.size < 2) return lines;
  let heading: readonly Term[] = [];
  return lines.flatMap((terms) => {
    if (headings.has(terms)) heading = terms.filter(({ kind }) => kind === 'word');
    if (headings.has(terms)) return [];
    return holdsNumber(terms) ? [[...terms, ...heading.map((term) => ({ ...term, gap: true }))]] : [terms];
  });
}
