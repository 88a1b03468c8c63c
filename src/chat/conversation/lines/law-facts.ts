import type { WineTraits } from '../../../core/cellar/entry.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import { part } from './line.ts';

type Part = Omit<Line, 'room'>;

/** What the law asks about a wine beside its colour and sugar, as far as somebody has told it. */
export function lawFacts(traits: WineTraits, mark: DecimalMark): Part[] {
  const { designated_mg_L, uplift, quality, pdo, bulk, density_kg_L, reserve_mg_L } = traits;
  const said = (value: number): string => numberText(value, 1, mark);
  return [
    ...(quality === undefined ? [] : [part('fact-quality', { quality: quality ? 'yes' : 'no' })]),
    ...(pdo === true ? [part('fact-pdo')] : []),
    ...(bulk === true ? [part('fact-bulk')] : []),
    ...(designated_mg_L === undefined ? [] : [part('fact-designated', { limit: said(designated_mg_L) })]),
    ...(uplift === undefined ? [] : [part('fact-uplift', { declared: uplift ? 'yes' : 'no' })]),
    ...(density_kg_L === undefined
      ? []
      : [part('fact-density', { density: numberText(density_kg_L, 4, mark) })]),
    ...(reserve_mg_L === undefined ? [] : [part('fact-reserve', { reserve: said(reserve_mg_L) })]),
  ];
}
