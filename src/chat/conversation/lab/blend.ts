import { blend, type BlendPart } from '../../../core/blend/blend.ts';
import { shareWithin, type BlendBounds } from '../../../core/blend/share-within.ts';
import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import { holdsWine } from '../../../core/cellar/pour.ts';
import type { Vessel } from '../../../core/cellar/vessel.ts';
import { pKOf } from '../../../core/chemistry/dissociation.ts';
import { MOLECULAR_SMELT_mg_L } from '../../../core/dose/thresholds.ts';
import { traitsOf } from '../../../core/cellar/traits-of.ts';
import { limitsFor } from '../../../core/limits/limits-for.ts';
import { neededOf } from '../../attachments/chart/needed-of.ts';
import type { Command } from '../../reader/command.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import type { Here } from '../here.ts';
import { blendLines, candidateLine } from '../lines/blend.ts';
import { line } from '../lines/line.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { totalOfVessel } from '../total-of-vessel.ts';
import type { BlendData } from './lab-answer.ts';
import { lacking, unlanded } from './lacking.ts';
import type { Tried } from './tried.ts';

/** So many other vessels are told of, those that it takes the least of first. */
const CANDIDATES = 5;

/** `blend T4 T7`, `blend T4`: which share of the second, or of which other vessel, brings the first within bounds. */
export async function tellBlend(
  { vessel: name, other: named }: Extract<Command, { name: 'blend' }>,
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const wine = here.vessels.get(name);
  if (wine === undefined) return lacking('vessel', name, here);
  if (wine.free_mg_L === undefined) return lacking('free', name, here);
  if (wine.unlanded.length > 0) return unlanded(name, here);
  if (named === undefined) return tellCandidates(wine, here, view);
  const other = here.vessels.get(named);
  if (other === undefined || other.vessel === wine.vessel) return lacking('vessel', named, here);
  if (other.free_mg_L === undefined) return lacking('free', named, here);
  if (other.unlanded.length > 0) return unlanded(named, here);
  const tried = tryBlend(wine, other, here);
  const said = replying(here, { lines: blendLines(tried, wholeOf(tried), here) });
  return { ...said, answers: [{ blend: [dataOf(tried)], steps: wholeOf(tried)?.steps ?? [] }] };
}

async function tellCandidates(wine: Vessel, here: Here, view: CellarView): Promise<Handled> {
  const all = await view.vessels();
  const tried = all.filter((one) => mayJoin(wine, one)).map((other) => tryBlend(wine, other, here));
  const fitting = tried
    .filter(({ found }) => found.fails === undefined)
    .toSorted((a, b) => (a.found.least ?? 1) - (b.found.least ?? 1));
  const lines: Line[] = [
    fitting.length === 0
      ? line('first', 'blend-nobody', {
          vessel: vesselName(wine.vessel),
          count: String(tried.length),
          any: tried.length === 0 ? 'none' : 'some',
        })
      : line('first', 'blend-candidates', { vessel: vesselName(wine.vessel) }),
    ...fitting.slice(0, CANDIDATES).map((one) => candidateLine(one, here)),
    ...(fitting.length === 0 ? [] : [line('effect', 'blend-care')]),
  ];
  const answers = [{ blend: fitting.slice(0, CANDIDATES).map(dataOf), steps: [] }];
  return { ...replying(here, { lines }), answers };
}

/** A wine of another colour, one that still ferments, or one with an addition that has not landed is not proposed. */
function mayJoin(wine: Vessel, { vessel, traits, unlanded: open, ...other }: Vessel): boolean {
  const [style, stage] = [traits.style?.value, traits.stage?.value ?? 'finished'];
  const isOtherColour =
    style !== undefined && wine.traits.style !== undefined && style !== wine.traits.style.value;
  return (
    vessel !== wine.vessel &&
    holdsWine({ ...other, vessel, traits, unlanded: open }) &&
    other.free_mg_L !== undefined &&
    open.length === 0 &&
    stage === 'finished' &&
    !isOtherColour
  );
}

function tryBlend(wine: Vessel, other: Vessel, here: Here): Tried {
  const bounds = boundsOf(wine, other, here);
  const { pK } = pKOf('pk-1.81');
  return { wine, other, bounds, found: shareWithin([measuredOf(wine), measuredOf(other)], bounds, pK) };
}

/** What is measured of a wine; the total with what went in since. */
function measuredOf(vessel: Vessel): Omit<BlendPart, 'volume_L'> {
  const total = totalOfVessel(vessel);
  return {
    ...(vessel.free_mg_L && { free_mg_L: vessel.free_mg_L.value }),
    ...(total && { total_mg_L: total.total_mg_L }),
    ...(vessel.ph && { ph: vessel.ph.value }),
  };
}

/** The stricter limit of both wines, what the first one's target asks for, and what people smell. */
function boundsOf(wine: Vessel, other: Vessel, here: Here): BlendBounds {
  const limits = [wine, other].map((one) => {
    // Must has no limit of its own, but what it is blended into has.
    const { stage: _stage, ...traits } = traitsOf(one);
    return limitsFor({ ...traits, region: here.settings.region });
  });
  const strictest = (of: 'total' | 'free'): number =>
    Math.min(...limits.map((one) => one[of]?.limit_mg_L ?? Infinity));
  const [total, free] = [strictest('total'), strictest('free')];
  const needed = neededOf(wine, here.message.at, here.settings);
  const isMeasured = wine.ph !== undefined;
  return {
    ...(total < Infinity && totalOfVessel(wine) && { total_most_mg_L: total }),
    ...(free < Infinity && { free_most_mg_L: free }),
    ...(isMeasured && { molecular_most_mg_L: MOLECULAR_SMELT_mg_L }),
    ...(isMeasured && 'molecular_mg_L' in needed && { molecular_least_mg_L: needed.molecular_mg_L }),
  };
}

/** All of both wines together, where their volumes are known. */
function wholeOf({ wine, other }: Tried): ReturnType<typeof blend> | undefined {
  if (wine.volume_L === undefined || other.volume_L === undefined) return undefined;
  const [one, two] = [wine.volume_L.value, other.volume_L.value];
  return blend(
    { volume_L: one, ...measuredOf(wine) },
    { volume_L: two, ...measuredOf(other) },
    pKOf('pk-1.81').pK,
  );
}

function dataOf(tried: Tried): BlendData {
  const { found, other } = tried;
  const whole = wholeOf(tried);
  return {
    with: other.vessel,
    shares: found.fails === undefined ? [found.least, found.most] : null,
    ...(whole?.free_mg_L !== undefined && { free_mg_L: whole.free_mg_L }),
    ...(whole?.total_mg_L !== undefined && { total_mg_L: whole.total_mg_L }),
  };
}
