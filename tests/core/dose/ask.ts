import type { AdditiveAtHand } from '../../../src/core/additives/additive-id.ts';
import type { DoseAnswer, EffectAnswer, Warning, WarningCode } from '../../../src/core/dose/answer.ts';
import { dose } from '../../../src/core/dose/dose.ts';
import { effect } from '../../../src/core/dose/effect.ts';
import type { DoseRequest, EffectRequest } from '../../../src/core/dose/request.ts';

/** The usual powder. */
export const POWDER: AdditiveAtHand = { id: 'potassium-metabisulfite' };

/** A finished wine whose stage and target nobody stated; 0.8 mg/L molecular. */
export const ASSUMED = {
  target: { molecular_mg_L: 0.8 },
  targetStated: false,
  stage: 'finished',
  stageStated: false,
  basis: 'pk-1.81',
} as const satisfies DoseRequest;

/** An invented tank: 1450 US gallons, pH 3.58, 21 mg/L free. */
export const TANK = {
  ...ASSUMED,
  volume_L: 5488.8470868,
  ph: 3.58,
  free_mg_L: 21,
  additive: POWDER,
} as const satisfies DoseRequest;

export const doseOf = (request: Partial<DoseRequest>): DoseAnswer => dose({ ...TANK, ...request });

export const effectOf = (request: Partial<EffectRequest>): EffectAnswer =>
  effect({
    additive: POWDER,
    stage: 'finished',
    stageStated: false,
    toStopFermentation: false,
    basis: 'pk-1.81',
    ...request,
  });

export const codesOf = ({ warnings }: { warnings: readonly Warning[] }): readonly WarningCode[] =>
  warnings.map(({ code }) => code);

export const valuesOf = (
  { warnings }: { warnings: readonly Warning[] },
  code: WarningCode,
): Warning['values'] | undefined => warnings.find((warning) => warning.code === code)?.values;
