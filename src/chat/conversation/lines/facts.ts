import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import { readStrength } from '../../../core/additives/read-strength.ts';
import type { Fields, Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { numberText } from '../../replies/number-text.ts';
import { volumeText } from '../../replies/volume-text.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import type { Manner } from '../manner.ts';
import { countOf } from '../to-requests.ts';
import { saidFields } from '../recall.ts';
import { lawFacts } from './law-facts.ts';
import { listLine, part } from './line.ts';
import { targetValues } from './target-text.ts';

type Part = Omit<Line, 'room'>;

/** What was read, figure by figure, so that a misread one is seen before anything is weighed. */
export function factLines(reading: Reading, manner: Manner): Line[] {
  return listLine('assumed', 'read', factsOf(reading, manner));
}

/** The facts that a reading states, as parts of a list. */
export function factsOf(reading: Reading, manner: Manner): Part[] {
  return partsOf(reading, saidFields(reading), manner);
}

/** Some fields of a reading, as parts of a list. */
export function partsOf(reading: Reading, fields: Fields, manner: Manner): Part[] {
  const said = (value: number): string => numberText(value, 2, manner.mark);
  const figures: Part[] = [];
  const figure = (name: keyof Fields, key: SentenceKey, as: (value: number) => Line['values']): void => {
    const value = fields[name];
    if (typeof value === 'number') figures.push(part(key, as(value)));
  };
  figure('volume_L', countOf(reading) ? 'fact-volume-count' : 'fact-volume', (value) => ({
    volume: volumeText(value, manner.volumeUnit, manner.mark),
    count: said(countOf(reading) ?? 1),
  }));
  figure('ph', 'fact-ph', (value) => ({ ph: said(value) }));
  figure('free_mg_L', 'fact-free', (value) => ({ free: said(value) }));
  figure('total_mg_L', 'fact-total', (value) => ({ total: said(value) }));
  figure('temperature_C', 'fact-temperature', (value) => ({ celsius: numberText(value, 1, manner.mark) }));
  figure('alcohol_percent', 'fact-alcohol', (value) => ({ percent: said(value) }));
  figure('sugar_g_L', 'fact-sugar', (value) => ({ sugar: said(value) }));
  return [...figures, ...wordsOf(fields, manner)];
}

function wordsOf(fields: Fields, manner: Manner): Part[] {
  const words: Part[] = [];
  if (fields.style) words.push(part('fact-style', { style: fields.style }));
  if (fields.category) words.push(part('fact-category', { category: fields.category }));
  if (fields.product) words.push(part('fact-product', { product: fields.product }));
  if (fields.organic) words.push(part('fact-organic'));
  words.push(...lawFacts(fields, manner.mark));
  if (fields.stage) words.push(part('fact-stage', { stage: fields.stage }));
  if (fields.target) words.push(part('fact-target', targetValues(fields.target, manner)));
  words.push(...tabletOf(fields, manner));
  if (fields.additive !== undefined && fields.strength_percent !== undefined)
    words.push(
      part('fact-strength', {
        additive: fields.additive,
        strength: numberText(fields.strength_percent, 2, manner.mark),
        kind: strengthKind(fields.additive, fields.strength_percent),
      }),
    );
  return words;
}

/** The tablet at hand, which the amount does not name where even half of it is too much. */
function tabletOf({ additive, tablet_SO2_g, tablet_salt_g }: Fields, { mark }: Manner): Part[] {
  const size = tablet_SO2_g ?? tablet_salt_g;
  if (additive === undefined || size === undefined) return [];
  return [part('fact-tablet', { additive, size: numberText(size, 2, mark) })];
}

/** How a strength was read; a bisulfite's has a note of its own among the assumptions. */
export function strengthKind(additive: AdditiveId, strength_percent: number): string {
  if (additive.includes('bisulfite-solution') && !additive.includes('meta')) return 'noted';
  const read = readStrength(additive, strength_percent, false, true);
  return 'kind' in read ? read.kind : 'noted';
}
