import type { Blend } from '../../../core/blend/blend.ts';
import { dayText } from '../../replies/moment-text.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import { volumeText } from '../../replies/volume-text.ts';
import type { Here } from '../here.ts';
import type { Tried } from '../lab/tried.ts';
import { tellingOf } from '../telling.ts';
import { line, listLine, part } from './line.ts';

/** What a blend of two wines comes to: the shares that keep to the bounds, all of both together, and what is measured first. */
export function blendLines(tried: Tried, whole: Blend | undefined, here: Here): Line[] {
  return [
    ...(tried.found.fails === undefined ? [shareLine(tried, here)] : [failLine(tried, here)]),
    ...boundLines(tried, here),
    ...wholeLines(whole, here),
    figureLine(tried, here),
    line('effect', 'blend-care'),
  ];
}

/** One other vessel, and which share of it does. */
export function candidateLine(tried: Tried, here: Here): Line {
  return line('first', 'blend-candidate', shareValues(tried, here));
}

function shareValues({ wine, other, found }: Tried, here: Here): Record<string, string> {
  const mark = here.memory.decimalMark ?? '.';
  const [least, most] = found.fails === undefined ? [found.least, found.most] : [0, 0];
  const percent = (share: number, up: boolean): string =>
    numberText(up ? Math.ceil(100 * share - 1e-9) : Math.floor(100 * share + 1e-9), 0, mark);
  const wine_L = wine.volume_L?.value;
  const least_L = wine_L === undefined || least >= 1 ? undefined : (wine_L * least) / (1 - least);
  return {
    vessel: vesselName(wine.vessel),
    other: vesselName(other.vessel),
    least: percent(least, true),
    most: percent(most, false),
    volume:
      least_L === undefined || least_L === 0 ? 'none' : volumeText(least_L, here.settings.volumeUnit, mark),
    held:
      other.volume_L === undefined
        ? 'none'
        : volumeText(other.volume_L.value, here.settings.volumeUnit, mark),
    enough:
      least_L === undefined || other.volume_L === undefined || least_L <= other.volume_L.value ? 'yes' : 'no',
  };
}

/** With none of the other wine it keeps to the bounds, or from a share on. */
const shareLine = (tried: Tried, here: Here): Line =>
  line('first', 'blend-share', {
    ...shareValues(tried, here),
    starts: tried.found.least === 0 ? 'as-it-is' : 'from',
  });

function failLine({ wine, other, found }: Tried, _here: Here): Line {
  return line('first', 'blend-fails', {
    vessel: vesselName(wine.vessel),
    other: vesselName(other.vessel),
    fails: found.fails ?? 'unmeasured',
  });
}

/** What was kept to. */
function boundLines({ bounds }: Tried, here: Here): Line[] {
  const mark = here.memory.decimalMark ?? '.';
  const {
    total_most_mg_L: total,
    free_most_mg_L: free,
    molecular_least_mg_L: least,
    molecular_most_mg_L: most,
  } = bounds;
  return listLine('assumed', 'blend-bounds', [
    ...(total === undefined
      ? [part('blend-bound-no-total')]
      : [part('blend-bound-total', { limit: concentrationText(total, mark) })]),
    ...(free === undefined ? [] : [part('blend-bound-free', { limit: concentrationText(free, mark) })]),
    ...(most === undefined
      ? [part('blend-bound-no-ph')]
      : [
          part('blend-bound-molecular', {
            least: least === undefined ? 'none' : numberText(least, 2, mark),
            most: numberText(most, 1, mark),
          }),
        ]),
  ]);
}

/** What is on file of both, and of which day. */
function figureLine({ wine, other }: Tried, here: Here): Line {
  const mark = here.memory.decimalMark ?? '.';
  const of = ({ vessel, free_mg_L }: Tried['wine']): Omit<Line, 'room'> =>
    part('blend-figure', {
      vessel: vesselName(vessel),
      free: numberText(free_mg_L?.value ?? 0, 1, mark),
      day: dayText(free_mg_L?.at ?? 0, tellingOf(here)),
    });
  return { ...line('assumed', 'blend-figures'), list: [of(wine), of(other)] };
}

function wholeLines(whole: Blend | undefined, here: Here): Line[] {
  if (whole === undefined) return [];
  const mark = here.memory.decimalMark ?? '.';
  const text = (mg_L: number | undefined): string =>
    mg_L === undefined ? 'none' : numberText(mg_L, 0, mark);
  return [
    line('effect', 'blend-whole', {
      volume: volumeText(whole.volume_L, here.settings.volumeUnit, mark),
      free: text(whole.free_mg_L),
      total: text(whole.total_mg_L),
    }),
  ];
}
