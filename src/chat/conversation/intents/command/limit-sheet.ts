import type { Vessel } from '../../../../core/cellar/vessel.ts';
import { traitsOf } from '../../../../core/cellar/traits-of.ts';
import { portionOf } from '../../../../core/dose/portion.ts';
import { roomToLimit, beforeOf, type RoomToLimit } from '../../../../core/dose/room-to-limit.ts';
import { LAW_TEXTS } from '../../../../core/limits/law-texts.ts';
import type { Limit } from '../../../../core/limits/limit.ts';
import { limitsFor } from '../../../../core/limits/limits-for.ts';
import { notPermittedBy } from '../../../../core/limits/permitted.ts';
import type { Region } from '../../../../core/limits/region.ts';
import type { Reading } from '../../../reader/understood.ts';
import { numberText } from '../../../replies/number-text.ts';
import type { Line } from '../../../replies/reply.ts';
import { vesselName } from '../../../replies/vessel-name.ts';
import { volumeText } from '../../../replies/volume-text.ts';
import type { Here } from '../../here.ts';
import { lawNotes } from '../../lines/law-notes.ts';
import { limitFigure, rowOfRule, ruleValues } from '../../lines/rule.ts';
import { line, listLine } from '../../lines/line.ts';
import { bareAmount } from '../../lines/measured.ts';
import { mannerOf, type Manner } from '../../manner.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { organicOf } from '../../to-requests.ts';
import { totalOfVessel, type TotalKnown } from '../../total-of-vessel.ts';

/** Litres that an amount is told for where the volume is not known: a hectolitre. */
const HECTOLITRE_L = 100;

/** What the law allows a wine: the rule with its text and how it was checked, and the room that is left. */
export function limitSheet(reading: Reading, here: Here): Handled {
  const { fields, command } = reading;
  const region = command?.name === 'limit' ? (command.region ?? here.settings.region) : here.settings.region;
  const name = fields.vessel;
  const vessel = name === undefined ? undefined : here.vessels.get(name);
  if (name !== undefined && vessel === undefined)
    return replying(here, { lines: [line('first', 'vessel-unknown', { vessel: vesselName(name) })] });
  return replying(here, { lines: sheetLines(reading, vessel, region, here) });
}

/** What is known of the wine: what was said goes before what is known of the vessel. */
function factsOf(vessel: Vessel | undefined, reading: Reading, region: Region): Facts {
  const { fields } = reading;
  const traits = vessel === undefined ? {} : traitsOf(vessel);
  const total = vessel && totalOfVessel(vessel);
  const free_mg_L = fields.free_mg_L ?? vessel?.free_mg_L?.value;
  const total_mg_L = fields.total_mg_L ?? total?.total_mg_L;
  return {
    ...traits,
    ...fields,
    region,
    organic: organicOf(reading, region) ?? traits.organic ?? false,
    ...(free_mg_L !== undefined && { free_mg_L }),
    ...(total_mg_L !== undefined && { total_mg_L }),
  };
}

type Facts = Parameters<typeof roomToLimit>[0] & { readonly volume_L?: number };

function sheetLines(reading: Reading, vessel: Vessel | undefined, region: Region, here: Here): Line[] {
  const { fields } = reading;
  const manner = mannerOf(reading, here.memory.decimalMark ?? '.', here);
  const facts = factsOf(vessel, reading, region);
  const found = limitsFor(facts);
  const name = fields.vessel === undefined ? 'none' : vesselName(fields.vessel);
  if (notPermittedBy('potassium-metabisulfite', facts)?.reason === 'organic-none')
    return noneAtAll(name, region);
  const { none, total, free } = found;
  const limits = [total, free].filter((one) => one !== undefined);
  const room = roomToLimit(facts);
  const sum = fields.total_mg_L === undefined && vessel ? totalOfVessel(vessel) : undefined;
  const asksDesignation = found.notes.some(({ code }) => code === 'designation-unknown');
  return [
    ...(none
      ? [line('first', 'limit-none', { vessel: name, region, product: none.product, reason: none.reason })]
      : []),
    ...limits.flatMap((limit, at) => [
      limitLine(limit, at === 0 ? name : 'none', manner),
      ...roomLine(limit, room, manner),
      textLine(limit),
    ]),
    ...sumLine(sum, manner),
    ...amountLine(room, facts, vessel, here, manner),
    ...(asksDesignation
      ? [line('first', 'designation-asked', { region, wine: name === 'none' ? 'limit white' : name })]
      : []),
    ...listLine('first', 'limit-notes', lawNotes(found, manner.mark)),
    line('first', 'limit-care'),
  ];
}

