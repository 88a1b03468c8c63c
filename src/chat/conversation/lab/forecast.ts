import { forecastOf, freePoints, containerOf } from '../../../core/cellar/forecast-of.ts';
import { learnedOf } from '../../../core/cellar/learned-of.ts';
import type { Vessel } from '../../../core/cellar/vessel.ts';
import { POINTS_FEWEST } from '../../../core/forecast/decline.ts';
import type { Forecast } from '../../../core/forecast/forecast.ts';
import { DAY_ms } from '../../../core/time/durations.ts';
import { isoWithZone } from '../../../core/time/iso-with-zone.ts';
import { neededOf } from '../../attachments/chart/needed-of.ts';
import type { NeededStep } from '../../attachments/chart/chart-data.ts';
import { dayText } from '../../replies/moment-text.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText, molecularText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import type { Here } from '../here.ts';
import { learnedLine } from '../lines/learned.ts';
import { line } from '../lines/line.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { tellingOf } from '../telling.ts';
import { zoneOf } from '../zone.ts';
import type { ForecastData } from './lab-answer.ts';
import { lacking, unlanded } from './lacking.ts';

/** A day further off is told as that, days (own choice). */
const FAR_days = 730;

type Needed = Extract<NeededStep, { needed_mg_L: number }>;

/** `forecast T4`: the day on which free SO2 falls below what its pH needs, and how sure that is. */
export function tellForecast(name: string | undefined, here: Here): Handled {
  const vessel = name === undefined ? undefined : here.vessels.get(name);
  if (vessel === undefined) return lacking('vessel', name, here);
  const needed = neededOf(vessel, here.message.at, here.settings);
  if (!('needed_mg_L' in needed)) return lacking(needed.nothing === 'no-ph' ? 'ph' : 'target', name, here);
  if (vessel.unlanded.length > 0) return unlanded(vessel.vessel, here);
  const found = forecastOf(vessel, needed.needed_mg_L);
  const learned = learnedOf(vessel);
  const said = replying(here, {
    lines: [
      ...foundLines(found, vessel, needed, here),
      needLine(needed, here),
      ...(learned === undefined ? [] : [learnedLine(learned, here.memory.decimalMark ?? '.')]),
    ],
  });
  const forecast = dataOf(found, needed.needed_mg_L, here);
  return { ...said, answers: [{ forecast, ...(learned && { binding: learned }), steps: [] }] };
}

/** A day, or that it is further off than anybody plans. */
function dayOrFar(at: number | undefined, here: Here): string {
  if (at === undefined) return 'never';
  return at > here.message.at + FAR_days * DAY_ms ? 'far' : dayText(at, tellingOf(here));
}

function foundLines(found: Forecast, vessel: Vessel, needed: Needed, here: Here): Line[] {
  const mark = here.memory.decimalMark ?? '.';
  const values = {
    vessel: vesselName(vessel.vessel),
    needed: concentrationText(needed.needed_mg_L, mark),
    unit: here.memory.concentrationUnit === 'ppm' ? 'ppm' : 'mg/L',
    count: String(freePoints(vessel).length),
    number: freePoints(vessel).length === 1 ? 'one' : 'many',
    fewest: String(POINTS_FEWEST),
    container: containerOf(vessel),
  };
  if (found.by === 'none') return [line('first', 'forecast-none', { ...values, why: found.why })];
  const isNow = found.from <= here.message.at + DAY_ms;
  const dates = {
    day: dayOrFar(found.below_at, here),
    by: found.by,
    from: isNow ? 'now' : dayOrFar(found.from, here),
    to: dayOrFar(found.to, here),
  };
  const lost =
    found.by === 'readings' ? numberText(Math.max(0, 100 * found.lost_in_30_days), 0, mark) : 'none';
  return [
    line('first', found.below_at === undefined ? 'forecast-steady' : 'forecast-below', {
      ...values,
      ...dates,
    }),
    line('effect', found.by === 'readings' ? 'forecast-by-readings' : 'forecast-by-rates', {
      ...values,
      lost,
    }),
    line('effect', 'forecast-measure', dates),
  ];
}

function needLine({ needed_mg_L, ph, ph_at, molecular_mg_L }: Needed, here: Here): Line {
  const mark = here.memory.decimalMark ?? '.';
  return line('assumed', 'forecast-need', {
    needed: concentrationText(needed_mg_L, mark),
    ph: numberText(ph, 2, mark),
    day: dayText(ph_at, tellingOf(here)),
    molecular: molecularText(molecular_mg_L, mark),
  });
}

function dataOf(found: Forecast, needed_mg_L: number, here: Here): ForecastData {
  const day = (at: number | undefined): string | null =>
    at === undefined || at > MOST_at ? null : isoWithZone(at, zoneOf(here.settings)).slice(0, 10);
  if (found.by === 'none') return { by: 'none', needed_mg_L, below_on: null, interval: [null, null] };
  return {
    by: found.by,
    needed_mg_L,
    below_on: day(found.below_at),
    interval: [day(found.from), day(found.to)],
  };
}

/** The end of the calendar that is told, in milliseconds since 1970 (year 2200; own choice). */
const MOST_at = Date.UTC(2200, 0, 1);
