import type { AdditiveId } from '../additives/additive-id.ts';
import type { Limit } from '../limits/limit.ts';
import type { Basis, Target } from '../wine.ts';
import type { Step } from '../working.ts';
import type { AfterMust } from './after-must.ts';
import type { SolutionUse } from './solution-recipes.ts';

/** What a scale or a cylinder shows. */
export interface Measure {
  readonly value: number;
  readonly unit: 'g' | 'kg' | 'mL' | 'L' | 'tablets';
}

/** How much goes in, in full precision: SO2 in grams, and the additive as one of the three. */
export interface Amount {
  readonly SO2_g: number;
  readonly mass_g?: number;
  readonly additive_volume_mL?: number;
  readonly tablets?: number;
}

/**
 * An amount, what an instrument shows of it, and what that rounding changes in the wine
 * (mg/L SO2; above 0 where the instrument shows more than the amount).
 */
export interface MeasuredAmount extends Amount {
  readonly measure: Measure;
  readonly rounding_mg_L: number;
}

/** The warning codes of the `ask` contract. New ones may be added; these names stay. */
export type WarningCode =
  | 'no-addition-needed'
  | 'ph-unusual'
  | 'stage-assumed'
  | 'style-unknown'
  | 'free-low-may-bind-all'
  | 'free-needed-high'
  | 'molecular-above-2'
  | 'addition-large'
  | 'total-over-limit'
  | 'total-near-limit'
  | 'free-over-limit'
  | 'label-threshold'
  | 'total-unknown'
  | 'no-limit-on-file'
  | 'limit-unconfirmed'
  | 'additive-not-permitted'
  | 'stage-not-over'
  | 'gas-too-little'
  | 'addition-negligible'
  | 'basis-fallback'
  | 'allowance-covers-less'
  | 'gas-needs-training'
  | 'rounding-coarse'
  | 'no-dose-at-this-stage'
  | 'does-not-stop-fermentation'
  | 'already-dosed'
  | 'must-may-hinder-malolactic'
  | 'malolactic-may-not-start'
  | 'restart-may-fail';

/** A warning with the figures it is about, by their JSON names, in full precision. */
export interface Warning {
  readonly code: WarningCode;
  readonly values: Readonly<Record<string, number | string>>;
}

/** The share of one of several equal vessels. `measure` is absent below half a tablet: then `stock` is the way. */
export interface PerVessel extends Amount {
  readonly count: number;
  readonly measure?: Measure;
  readonly rounding_mg_L?: number;
  readonly measure_gives_mg_L?: number;
  readonly stock?: AsStock;
}

/**
 * One way out where the first line of the reply is a choice and not a dose. An option that would pass the limit on
 * file carries no amount and says `over_limit`.
 */
export interface DoseChoice extends Partial<MeasuredAmount> {
  /** Absent for "leave it as it is". */
  readonly target?: Target;
  readonly molecular_mg_L: number;
  readonly free_mg_L: number;
  readonly add_mg_L: number;
  readonly dose_mg_L: number;
  readonly measure_gives_mg_L?: number;
  readonly stock?: AsStock;
  readonly per_vessel?: PerVessel;
  readonly over_limit?: true;
}

/** A small amount once more, or the rest of a dose in tablets, as millilitres of a stock solution of the salt. */
export interface AsStock {
  readonly additive: AdditiveId;
  /** Grams of the powder in 100 mL. */
  readonly strength_percent: number;
  readonly additive_volume_mL: number;
  readonly measure: Measure;
}

/** The dose that keeps under the limit, where the full one does not; 0 and no amount where nothing may go in. */
export interface CappedDose extends Partial<MeasuredAmount> {
  readonly dose_mg_L: number;
  /** The limit that it keeps under, by its rule. */
  readonly rule: string;
  /** mg/L below the limit that are kept: for the method, and for what is planned at bottling. */
  readonly kept_mg_L: number;
  readonly per_vessel?: PerVessel;
  readonly stock?: AsStock;
  readonly measure_gives_mg_L?: number;
  readonly free_after_mg_L?: number;
  readonly free_expected_mg_L?: readonly [number, number];
  readonly molecular_after_mg_L?: number;
  readonly total_after_mg_L?: number;
  readonly steps: readonly Step[];
}

