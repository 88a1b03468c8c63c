import { LIMIT_ROWS } from '../../../core/limits/limit-rows.ts';
import type { LimitRow } from '../../../core/limits/limit-row.ts';
import type { Limit } from '../../../core/limits/limit.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';

/** The row of a rule. */
export function rowOfRule(rule: string): LimitRow | undefined {
  return LIMIT_ROWS.find(({ id }) => id === rule);
}

/** What the sentence `rule-short` needs to name a rule: whose law, and which wine it is for. */
export function ruleValues(rule: string, mark: DecimalMark): Line['values'] {
  const row = rowOfRule(rule);
  const { from_g_L, to_g_L, fromIncluded, toIncluded } = row?.sugar ?? {};
  const said = (value: number): string => numberText(value, 2, mark);
  const low = from_g_L === undefined ? '' : said(from_g_L);
  const high = to_g_L === undefined ? '' : said(to_g_L);
  const under = toIncluded === true ? 'to' : 'under';
  const over = fromIncluded === true ? 'from' : 'above';
  return {
    region: row?.region ?? 'oiv',
    what: row === undefined ? 'wine' : whatOf(row),
    band: low === '' ? (high === '' ? 'none' : under) : high === '' ? over : 'between',
    low,
    high,
    organic: row?.organic === true ? 'yes' : 'no',
    class: row?.designation ?? 'none',
    of: row?.of === 'free' ? 'free' : 'total',
  };
}

/** Colour or product: a row for all kinds of wine is for wine. */
function whatOf({ products, styles }: LimitRow): string {
  const [first = 'still'] = products;
  if (first !== 'still') return first;
  if (styles === undefined) return 'wine';
  return styles.includes('red') ? 'red' : styles.includes('rosé') ? 'pale' : 'white';
}

/** A limit's figure as a text; beside one that the law has in another unit, that one too. */
export function limitFigure(limit: Pick<Limit, 'limit_mg_L'>, mark: DecimalMark): string {
  return numberText(limit.limit_mg_L, 1, mark);
}
