import { learnedOf } from '../../../../core/cellar/learned-of.ts';
import { nextCheck } from '../../../../core/cellar/next-check.ts';
import type { WineTraits } from '../../../../core/cellar/entry.ts';
import type { Known, KnownTraits, Vessel } from '../../../../core/cellar/vessel.ts';
import type { Fields } from '../../../reader/understood.ts';
import { dayText, momentText } from '../../../replies/moment-text.ts';
import { numberText } from '../../../replies/number-text.ts';
import { concentrationText } from '../../../replies/quantity-text.ts';
import type { Line } from '../../../replies/reply.ts';
import { vesselName } from '../../../replies/vessel-name.ts';
import { volumeText } from '../../../replies/volume-text.ts';
import { checkSettingsOf } from '../../check-settings-of.ts';
import type { Here } from '../../here.ts';
import { learnedLine } from '../../lines/learned.ts';
import { lawFacts } from '../../lines/law-facts.ts';
import { line, listLine, part } from '../../lines/line.ts';
import { notedAmount } from '../../lines/noted-amount.ts';
import { nameText, whoText } from '../../people.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { tellingOf } from '../../telling.ts';

/** So many of the last additions stand on the sheet of a vessel. */
const ADDITIONS = 4;

type Part = Omit<Line, 'room'>;

/** All that is known of a vessel on one screen: content, last readings with dates, additions, what bound, what is next. */
export function vesselSheet(name: string | undefined, here: Here): Handled {
  const vessel = name === undefined ? undefined : here.vessels.get(name);
  if (name === undefined || vessel === undefined) {
    const values = { vessel: name === undefined ? 'none' : vesselName(name) };
    return replying(here, { lines: [line('first', 'vessel-unknown', values)] });
  }
  return replying(here, {
    lines: [
      head(vessel, here),
      ...listLine('first', 'vessel-readings', readings(vessel, here)),
      ...voidLines(vessel, here),
      ...vessel.additions.slice(-ADDITIONS).map((one) => additionLine(one, vessel, here)),
      ...boundLines(vessel, here),
      ...orderLines(vessel, here),
      ...nextLines(vessel, here),
      ...claimLines(vessel, here),
    ],
  });
}

function head(vessel: Vessel, here: Here): Line {
  const values = { vessel: vesselName(vessel.vessel) };
  if (vessel.empty !== undefined)
    return line('first', 'vessel-empty', { ...values, day: dayText(vessel.empty, tellingOf(here)) });
  const content = contentOf(vessel, here);
  if (content.length === 0) return line('first', 'vessel-bare', values);
  return { ...line('first', 'vessel-head', values), list: content };
}

/** What the vessel holds, each as the sentences about a reading tell it. */
function contentOf({ traits, volume_L, capacity_L, lot }: Vessel, { settings, memory }: Here): Part[] {
  const mark = memory.decimalMark ?? '.';
  const said = (value: number): string => numberText(value, 2, mark);
  const litres = (value: number): string => volumeText(value, settings.volumeUnit, mark);
  const { style, category, product, organic, stage, alcohol_percent, sugar_g_L } = traits;
  return [
    ...(lot ? [part('fact-lot', { lot: lot.value })] : []),
    ...(volume_L ? [part('fact-volume', { volume: litres(volume_L.value) })] : []),
    ...(capacity_L ? [part('fact-capacity', { volume: litres(capacity_L.value) })] : []),
    ...(style ? [part('fact-style', { style: style.value })] : []),
    ...(category ? [part('fact-category', { category: category.value })] : []),
    ...(product ? [part('fact-product', { product: product.value })] : []),
    ...(organic?.value === true ? [part('fact-organic')] : []),
    ...lawFacts(valuesOf(traits), mark),
    ...(stage ? [part('fact-stage', { stage: stage.value })] : []),
    ...(alcohol_percent ? [part('fact-alcohol', { percent: said(alcohol_percent.value) })] : []),
    ...(sugar_g_L ? [part('fact-sugar', { sugar: said(sugar_g_L.value) })] : []),
  ];
}

function valuesOf(traits: KnownTraits): WineTraits {
  return Object.fromEntries(Object.entries(traits).map(([name, { value }]) => [name, value]));
}

