import type { Entry, LoggedEntry, VesselChange } from '../../../core/cellar/entry.ts';
import { dayText } from '../../replies/moment-text.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import { concentrationText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName, vesselNames } from '../../replies/vessel-name.ts';
import { volumeText } from '../../replies/volume-text.ts';
import type { Here } from '../here.ts';
import { tellingOf } from '../telling.ts';
import { lawFacts } from './law-facts.ts';
import { part } from './line.ts';
import { ruleValues } from './rule.ts';
import { besideAmount, notedAmount } from './noted-amount.ts';

type Part = Omit<Line, 'room'>;

/** What an entry holds, as one part of a line: vessel, what, how much. */
export function entryPart(entry: LoggedEntry, here: Pick<Here, 'settings' | 'memory' | 'message'>): Part {
  const mark = here.memory.decimalMark ?? '.';
  const vessel = vesselNames(entry.vessels);
  switch (entry.kind) {
    case 'addition':
    case 'order': {
      const amount = notedAmount(entry, mark);
      const { added_mg_L } = entry;
      const added = added_mg_L === undefined ? 'none' : concentrationText(added_mg_L, mark);
      const values = { vessel, added, known: amount ? 'some' : 'none' };
      return {
        ...part(`entry-${entry.kind}`, values),
        list: [...(amount ? [amount] : []), ...overRule(entry, mark), ...besideAmount(entry)],
      };
    }
    case 'reading':
      return {
        ...part('entry-reading', { vessel }),
        list: [...measuredParts(entry, mark), ...besideAmount(entry)],
      };
    case 'vessel': {
      const list = toldParts(entry, here.settings.volumeUnit, mark);
      const values = { vessel, ...eventValues(entry, here), told: list.length === 0 ? 'none' : 'some' };
      return { ...part('entry-vessel', values), list };
    }
    case 'other':
      return part('entry-other', { vessel, text: entry.remark });
    case 'stock':
      return stockPart(entry, mark);
    case 'correction':
      return part('entry-correction', { entry: String(entry.corrects), reason: entry.reason });
  }
}

function stockPart(entry: Extract<Entry, { kind: 'stock' }>, mark: DecimalMark): Part {
  const amount = notedAmount(entry, mark);
  const values = { event: entry.event, supplier: entry.supplier ?? 'none' };
  return { ...part('entry-stock', values), list: [...(amount ? [amount] : []), ...besideAmount(entry)] };
}

/** The rule that an addition was known to pass. */
function overRule(entry: Extract<Entry, { kind: 'addition' | 'order' }>, mark: DecimalMark): Part[] {
  const over_rule = entry.kind === 'addition' ? entry.over_rule : undefined;
  return over_rule === undefined ? [] : [part('over-rule', ruleValues(over_rule, mark))];
}

function measuredParts(entry: Extract<Entry, { kind: 'reading' }>, mark: DecimalMark): Part[] {
  const said = (value: number): string => numberText(value, 2, mark);
  const { free_mg_L, total_mg_L, ph, temperature_C } = entry;
  return [
    ...(free_mg_L === undefined ? [] : [part('fact-free', { free: said(free_mg_L) })]),
    ...(total_mg_L === undefined ? [] : [part('fact-total', { total: said(total_mg_L) })]),
    ...(ph === undefined ? [] : [part('fact-ph', { ph: said(ph) })]),
    ...(temperature_C === undefined ? [] : [part('fact-temperature', { celsius: said(temperature_C) })]),
  ];
}

function eventValues(
  { event, to, lot, volume_L, until }: VesselChange,
  here: Pick<Here, 'settings' | 'message'>,
): Record<string, string> {
  return {
    event,
    to: to === undefined ? 'none' : vesselName(to),
    lot: lot ?? '',
    until: until === undefined ? '' : dayText(until, tellingOf(here)),
    whole: volume_L === undefined ? 'all' : 'part',
  };
}

/** What was told of a vessel; of what was moved its volume. */
function toldParts(entry: VesselChange, unit: Here['settings']['volumeUnit'], mark: DecimalMark): Part[] {
  const { style, category, product, organic, stage, alcohol_percent, sugar_g_L, volume_L, capacity_L } =
    entry;
  return [
    ...(volume_L === undefined ? [] : [part('fact-volume', { volume: volumeText(volume_L, unit, mark) })]),
    ...(capacity_L === undefined
      ? []
      : [part('fact-capacity', { volume: volumeText(capacity_L, unit, mark) })]),
    ...(style === undefined ? [] : [part('fact-style', { style })]),
    ...(category === undefined ? [] : [part('fact-category', { category })]),
    ...(product === undefined ? [] : [part('fact-product', { product })]),
    ...(organic === true ? [part('fact-organic')] : []),
    ...lawFacts(entry, mark),
    ...(stage === undefined ? [] : [part('fact-stage', { stage })]),
    ...(alcohol_percent === undefined
      ? []
      : [part('fact-alcohol', { percent: numberText(alcohol_percent, 2, mark) })]),
    ...(sugar_g_L === undefined ? [] : [part('fact-sugar', { sugar: numberText(sugar_g_L, 2, mark) })]),
  ];
}
