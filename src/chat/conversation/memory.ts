import type { AskedField, Fields, FieldName, Reading } from '../reader/understood.ts';
import type { Problem } from '../../core/problem.ts';

/** A figure that was in doubt: the problem stands until one of the fields that settle it is said. */
export interface Doubt {
  readonly problems: readonly Problem[];
  readonly settledBy: readonly FieldName[];
  /** Whether a bare number settles it; not where the doubt is which figure it is. */
  readonly byBareNumber: boolean;
}

/** A question the bot has asked and still waits for. */
export interface Waiting {
  readonly field: AskedField;
  readonly reading: Reading;
  /** What the reading is remembered under: the buttons of its choices carry it. */
  readonly ref: string;
  readonly askedAt: number;
  /** Choices of that field carry letters: `a` → the fields it stands for. */
  readonly letters: Readonly<Record<string, Fields>>;
  /** What is in doubt, where it is asked for because of a problem. */
  readonly doubt?: Doubt;
}

/** A reading that a button of an earlier reply refers to. */
export interface Remembered {
  /** Its name in the cellar: the number of the person, a point, and a number of its own. */
  readonly ref: string;
  /** The chat that it was written in: its buttons are for those who are there. */
  readonly chat: string;
  readonly reading: Reading;
  readonly at: number;
  /** Whether its target was one of the bot's own offers: that counts for the stage it was offered at and no other. */
  readonly chosen?: true;
}

/** All that is kept of one person's conversation in one chat; plain JSON. */
export interface Memory {
  readonly waiting?: Waiting;
  /** The number that the next reading gets, after the person's own. */
  readonly nextNumber: number;
  /** Whether the last reading's target was one of the bot's own offers. */
  readonly lastWasChosen?: true;
  /** Button keys of the last reply in order, so that `2` on a keyboard presses the second. */
  readonly lastButtons: readonly string[];
  /**
   * The reading for which the bot asked how many mg/L at a stage where nothing may wait for the answer: a bare number
   * or addition that follows is asked about, never taken.
   */
  readonly askedTarget?: { readonly at: number; readonly reading: Reading };
  /** The decimal mark that this person wrote with last; a press has none of its own. */
  readonly decimalMark?: '.' | ',';
  /** The unit of concentration that this person wrote last. */
  readonly concentrationUnit?: Reading['concentrationUnit'];
  /** The day (UTC date) on which this person last got an additive's cautions in full. */
  readonly cautionedOn: Readonly<Record<string, string>>;
}

/** What is kept of somebody who never wrote. */
export const FRESH_MEMORY: Memory = { nextNumber: 1, lastButtons: [], cautionedOn: {} };