function readings(vessel: Vessel, here: Here): Part[] {
  const said = (value: number): string => numberText(value, 2, here.memory.decimalMark ?? '.');
  const dated = <T>(known: Known<T> | undefined, fact: (value: T) => Part): Part[] =>
    known === undefined
      ? []
      : [{ ...part('recalled', { day: dayText(known.at, tellingOf(here)) }), list: [fact(known.value)] }];
  return [
    ...dated(vessel.free_mg_L, (value) => part('fact-free', { free: said(value) })),
    ...dated(vessel.total_mg_L, (value) => part('fact-total', { total: said(value) })),
    ...dated(vessel.ph, (value) => part('fact-ph', { ph: said(value) })),
  ];
}

/** What was known and is not any more, and why. */
function voidLines({ voided }: Vessel, here: Here): Line[] {
  return (['ph', 'volume_L'] as const).flatMap((name) => {
    const why = voided[name];
    if (why === undefined) return [];
    const field: keyof Fields = name;
    return [line('first', 'vessel-void', { field, event: why.event, day: dayText(why.at, tellingOf(here)) })];
  });
}

function additionLine(one: Vessel['additions'][number], vessel: Vessel, here: Here): Line {
  const mark = here.memory.decimalMark ?? '.';
  const amount = notedAmount(one, mark);
  const values = {
    entry: String(one.entry),
    when: momentText(one.at, tellingOf(here)),
    who: nameText(one.by, here),
    added: one.added_mg_L === undefined ? 'none' : concentrationText(one.added_mg_L, mark),
    landed: vessel.unlanded.includes(one.entry) ? 'not-yet' : 'landed',
  };
  return { ...line('first', 'vessel-addition', values), list: amount ? [amount] : [part('amount-unknown')] };
}

/** The share that bound so far: as it was learned, else of each addition that landed, from the least to the most. */
function boundLines(vessel: Vessel, here: Here): Line[] {
  const { landings } = vessel;
  const learned = learnedOf(vessel);
  if (learned !== undefined)
    return [{ ...learnedLine(learned, here.memory.decimalMark ?? '.'), room: 'first' }];
  const shares = landings.map(({ bound_share }) => bound_share).filter((one) => one >= 0 && one <= 1);
  if (shares.length === 0) return [];
  const mark = here.memory.decimalMark ?? '.';
  const percent = (share: number): string => numberText(share * 100, 0, mark);
  const mean = shares.reduce((sum, one) => sum + one, 0) / shares.length;
  return [
    line('first', 'vessel-bound', {
      count: String(shares.length),
      number: shares.length === 1 ? 'one' : 'many',
      share: percent(mean),
      least: percent(Math.min(...shares)),
      most: percent(Math.max(...shares)),
    }),
  ];
}

function orderLines({ orders }: Vessel, here: Here): Line[] {
  const mark = here.memory.decimalMark ?? '.';
  return orders.map((order) => {
    const amount = notedAmount(order, mark);
    const values = {
      entry: String(order.entry),
      who: nameText(order.by, here),
      when: momentText(order.at, tellingOf(here)),
    };
    return { ...line('first', 'vessel-order', values), list: amount ? [amount] : [part('amount-unknown')] };
  });
}

function nextLines(vessel: Vessel, here: Here): Line[] {
  const check = nextCheck(vessel, checkSettingsOf(here.settings));
  if (vessel.unwatched) return [line('first', 'vessel-unwatched', { vessel: vesselName(vessel.vessel) })];
  if (check === undefined) return [];
  const when = momentText(check.at, tellingOf(here));
  return [
    line('first', check.at <= here.message.at ? 'vessel-check-due' : 'vessel-check', {
      when,
      why: check.why,
    }),
  ];
}

function claimLines({ vessel }: Vessel, here: Here): Line[] {
  const claim = here.claims.get(vessel);
  if (claim === undefined) return [];
  const values = {
    vessel: vesselName(vessel),
    who: whoText(claim.by, here),
    when: momentText(claim.at, tellingOf(here)),
  };
  return [line('first', 'on-it', values)];
}
