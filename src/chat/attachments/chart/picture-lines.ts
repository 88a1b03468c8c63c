import { dayText } from '../../replies/moment-text.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText, molecularText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import { vesselName, vesselNames } from '../../replies/vessel-name.ts';
import type { ChartData } from './chart-data.ts';
import type { ChartManner } from './chart-manner.ts';
import { boundOf, isOdd, lastKnown } from './last-known.ts';
import type { LastFigure } from './last-known.ts';

/** So many additions are told one by one, the newest of them; a caption is short. */
const ADDITIONS = 6;
/** So many days on which free SO2 was above total are named. */
const ODD_DAYS = 3;

/**
 * What a picture of a vessel shows, as lines of a reply: the last free and total SO2, what the wine needs, the limit,
 * the additions. Where nothing was measured (`data` undefined), that there is no picture.
 */
export function pictureLines(
  data: ChartData | undefined,
  { vessel, manner }: { readonly vessel: string; readonly manner: ChartManner },
): Line[] {
  if (data === undefined) return [line('picture-nothing', { vessel: vesselName(vessel) })];
  return [
    headLine(data, manner),
    lastLine(data, manner),
    ...neededLines(data, manner),
    ...limitLines(data, manner),
    ...additionLines(data, manner),
    ...changeLines(data, manner),
    ...oddLines(data, manner),
  ];
}

function line(key: SentenceKey, values: Line['values'], list?: Line['list']): Line {
  return { room: 'first', key, values, ...(list && { list }) };
}

function headLine({ vessel, readings, additions, needed }: ChartData, { telling }: ChartManner): Line {
  const since = Math.min(...[readings, additions, needed].flatMap(([first]) => (first ? [first.at] : [])));
  return line('picture-head', {
    vessel: vesselName(vessel),
    day: dayText(since, telling),
    readings: String(readings.length),
    additions: String(additions.length),
  });
}

/** The last free, the last total, and what was bound in the sample that showed the total; each with its day. */
function lastLine(data: ChartData, { telling, mark, unit }: ChartManner): Line {
  const dated = (key: SentenceKey, last: LastFigure | undefined): Omit<Line, 'room'>[] => {
    if (last === undefined) return [];
    const values = { value: numberText(last.value_mg_L, 2, mark), unit, day: dayText(last.at, telling) };
    return [{ key, values }];
  };
  return line('picture-last', {}, [
    ...dated('picture-last-free', lastKnown(data, 'free_mg_L')),
    ...dated('picture-last-total', lastKnown(data, 'total_mg_L')),
    ...dated('picture-last-bound', lastBound(data)),
  ]);
}

function lastBound({ readings }: ChartData): LastFigure | undefined {
  const sample = readings.findLast(({ total_mg_L }) => total_mg_L !== undefined);
  const value_mg_L = sample && boundOf(sample);
  return sample && value_mg_L !== undefined ? { at: sample.at, value_mg_L } : undefined;
}

function neededLines({ needed }: ChartData, { telling, mark, unit }: ChartManner): Line[] {
  const last = needed.at(-1);
  if (last === undefined) return [];
  if ('nothing' in last) return [line('picture-needs-nothing', { why: last.nothing })];
  return [
    line('picture-needs', {
      ph: numberText(last.ph, 2, mark),
      day: dayText(last.ph_at, telling),
      molecular: molecularText(last.molecular_mg_L, mark),
      needed: `${concentrationText(last.needed_mg_L, mark)} ${unit}`,
    }),
  ];
}

function limitLines({ limit_mg_L }: ChartData, { mark, unit }: ChartManner): Line[] {
  if (limit_mg_L === undefined) return [];
  return [line('picture-limit-of-total', { limit: `${numberText(limit_mg_L, 2, mark)} ${unit}` })];
}

/** The newest additions, the oldest of them first; how many went in before; whether they were measured since. */
function additionLines(data: ChartData, { telling, mark, unit }: ChartManner): Line[] {
  const { additions } = data;
  const last = additions.at(-1);
  if (last === undefined) return [];
  const list = additions.slice(-ADDITIONS).map(({ at, added_mg_L }) => ({
    key: 'picture-addition' satisfies SentenceKey,
    values: {
      day: dayText(at, telling),
      added: added_mg_L === undefined ? 'none' : concentrationText(added_mg_L, mark),
    },
  }));
  const earlier = additions.length - list.length;
  const measured_at = lastKnown(data, 'free_mg_L')?.at ?? -Infinity;
  return [
    line('picture-additions', { unit, earlier: earlier === 0 ? 'none' : String(earlier) }, list),
    ...(last.at > measured_at ? [line('picture-unmeasured', { day: dayText(last.at, telling) })] : []),
  ];
}

/** What happened to the wine that a picture of it must not hide. */
function changeLines({ came_from, blended, empty }: ChartData, { telling }: ChartManner): Line[] {
  const [last_blended] = blended.slice(-1);
  return [
    ...(came_from
      ? [
          line('picture-came-from', {
            vessels: vesselNames(came_from.vessels),
            day: dayText(came_from.at, telling),
          }),
        ]
      : []),
    ...(last_blended === undefined
      ? []
      : [line('picture-was-blended', { day: dayText(last_blended, telling) })]),
    ...(empty === undefined ? [] : [line('picture-empty', { day: dayText(empty, telling) })]),
  ];
}

function oddLines({ readings }: ChartData, { telling }: ChartManner): Line[] {
  const odd = readings.filter(isOdd);
  if (odd.length === 0) return [];
  const days = odd.slice(-ODD_DAYS).map(({ at }) => dayText(at, telling));
  return [line('picture-is-odd', { days: `${odd.length > ODD_DAYS ? '… ' : ''}${days.join(', ')}` })];
}
