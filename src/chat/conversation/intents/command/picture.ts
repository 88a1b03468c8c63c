import { traitsOf } from '../../../../core/cellar/traits-of.ts';
import type { Vessel } from '../../../../core/cellar/vessel.ts';
import { limitsFor } from '../../../../core/limits/limits-for.ts';
import type { Region } from '../../../../core/limits/region.ts';
import { vesselName } from '../../../replies/vessel-name.ts';
import type { Here } from '../../here.ts';
import { line } from '../../lines/line.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { zoneOf } from '../../zone.ts';

/** The limit of total SO2 that a wine is held against, in mg/L; only one whose text was read is drawn as a line. */
function limitOfTotal(vessel: Vessel, region: Region): number | undefined {
  const { total } = limitsFor({ ...traitsOf(vessel), region });
  return total?.confidence === 'read' ? total.limit_mg_L : undefined;
}

/** A picture of a vessel's SO2: it is made at the edge. */
export function drawPicture(vessel: string | undefined, here: Here): Handled {
  const kept = vessel === undefined ? undefined : here.vessels.get(vessel);
  if (vessel === undefined || kept === undefined) {
    const values = { vessel: vessel === undefined ? 'none' : vesselName(vessel) };
    return replying(here, { lines: [line('first', 'picture-none', values)] });
  }
  const { settings, memory } = here;
  const limit_mg_L = limitOfTotal(kept, settings.region);
  return {
    ...replying(here, { lines: [] }),
    replies: [],
    errand: {
      kind: 'picture',
      vessel,
      targets: settings.targets,
      basis: settings.basis,
      ...(limit_mg_L !== undefined && { limit_mg_L }),
      unit: memory.concentrationUnit === 'ppm' ? 'ppm' : 'mg/L',
      zone: zoneOf(settings),
      language: settings.language,
      decimalMark: memory.decimalMark ?? '.',
    },
  };
}
