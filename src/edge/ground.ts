import type { CellarStore } from '../core/cellar/cellar-store.ts';
import type { Config } from './config.ts';
import type { Environment } from './environment.ts';
import type { Operator } from './operator.ts';

/** What every chat stands on. */
export interface Ground {
  readonly config: Config;
  readonly environment: Environment;
  readonly operator: Operator;
  readonly store: CellarStore;
  /** Aborted when the program is asked to stop. */
  readonly signal: AbortSignal;
}
