import type { Warning, WarningCode } from './answer.ts';

/**
 * The warnings, weightiest first: danger to people, then the law, then the wine, then what was assumed.
 *
 * @example
 * ```ts
 * WARNING_ORDER[0] // => 'does-not-stop-fermentation'
 * ```
 */
export const WARNING_ORDER: readonly WarningCode[] = [
  'does-not-stop-fermentation',
  'gas-needs-training',
  'already-dosed',
  'no-dose-at-this-stage',
  'stage-not-over',
  'additive-not-permitted',
  'total-over-limit',
  'free-over-limit',
  'gas-too-little',
  'addition-large',
  'malolactic-may-not-start',
  'restart-may-fail',
  'must-may-hinder-malolactic',
  'free-needed-high',
  'molecular-above-2',
  'free-low-may-bind-all',
  'total-near-limit',
  'ph-unusual',
  'basis-fallback',
  'rounding-coarse',
  'allowance-covers-less',
  'style-unknown',
  'stage-assumed',
  'no-addition-needed',
  'addition-negligible',
  'limit-unconfirmed',
  'label-threshold',
  'no-limit-on-file',
  'total-unknown',
];

/**
 * Warnings in their order.
 *
 * @example
 * ```ts
 * inOrder([{ code: 'total-unknown', values: {} }, { code: 'ph-unusual', values: { ph: 4.3 } }])[0]?.code // => 'ph-unusual'
 * ```
 */
export function inOrder(warnings: readonly Warning[]): readonly Warning[] {
  return warnings.toSorted((a, b) => WARNING_ORDER.indexOf(a.code) - WARNING_ORDER.indexOf(b.code));
}
