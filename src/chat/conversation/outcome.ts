import type { AdditiveId } from '../../core/additives/additive-id.ts';
import type { AskedField, Reading } from '../reader/understood.ts';
import type { Button, Line } from '../replies/reply.ts';
import type { Write } from '../../core/cellar/cellar-store.ts';
import type { InDoubt } from './doubt.ts';
import type { Here } from './here.ts';
import type { Manner } from './manner.ts';
import type { Note } from './note.ts';
import type { Answer } from './ports.ts';
import type { Settings } from './settings.ts';

/** What an intent has to know of the moment, beside the reading itself. */
export interface Turn {
  readonly settings: Settings;
  readonly manner: Manner;
  /** The number under which the reading is remembered: its buttons carry it. */
  readonly ref: string;
  /** Where and when it was said, and what is known of the vessels. */
  readonly here: Here;
  /** Additives whose cautions this person has had in full today. */
  readonly cautioned: ReadonlySet<string>;
  /** Where the reading is a line of a round: what its own line says, and whether the additive stands above. */
  readonly round?: { readonly own: Reading; readonly isOneAdditive: boolean };
}

/** What an intent makes of a reading. */
export interface Outcome {
  readonly answer: Answer | null;
  readonly lines: readonly Line[];
  readonly buttons: readonly Button[];
  /** The field whose question stands in the reply and waits for its answer. */
  readonly waits?: AskedField;
  /** The one figure in doubt, whose correction is waited for. */
  readonly doubt?: InDoubt;
  /** Whether it asked for a target at a stage where nothing may wait. */
  readonly askedTarget?: true;
  /** The additive whose cautions the reply has in full. */
  readonly cautioned?: AdditiveId;
  /** It is the first reading after an addition: it shows where that landed. */
  readonly isLanding?: true;
  /** What the log notes of it. */
  readonly notes?: readonly Note[];
  /** What else is kept of it. */
  readonly keeps?: readonly Write[];
  /** What stands for the whole reply where the reading is one line of a round. */
  readonly inRound: readonly Line[];
}
