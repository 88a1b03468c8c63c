import type { LimitFacts } from './limit-facts.ts';
import type { LimitsFound } from './limit.ts';

/**
 * The limits of a wine in a market, mg/L. What is unknown is taken at its strictest, and said.
 *
 * @param facts sugar in g/L, density in kg/L
 */
export function limitsFor(facts: LimitFacts): LimitsFound {
  return { none: { region: facts.region ?? 'oiv', product: 'still', reason: 'not-on-file' }, notes: [] };
}
