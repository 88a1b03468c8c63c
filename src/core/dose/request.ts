import type { AdditiveAtHand } from '../additives/additive-id.ts';
import type { VolumeShown } from '../units/shown.ts';
import type { LimitFacts } from '../limits/limit-facts.ts';
import type { Basis, Category, Product, Stage, Style, Target } from '../wine.ts';

/** What only the law asks about the wine, and the room below its limit that is kept. */
export interface LawFacts extends Pick<
  LimitFacts,
  'region' | 'organic' | 'designated_mg_L' | 'uplift' | 'quality' | 'density_kg_L' | 'pdo' | 'bulk'
> {
  /** What is kept below the limit for an addition that is still to come, at bottling. */
  readonly reserve_mg_L?: number;
  /** Where the total is from: a reading, or a reading and what went in since. */
  readonly total_from?: 'measured' | 'running-sum';
}
import type { Fruit } from './fruit.ts';
import type { OxygenAtBottling } from './oxygen-loss.ts';
import type { SolutionUse } from './solution-recipes.ts';

/** What is known of the wine. Units stand in the names; every one may be unknown. */
export interface WineFacts extends LawFacts {
  readonly ph?: number;
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
  readonly temperature_C?: number;
  readonly alcohol_percent?: number;
  readonly sugar_g_L?: number;
  readonly style?: Style;
  readonly category?: Category;
  readonly product?: Product;
}

/** A question for a dose. */
export interface DoseRequest extends WineFacts, OxygenAtBottling {
  readonly volume_L?: number;
  /** The same volume as the person wrote it, so that the working shows it so; must be equal to `volume_L`. */
  readonly volume_display?: VolumeShown;
  /** The fruit of which `volume_L` is the must, where that was told by weight. */
  readonly fruit?: Fruit;
  /** How many equal vessels or barrels `volume_L` is the sum of, where a reading names several. */
  readonly vessels?: number;
  /** The additive; absent when its name, strength or size is still asked, so that no amount is given. */
  readonly additive?: AdditiveAtHand;
  /** What is aimed at; absent when it has to be asked. */
  readonly target?: Target;
  /** Whether the person stated the target. An assumed one that needs much free SO2 becomes a choice. */
  readonly targetStated: boolean;
  readonly stage: Stage;
  readonly stageStated: boolean;
  /** Share added to the dose: 30 for × 1.30. */
  readonly binding_allowance_percent?: number;
  /** Share of the addition that is lost: 1/3 for ÷ (1 − 1/3). */
  readonly binding_share?: number;
  readonly basis: Basis;
  /** What is aimed at in a red, mg/L molecular, where the cellar has its own; it is told where no colour is. */
  readonly red_target_mg_L?: number;
}

/** How much additive went or would go in; exactly one of the amounts is present. */
export interface StatedAmount {
  readonly mass_g?: number;
  readonly additive_volume_mL?: number;
  /** A number of small plain tablets, each of `additive.tablet_salt_g`. */
  readonly tablets?: number;
  /** Milligrams of the additive itself per litre of wine. */
  readonly rate_mg_L?: number;
  /** mg/L of SO2, in an `added`. */
  readonly added_mg_L?: number;
}

/** A question for what an amount does. */
export interface EffectRequest extends WineFacts, StatedAmount {
  readonly volume_L?: number;
  readonly volume_display?: VolumeShown;
  readonly additive?: AdditiveAtHand;
  readonly stage: Stage;
  readonly stageStated: boolean;
  /** Whether the person wants it to stop a fermentation: it does not. */
  readonly toStopFermentation: boolean;
  readonly basis: Basis;
}

/** An addition that was made, and what is known of the wine before it. */
export interface AddedRequest extends StatedAmount, WineFacts {
  readonly stage?: Stage;
  readonly volume_L?: number;
  readonly volume_display?: VolumeShown;
  readonly additive?: AdditiveAtHand;
}

/** A stock in water: its volume, and either its strength or what goes in (grams of salt, mL of a stronger solution). */
export interface SolutionRequest {
  readonly volume_L: number;
  readonly volume_display?: VolumeShown;
  readonly additive: AdditiveAtHand;
  readonly mass_g?: number;
  readonly additive_volume_mL?: number;
  /** What it is for, where it is no stock; with neither strength nor amount the usual recipe is told. */
  readonly use?: SolutionUse;
  /** Of the water. */
  readonly temperature_C?: number;
  /** mg/L of SO2 for which the millilitres per barrel are told. */
  readonly rise_mg_L?: number;
}
