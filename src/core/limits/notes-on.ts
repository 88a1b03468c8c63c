import type { LimitFacts } from './limit-facts.ts';
import type { LimitRow } from './limit-row.ts';
import type { LimitNote } from './limit.ts';
import { productsOf, rowsOfRegion } from './rows-for.ts';

/** Sugar in g/L from which a wine may be of a class of sweet wines, so that it is asked (own threshold). */
const MAY_BE_DESIGNATED_g_L = 30;

/** The row that was chosen, and whether the wine's sugar stands at an end that the text leaves open. */
export interface ChosenRow {
  readonly row: LimitRow;
  readonly atOpenEnd: boolean;
}

/**
 * What was assumed to find a wine's limits, and what has to be said beside them.
 *
 * @param chosen the rows that hold
 * @param rows all that the wine may fall under by what is known; sugar in g/L
 * @param facts as they were said
 *
 * @example
 * ```ts
 * notesOn([], [], { region: 'uy' }) // => []
 * ```
 */
export function notesOn(
  chosen: readonly ChosenRow[],
  rows: readonly LimitRow[],
  facts: LimitFacts,
): readonly LimitNote[] {
  const here = rowsOfRegion(facts.region ?? 'oiv');
  return [...assumed(chosen, rows, facts), ...told(chosen, facts), ...notUsed(chosen, here, facts)];
}

function assumed(
  chosen: readonly ChosenRow[],
  rows: readonly LimitRow[],
  facts: LimitFacts,
): readonly LimitNote[] {
  const notes: LimitNote[] = [];
  const any = (is: (row: LimitRow) => boolean): boolean => chosen.some(({ row }) => is(row));
  const isSplit = new Set(rows.map(({ sugar }) => sugar?.from_g_L ?? -(sugar?.to_g_L ?? 0))).size > 1;
  if (facts.sugar_g_L === undefined && isSplit) notes.push({ code: 'sugar-assumed' });
  if (facts.style === undefined && any((row) => row.styles !== undefined))
    notes.push({ code: 'colour-assumed' });
  const isBoth = productsOf(facts).length > 1 && any((row) => row.products.length === 1);
  if (isBoth) notes.push({ code: 'sparkling-class-assumed' });
  const isByMass = any(({ unit }) => unit === 'mg/kg' || unit === 'g/kg');
  if (facts.density_kg_L === undefined && isByMass) notes.push({ code: 'density-assumed' });
  return notes;
}

function told(chosen: readonly ChosenRow[], facts: LimitFacts): readonly LimitNote[] {
  return chosen.flatMap(({ row, atOpenEnd }) => {
    const rule = row.id;
    const notes: LimitNote[] = [];
    if (atOpenEnd) notes.push({ code: 'boundary-open', rule });
    const isBoundary = row.sugar?.from_g_L === facts.sugar_g_L;
    if (row.note !== undefined && (row.note !== 'boundary-told-otherwise' || isBoundary))
      notes.push({ code: row.note, rule });
    const isUplifted = facts.uplift === true && row.of === 'total' && row.uplift_mg_L === undefined;
    if (isUplifted) notes.push({ code: 'no-uplift', rule });
    return notes;
  });
}

/** What else is on file for such a wine and may not be compared with. */
function notUsed(
  chosen: readonly ChosenRow[],
  here: readonly LimitRow[],
  facts: LimitFacts,
): readonly LimitNote[] {
  const notes: LimitNote[] = [];
  const kinds = productsOf(facts);
  const ofKind = here.filter(({ products }) => products.some((one) => kinds.includes(one)));
  for (const { id, status } of ofKind) {
    if (status === 'repealed') notes.push({ code: 'repealed', rule: id });
    if (status === 'other-unit') notes.push({ code: 'other-unit-told', rule: id });
    if (status === 'second-value') notes.push({ code: 'second-value-told', rule: id });
  }
  const isOrganic = facts.organic !== undefined && facts.organic !== false;
  if (isOrganic && chosen.some(({ row }) => row.organic !== true))
    notes.push({ code: 'organic-not-on-file' });
  const isDesignated = chosen.some(({ row }) => row.designation?.startsWith('sweet-') === true);
  if (facts.designated_mg_L !== undefined) {
    if (!isDesignated) notes.push({ code: 'designation-not-on-file' });
  } else if (mayBeDesignated(ofKind, facts)) notes.push({ code: 'designation-unknown' });
  return notes;
}

function mayBeDesignated(ofKind: readonly LimitRow[], { category, sugar_g_L, style }: LimitFacts): boolean {
  if (category !== 'sweet' && (sugar_g_L ?? 0) < MAY_BE_DESIGNATED_g_L) return false;
  return ofKind.some(
    ({ designation, styles }) =>
      designation?.startsWith('sweet-') === true &&
      (style === undefined || styles === undefined || styles.includes(style)),
  );
}
