import { vesselName } from '../../../replies/vessel-name.ts';
import type { Here } from '../../here.ts';
import { line } from '../../lines/line.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { zoneOf } from '../../zone.ts';

/** A picture of a vessel's free SO2: it is made at the edge. */
export function drawPicture(vessel: string | undefined, here: Here): Handled {
  if (vessel === undefined || !here.vessels.has(vessel)) {
    const values = { vessel: vessel === undefined ? 'none' : vesselName(vessel) };
    return replying(here, { lines: [line('first', 'picture-none', values)] });
  }
  const { settings, memory } = here;
  return {
    ...replying(here, { lines: [] }),
    replies: [],
    errand: {
      kind: 'picture',
      vessel,
      targets: settings.targets,
      basis: settings.basis,
      unit: memory.concentrationUnit === 'ppm' ? 'ppm' : 'mg/L',
      zone: zoneOf(settings),
      language: settings.language,
      decimalMark: memory.decimalMark ?? '.',
    },
  };
}