/** What oxygen at bottling takes, mg/L; `loss_mg_L` as measured in the trade and by the formula. */
export interface BottlingAnswer {
  readonly oxygen_mg_L: number;
  readonly loss_mg_L: readonly [number, number];
  /** What the dose has counted of it. */
  readonly counted_mg_L: number;
  /** Free SO2 that is aimed at after the loss; absent without a target. */
  readonly free_at_bottling_mg_L?: number;
}

/** The answer of a `dose`; a key is absent when it cannot be known from what was said. */
export interface DoseAnswer extends Partial<MeasuredAmount> {
  readonly molecular_mg_L?: number;
  readonly target_free_mg_L?: number;
  readonly target_molecular_mg_L?: number;
  readonly add_mg_L?: number;
  readonly dose_mg_L?: number;
  readonly per_vessel?: PerVessel;
  /** Under 5 g of powder, or the rest of a dose in tablets: the same as a 10 % stock. */
  readonly stock?: AsStock;
  /** mg/L of SO2 that `measure` gives where the rounding is worth a word (tablets). */
  readonly measure_gives_mg_L?: number;
  readonly free_after_mg_L?: number;
  readonly free_expected_mg_L?: readonly [number, number];
  readonly molecular_after_mg_L?: number;
  readonly total_after_mg_L?: number;
  readonly pK?: number;
  readonly basis?: Basis;
  /** The limit that decides: of total SO2, or of free where that one is passed and the total's is not. */
  readonly limit?: Limit;
  /** All limits that hold for the wine. */
  readonly limits?: readonly Limit[];
  /** Present where the dose passes a limit that was read. */
  readonly capped?: CappedDose;
  /** At bottling: what the stated oxygen takes, and what stands after it. */
  readonly bottling?: BottlingAnswer;
  /** Of must: what follows from the addition. */
  readonly after_must?: AfterMust;
  readonly warnings: readonly Warning[];
  readonly choices?: readonly DoseChoice[];
  readonly steps: readonly Step[];
}

/** The answer of an `effect`: what an amount, or a rate of additive, does to the wine. */
export interface EffectAnswer {
  readonly SO2_g?: number;
  readonly adds_mg_L?: number;
  readonly mass_g?: number;
  readonly free_after_mg_L?: number;
  readonly free_expected_mg_L?: readonly [number, number];
  readonly molecular_after_mg_L?: number;
  readonly total_after_mg_L?: number;
  readonly pK?: number;
  readonly basis?: Basis;
  readonly limit?: Limit;
  readonly limits?: readonly Limit[];
  readonly warnings: readonly Warning[];
  readonly steps: readonly Step[];
}

/** The answer of an `added`: what follows from the entry, as far as it does. */
export interface AddedAnswer extends Partial<Amount> {
  readonly added_mg_L?: number;
  /** Only where the total before it is known. */
  readonly total_after_mg_L?: number;
  readonly limit?: Limit;
  readonly warnings: readonly Warning[];
  readonly steps: readonly Step[];
}

/** What a stock brings into one usual barrel. */
export interface StockPerBarrel {
  readonly barrel_L: number;
  /** mg/L that one millilitre brings. */
  readonly one_mL_adds_mg_L: number;
  readonly rise_mg_L: number;
  /** Millilitres for that rise. */
  readonly additive_volume_mL: number;
  readonly steps: readonly Step[];
}

/** What is published about how much of a salt dissolves, beside what was asked; g in a litre, °C. */
export interface SolubilityNote {
  /** `too-much`: no figures are given; `unknown-when-colder`: they are. */
  readonly says: 'too-much' | 'unknown-when-colder';
  readonly salt_g_per_L: number;
  readonly least_g_per_L: number;
  readonly most_g_per_L: number;
  readonly at_C: number;
  readonly temperature_C?: number;
}

/** The answer of a `solution`: a stock of salt in water, a holding solution or a rinse. Never a dose for wine. */
export interface SolutionAnswer {
  readonly use?: SolutionUse;
  readonly salt_g?: number;
  readonly citric_acid_g?: number;
  readonly additive_volume_mL?: number;
  readonly volume_L: number;
  /** Absent where it does not follow (a solution by its mass). */
  readonly strength_SO2_g_per_100_mL?: number;
  readonly measure?: Measure;
  readonly per_barrel?: StockPerBarrel;
  /** How long its strength may be trusted; common practice, no source. */
  readonly keeps?: 'days-to-weeks';
  /** Present where the salt does not surely dissolve, or where the water is colder than any published figure. */
  readonly solubility?: SolubilityNote;
  readonly steps: readonly Step[];
}
