import type { LimitFacts } from './limit-facts.ts';
import type { Designation, LimitProduct, LimitRow } from './limit-row.ts';
import { LIMIT_ROWS } from './limit-rows.ts';
import { REGIONS, type Region } from './region.ts';

/** Sugar in g/L above which no wine is called dry (from memory: the most that the label rules of the EU and UK let pass). */
const NEVER_DRY_ABOVE_g_L = 9;

/** Found once, as every dose asks for them. */
const ROWS_OF: ReadonlyMap<Region, readonly LimitRow[]> = new Map(
  REGIONS.map((region) => [
    region,
    LIMIT_ROWS.filter((row) => row.region === region || (region === 'ca-qc' && row.region === 'ca')),
  ]),
);

/**
 * The rows of a market that a wine may fall under by what it is, whatever its sugar and colour: in force or not.
 *
 * @param region Quebec has a row of its own for cider, and for the rest those of Canada
 *
 * @example
 * ```ts
 * rowsOfRegion('hk').map((row) => row.id) // => ['hk']
 * ```
 */
export function rowsOfRegion(region: Region): readonly LimitRow[] {
  return ROWS_OF.get(region) ?? [];
}

/**
 * What kind of drink a wine is in the table: one kind, or both of sparkling wine where nobody said which.
 *
 * @example
 * ```ts
 * productsOf({}) // => ['still']
 * productsOf({ category: 'sparkling' }) // => ['quality-sparkling', 'other-sparkling']
 * ```
 */
export function productsOf({ product, category, quality }: LimitFacts): readonly LimitProduct[] {
  if (product !== undefined) return [product];
  if (category === 'fortified') return ['fortified'];
  if (category !== 'sparkling') return ['still'];
  if (quality === undefined) return ['quality-sparkling', 'other-sparkling'];
  return [quality ? 'quality-sparkling' : 'other-sparkling'];
}

/** Whether somebody said what opens a row. A class of sweet wines is never inferred. */
function isOpen(designation: Designation, facts: LimitFacts): boolean {
  const isSweet = facts.category === 'sweet';
  const isNotDry = isSweet || (facts.sugar_g_L ?? 0) > NEVER_DRY_ABOVE_g_L;
  switch (designation) {
    case 'sweet-300':
    case 'sweet-350':
    case 'sweet-400':
      return designation === `sweet-${facts.designated_mg_L}`;
    case 'national-pdo':
      return facts.pdo === true;
    case 'national-pdo-dry':
      return facts.pdo === true && !isNotDry;
    case 'national-pdo-other':
      return facts.pdo === true && isNotDry;
    case 'dry':
      return !isSweet;
    case 'sweet':
      return isSweet;
    case 'bulk-export':
      return facts.bulk === true;
    case 'made-with-organic':
      return facts.organic === 'made-with';
  }
}

/**
 * The rows in force that a wine falls under by market, kind, colour, what was said of it, and organic or not; its sugar
 * is not looked at yet. Where rows have been opened by what was said, they stand in place of the ordinary ones.
 *
 * @param facts as said; unknown colour takes rows of every colour
 *
 * @example
 * ```ts
 * rowsFor({ region: 'eu', style: 'red' }).map((row) => row.id) // => ['eu-red-dry', 'eu-red-5']
 * rowsFor({ region: 'eu', style: 'red', designated_mg_L: 300 }).map((row) => row.id) // => ['eu-red-dry', 'eu-red-5', 'eu-desig-300']
 * ```
 */
export function rowsFor(facts: LimitFacts): readonly LimitRow[] {
  const { region = 'oiv', style, organic = false } = facts;
  const kinds = productsOf(facts);
  const inForce = rowsOfRegion(region).filter(({ status, of }) => status === 'in-force' && of !== 'added');
  const isOrganicHere = organic !== false && inForce.some((row) => hasOrganicFor(row, organic));
  return inForce.filter(
    (row) =>
      row.products.some((product) => kinds.includes(product)) &&
      (style === undefined || row.styles === undefined || row.styles.includes(style)) &&
      (row.organic ?? false) === isOrganicHere &&
      (row.designation === undefined || isOpen(row.designation, facts)),
  );
}

/** A row for wine "made with organic grapes" is none for organic wine. */
function hasOrganicFor(row: LimitRow, organic: true | 'made-with'): boolean {
  return row.organic === true && (row.designation !== 'made-with-organic' || organic === 'made-with');
}
