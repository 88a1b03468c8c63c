import { COMPARED_ALCOHOL_PERCENT, pKOf } from '../../../core/chemistry/dissociation.ts';
import { freeSO2Needed } from '../../../core/chemistry/free-so2-needed.ts';
import { molecularSO2 } from '../../../core/chemistry/molecular-so2.ts';
import type { Vessel } from '../../../core/cellar/vessel.ts';
import { neededOf } from '../../attachments/chart/needed-of.ts';
import { dayText } from '../../replies/moment-text.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText, molecularText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import type { Here } from '../here.ts';
import { line } from '../lines/line.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { tellingOf } from '../telling.ts';
import type { MolecularData } from './lab-answer.ts';
import { lacking } from './lacking.ts';

/** °C at which the table of the OIV begins. */
const COMPARED_C = 20;

/** `molecular T4`: the molecular SO2 of a vessel by both bases side by side, and what that means for its dose. */
export function tellMolecular(name: string | undefined, here: Here): Handled {
  const vessel = name === undefined ? undefined : here.vessels.get(name);
  if (vessel === undefined) return lacking('vessel', name, here);
  const needed = neededOf(vessel, here.message.at, here.settings);
  const ph = vessel.ph;
  if (ph === undefined) return lacking('ph', name, here);
  const target = 'molecular_mg_L' in needed ? needed.molecular_mg_L : here.settings.targets.white;
  const both = bases(vessel, ph.value, target);
  const mark = here.memory.decimalMark ?? '.';
  const unit = here.memory.concentrationUnit === 'ppm' ? 'ppm' : 'mg/L';
  const said = replying(here, {
    lines: [
      line('first', 'molecular-head', {
        vessel: vesselName(vessel.vessel),
        ph: numberText(ph.value, 2, mark),
        free: vessel.free_mg_L === undefined ? 'none' : numberText(vessel.free_mg_L.value, 1, mark),
        unit,
        day: dayText(vessel.free_mg_L?.at ?? ph.at, tellingOf(here)),
      }),
      ...both.map((one) => baseLine(one, target, vessel, here)),
      ...meaning(both, vessel, here),
    ],
  });
  return { ...said, answers: [{ molecular: both, steps: [] }] };
}

function bases(vessel: Vessel, ph: number, target_mg_L: number): MolecularData[] {
  const alcohol = vessel.traits.alcohol_percent?.value ?? COMPARED_ALCOHOL_PERCENT;
  const oiv = pKOf('oiv', alcohol, COMPARED_C);
  const pKs = [
    { basis: 'pk-1.81', pK: pKOf('pk-1.81').pK },
    { basis: 'oiv', pK: oiv.fallback?.compared_pK ?? oiv.pK },
  ];
  return pKs.map(({ basis, pK }) => ({
    basis,
    pK,
    ...(vessel.free_mg_L && { molecular_mg_L: molecularSO2(vessel.free_mg_L.value, ph, pK) }),
    target_free_mg_L: freeSO2Needed(target_mg_L, ph, pK),
  }));
}

function baseLine(one: MolecularData, target: number, { traits }: Vessel, here: Here): Line {
  const mark = here.memory.decimalMark ?? '.';
  return line('first', 'molecular-base', {
    basis: one.basis,
    pK: numberText(one.pK, 2, mark),
    alcohol: numberText(traits.alcohol_percent?.value ?? COMPARED_ALCOHOL_PERCENT, 1, mark),
    known: traits.alcohol_percent === undefined ? 'no' : 'yes',
    molecular: one.molecular_mg_L === undefined ? 'none' : molecularText(one.molecular_mg_L, mark),
    target: numberText(target, 2, mark),
    needed: concentrationText(one.target_free_mg_L, mark),
  });
}

/** How far the bases are apart for this wine, and which one its doses go by. */
function meaning([one, other]: readonly MolecularData[], vessel: Vessel, here: Here): Line[] {
  if (one === undefined || other === undefined) return [];
  const mark = here.memory.decimalMark ?? '.';
  const free = vessel.free_mg_L?.value ?? 0;
  const dose = ({ target_free_mg_L }: MolecularData): number => Math.max(0, target_free_mg_L - free);
  return [
    line('effect', 'molecular-meaning', {
      times: numberText(one.target_free_mg_L / other.target_free_mg_L, 2, mark),
      dose: concentrationText(dose(one), mark),
      other: concentrationText(dose(other), mark),
      unit: here.memory.concentrationUnit === 'ppm' ? 'ppm' : 'mg/L',
      basis: here.settings.basis,
    }),
  ];
}