/** Wine that is labelled organic may have none added: the ordinary limit would say the contrary. */
function noneAtAll(vessel: string, region: Region): Line[] {
  const values = { vessel, region, reason: 'organic-none', additive: '' };
  return [
    line('first', 'refused-organic', values),
    textLine({ rule: 'us-organic' }),
    line('first', 'limit-care'),
  ];
}

/** Units that say the same of a wine. */
const ALIKE: readonly string[] = ['mg/L', 'ppm', 'mg/dm3'];

function limitLine(limit: Limit, vessel: string, manner: Manner): Line {
  const { as_written, operator, of, uplift_mg_L = 0, density_kg_L } = limit;
  return line('first', 'limit-is', {
    ...ruleValues(limit.rule, manner.mark),
    vessel,
    of,
    operator: operator === '<' ? 'below' : 'at-most',
    limit: limitFigure(limit, manner.mark),
    unit: manner.unit,
    written: ALIKE.includes(as_written.unit) ? 'same' : 'other',
    value: numberText(as_written.value, 3, manner.mark),
    law_unit: as_written.unit,
    density: density_kg_L === undefined ? 'none' : numberText(density_kg_L, 4, manner.mark),
    uplift: uplift_mg_L === 0 ? 'none' : numberText(uplift_mg_L, 1, manner.mark),
  });
}

/** How far the wine is from it; nothing where what counts is not known. */
function roomLine(limit: Limit, room: RoomToLimit, manner: Manner): Line[] {
  const now_mg_L = limit.of === 'total' && !room.totalKnown ? undefined : beforeOf(limit, room);
  if (now_mg_L === undefined) return [];
  const left_mg_L = limit.limit_mg_L - now_mg_L;
  const said = (value: number): string => numberText(value, 1, manner.mark);
  return [
    line('first', 'limit-room', {
      of: limit.of,
      standing: left_mg_L < 0 || (left_mg_L === 0 && limit.operator === '<') ? 'over' : 'room',
      now: said(now_mg_L),
      room: said(Math.abs(left_mg_L)),
      left: said(Math.max(0, left_mg_L - room.kept_mg_L)),
      kept: said(room.kept_mg_L),
      unit: manner.unit,
    }),
  ];
}

/** The text that the rule stands in, and how the figure was checked. */
function textLine({ rule }: Pick<Limit, 'rule'>): Line {
  const row = rowOfRule(rule);
  return line('first', 'limit-text', {
    text: row === undefined ? rule : LAW_TEXTS[row.text].name,
    provision: row?.provision ?? 'none',
    version: row?.version ?? 'none',
    checked: row?.checked ?? 'memory',
  });
}

function sumLine(sum: TotalKnown | undefined, manner: Manner): Line[] {
  if (sum === undefined || sum.since_mg_L === 0) return [];
  const said = (value: number): string => numberText(value, 1, manner.mark);
  return [
    line('first', 'total-sum', {
      total: said(sum.total_mg_L),
      measured: said(sum.measured_mg_L),
      since: said(sum.since_mg_L),
      day: manner.day(sum.at),
    }),
  ];
}

/** The room as so much of the additive that is used, in the vessel, else in a hectolitre. */
function amountLine(
  room: RoomToLimit,
  facts: Facts,
  vessel: Vessel | undefined,
  here: Here,
  manner: Manner,
): Line[] {
  const { usualAdditive, usualStrength } = here.settings;
  const usual = vessel?.usual?.value;
  const additive =
    usual?.additive === undefined
      ? { id: usualAdditive, ...usualStrength }
      : { ...usual, id: usual.additive };
  const { ceiling_mg_L } = room;
  if (!room.totalKnown || ceiling_mg_L === undefined) return [];
  const left_mg_L = Math.max(0, ceiling_mg_L - room.kept_mg_L);
  if (left_mg_L === 0) return [];
  const volume_L = facts.volume_L ?? vessel?.volume_L?.value;
  const shown = portionOf({ volume_L: volume_L ?? HECTOLITRE_L, additive }, left_mg_L, left_mg_L)?.shown;
  const amount = bareAmount(shown?.measure, 'one', manner);
  if (amount === undefined) return [];
  return [
    line('first', 'limit-amount', {
      ...amount,
      additive: additive.id,
      left: numberText(left_mg_L, 1, manner.mark),
      unit: amount['unit'] ?? '',
      volume: volumeText(
        volume_L ?? HECTOLITRE_L,
        volume_L === undefined ? 'hL' : manner.volumeUnit,
        manner.mark,
      ),
    }),
  ];
}
