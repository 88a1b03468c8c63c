import { assertBetween, assertWithinBounds } from '../bounds.ts';
import type { LimitFacts } from './limit-facts.ts';
import { limitOfRow } from './limit-of-row.ts';
import type { LimitRow } from './limit-row.ts';
import type { Limit, LimitNote, LimitsFound, NoLimit } from './limit.ts';
import { notesOn } from './notes-on.ts';
import { productsOf, rowsFor, rowsOfRegion } from './rows-for.ts';
import { sugarFit, type SugarFit } from './sugar-fits.ts';

/**
 * The limits of SO2 for a wine in a market, of total and of free apart; or why none is on file. What nobody said is
 * taken at its strictest: colour, sugar (dry, or above 5 g/L where the wine is called sweet), the class of a sparkling
 * wine, the density. Sugar counts in the basis that the law names.
 *
 * @param facts sugar in g/L, density in kg/L
 * @throws RangeError for a sugar or a density outside its bounds
 *
 * Source: `limit-rows`, where every row names its text.
 *
 * @example
 * ```ts
 * limitsFor({ region: 'eu', style: 'red', sugar_g_L: 4.99 }).total?.limit_mg_L // => 150
 * limitsFor({ region: 'eu', style: 'red', sugar_g_L: 5 }).total?.rule // => 'eu-red-5'
 * limitsFor({ style: 'red', sugar_g_L: 4 }).total?.rule // => 'oiv-red-dry'
 * limitsFor({ region: 'uy' }).none // => { region: 'uy', product: 'still', reason: 'not-found' }
 * limitsFor({ region: 'cl' }).free?.limit_mg_L // => 75
 * ```
 */
export function limitsFor(facts: LimitFacts): LimitsFound {
  assertWithinBounds('find a limit', 'sugar_g_L', facts.sugar_g_L);
  if (facts.density_kg_L !== undefined)
    assertBetween('find a limit', 'density_kg_L', facts.density_kg_L, 0.9, 1.4);
  const { region = 'oiv' } = facts;
  if (facts.stage === 'must') return { none: noneFor(facts, 'must'), notes: [] };
  const rows = rowsFor(facts).filter((row) => row.note !== 'from-seven-percent' || isSevenPercent(facts));
  const found = { total: strictest(rows, 'total', facts), free: strictest(rows, 'free', facts) };
  const chosen = [found.total, found.free].filter((one) => one !== undefined);
  if (chosen.length === 0) return { none: noneFor(facts), notes: notesOn(chosen, rows, facts) };
  const limitOf = (one: Chosen | undefined): Limit | undefined =>
    one && { ...limitOfRow(one.row, facts), region };
  const total = limitOf(found.total);
  const free = limitOf(found.free);
  const notes: readonly LimitNote[] = notesOn(chosen, rows, facts);
  return { ...(total && { total }), ...(free && { free }), notes };
}

/** A row that was chosen, and whether its sugar stands at an end that the text leaves open. */
export interface Chosen {
  readonly row: LimitRow;
  readonly atOpenEnd: boolean;
}

interface Fitting {
  readonly row: LimitRow;
  readonly fit: SugarFit;
}

/** Of the rows that the wine may fall under, what was opened before what is ordinary, then the least figure. */
function strictest(rows: readonly LimitRow[], of: Limit['of'], facts: LimitFacts): Chosen | undefined {
  const isSweet = facts.category === 'sweet' || facts.designated_mg_L !== undefined;
  const fitting = rows
    .filter((row) => (row.of === 'free' ? 'free' : 'total') === of)
    .map((row) => ({ row, fit: sugarFit(row.sugar, facts.sugar_g_L, isSweet) }))
    .filter(({ fit }) => fit !== 'out');
  const isIn = ({ fit }: Fitting): boolean => fit !== 'at-open-end';
  const opened = fitting.filter(({ row }) => replacesOrdinary(row));
  const openedIn = opened.filter(isIn);
  const ordinaryIn = fitting.filter((one) => isIn(one) && !opened.includes(one));
  const atEnds = ordinaryIn.length > 0 ? [...opened, ...ordinaryIn] : fitting;
  const left = openedIn.length > 0 ? openedIn : atEnds;
  const bySugar = left.filter(({ row, fit }) => row.sugar !== undefined && fit !== 'unknown');
  const [first] = (bySugar.length > 0 ? bySugar : left).toSorted((a, b) => byStrictness(a.row, b.row, facts));
  return first && { row: first.row, atOpenEnd: first.fit === 'at-open-end' };
}

/** A row that somebody's word has opened; dry and sweet are split by every wine. */
function replacesOrdinary({ designation }: LimitRow): boolean {
  return designation !== undefined && designation !== 'dry' && designation !== 'sweet';
}

function byStrictness(a: LimitRow, b: LimitRow, facts: LimitFacts): number {
  const [one, other] = [limitOfRow(a, facts), limitOfRow(b, facts)];
  return one.limit_mg_L - other.limit_mg_L || one.operator.length - other.operator.length;
}

/** Below 7 % vol the rule of the class does not hold (from memory). */
function isSevenPercent({ alcohol_percent }: LimitFacts): boolean {
  return alcohol_percent === undefined || alcohol_percent >= 7;
}

function noneFor(facts: LimitFacts, stage?: 'must'): NoLimit {
  const { region = 'oiv' } = facts;
  const isLooked = rowsOfRegion(region).some(({ status }) => status === 'not-found');
  const [product = 'still', another] = productsOf(facts);
  return {
    region,
    product: stage ?? (another === undefined ? product : 'sparkling'),
    reason: isLooked ? 'not-found' : 'not-on-file',
  };
}
