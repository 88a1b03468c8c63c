import { containerOf } from '../../../core/cellar/forecast-of.ts';
import { pKOf } from '../../../core/chemistry/dissociation.ts';
import { molecularSO2 } from '../../../core/chemistry/molecular-so2.ts';
import { PUBLISHED_RATES } from '../../../core/forecast/published-rates.ts';
import { SATURATED_WINE, SO2_PER_OXYGEN } from '../../../core/laboratory/oxygen.ts';
import { peroxideLawOf } from '../../../core/laboratory/peroxide-law.ts';
import { numberText } from '../../replies/number-text.ts';
import { molecularText } from '../../replies/quantity-text.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import type { Here } from '../here.ts';
import { line } from '../lines/line.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { totalOfVessel } from '../total-of-vessel.ts';
import { lacking } from './lacking.ts';

/** `too much SO2 in T4`: what helps and what does not, with the losses on file. Never an amount of peroxide. */
export function tellTooMuch(name: string | undefined, here: Here): Handled {
  const vessel = name === undefined ? undefined : here.vessels.get(name);
  if (vessel === undefined) return lacking('vessel', name, here);
  const mark = here.memory.decimalMark ?? '.';
  const { region } = here.settings;
  const free = vessel.free_mg_L?.value;
  const total = totalOfVessel(vessel)?.total_mg_L;
  const { pK } = pKOf('pk-1.81');
  const barrel = PUBLISHED_RATES.find((one) => one.in === 'barrel');
  const rates = barrel?.in === 'barrel' ? barrel : undefined;
  const law = peroxideLawOf(region);
  return replying(here, {
    lines: [
      line('first', 'too-much-head', {
        vessel: vesselName(vessel.vessel),
        free: free === undefined ? 'none' : numberText(free, 1, mark),
        total: total === undefined ? 'none' : numberText(total, 0, mark),
        molecular:
          free === undefined || vessel.ph === undefined
            ? 'none'
            : molecularText(molecularSO2(free, vessel.ph.value, pK), mark),
      }),
      line('effect', 'too-much-wait', {
        container: containerOf(vessel),
        least: numberText(rates?.least_mg_L ?? 0, 0, mark),
        most: numberText(rates?.most_mg_L ?? 0, 0, mark),
      }),
      line('effect', 'too-much-air', {
        each: numberText(SO2_PER_OXYGEN, 0, mark),
        low: numberText(SATURATED_WINE.SO2_mg_L[0], 0, mark),
        high: numberText(SATURATED_WINE.SO2_mg_L[1], 0, mark),
      }),
      line('effect', 'too-much-blend', { vessel: vesselName(vessel.vessel) }),
      line('effect', 'too-much-peroxide', {
        says: law?.says ?? 'none',
        left: law?.left_most_mg_L === undefined ? 'none' : numberText(law.left_most_mg_L, 0, mark),
      }),
    ],
  });
}
