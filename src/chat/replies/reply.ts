import type { Language } from '../reader/understood.ts';

/** Where in a reply a line stands; the order of these is the order on the screen. */
export const ROOMS = [
  'first', // the answer, the choice, the problem or "no sulfite now"
  'condition', // if malolactic is finished; the other colour's amount
  'effect', // what it does and what to expect
  'question', // the one thing that is asked
  'assumed', // what was filled in, and how something was read
  'working',
  'warning',
  'caution',
] as const;
/** The place of a line in a reply. */
export type Room = (typeof ROOMS)[number];

/** One line of a reply as data: a sentence's key in `locales/`, and its values as finished text. */
export interface Line {
  readonly room: Room;
  readonly key: string;
  readonly values: Readonly<Record<string, string>>;
  /** Said one after the other with `<key>-separator` or `list-separator` between, and handed in as `$list`. */
  readonly list?: readonly Omit<Line, 'room'>[];
  /** The language of this line, where it is not the reply's own. */
  readonly language?: Language;
}

/** A button: on a phone it is tapped, on a keyboard its mark (number or letter) is typed. */
export interface Button {
  /** At most 64 bytes; means the same however often it is pressed. */
  readonly key: string;
  readonly mark: string;
  /** The label's key in `locales/`, and its values. */
  readonly label: string;
  readonly values: Readonly<Record<string, string>>;
  /** The language of the label, where it is not the reply's own. */
  readonly language?: Language;
}

/** A reply as data; `say` makes the text of it. */
export interface Reply {
  readonly language: Language;
  readonly lines: readonly Line[];
  readonly buttons: readonly Button[];
  /** The message whose reply this one takes the place of. */
  readonly replaces?: string;
}
