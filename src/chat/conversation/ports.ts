import type { CellarView, Write } from '../../core/cellar/cellar-store.ts';
import type { AddedAnswer, DoseAnswer, EffectAnswer, SolutionAnswer } from '../../core/dose/answer.ts';
import type { TitrationAnswer } from '../../core/laboratory/titration.ts';
import type { ImportRead } from '../attachments/import-read.ts';
import type { RoundSheet } from '../attachments/round/round-sheet.ts';
import type { TotalToFetch } from '../../core/dose/totals-to-fetch.ts';
import type { Language, Understood } from '../reader/understood.ts';
import type { Reply } from '../replies/reply.ts';
import type { BesideDose, LabAnswer } from './lab/lab-answer.ts';
import type { Settings } from './settings.ts';

/** Whom a conversation is with. A cellar may be several chats and people. */
export interface Who {
  readonly cellar: string;
  readonly chat: string;
  readonly person: string;
  /** The name that the platform shows for the person. */
  readonly name?: string;
}

/** What was sent: a text, the key of a button, a file as the edge has read it, or something that is not read. */
export type Content =
  | { readonly kind: 'text'; readonly text: string }
  | { readonly kind: 'press'; readonly key: string }
  | { readonly kind: 'file'; readonly read: ImportRead }
  /** An earlier message with another text: which one it was, and when that was sent (milliseconds since 1970). */
  | {
      readonly kind: 'edited';
      readonly text: string;
      readonly original: string;
      readonly original_at: number;
    }
  | {
      readonly kind: 'unreadable';
      readonly what: 'edited' | 'photo' | 'sticker' | 'voice' | 'file' | 'other';
    };

/** One thing a person sent, whatever the platform. */
export interface IncomingMessage extends Who {
  /** Names the event, so that the same one is never handled twice. */
  readonly id: string;
  /** When it was sent, in milliseconds since 1970. */
  readonly at: number;
  /** What the platform tells of the person's language. */
  readonly language: Language;
  readonly content: Content;
  /** In a private chat, in a group to the bot (a mention, a reply, a command), or in a group among others; unsaid: direct. */
  readonly addressed?: 'direct' | 'called' | 'overheard';
  /** Whoever writes here has the machine itself: nothing is kept from them. */
  readonly trusted?: true;
  /** Letters and digits that nobody can guess, new with each message: a code is made of them. */
  readonly nonce?: string;
  /** What the platform calls the chat. */
  readonly title?: string;
  /** What a code is put behind to make a link of it. */
  readonly linkBegin?: string;
  /** The chat is in this cellar by an invitation: whether it still is, the cellar's own list of chats says. */
  readonly isJoined?: true;
  /** All cellars of the chat, where there are several; the present one is among them. */
  readonly cellars?: readonly CellarPlace[];
}

/** A cellar that a chat may be in. */
export interface CellarPlace {
  readonly cellar: string;
  /** What it is called; undefined where nobody has named it. */
  readonly name?: string;
  /** The name of its first keeper. */
  readonly keeper?: string;
}

/** Another place for the chat of a message: its edge sees to it before what the message wrote is kept. */
export interface PlaceChange {
  readonly does: 'enter' | 'leave' | 'switch';
  readonly cellar: string;
}

/** What core answers to one reading. */
export type Answer =
  | DoseAnswer
  | EffectAnswer
  | AddedAnswer
  | SolutionAnswer
  | TitrationAnswer
  | (DoseAnswer & BesideDose)
  | LabAnswer;

/** What a round takes of each additive, and how many of its lines have no amount because something is wrong, missing or to be chosen. */
export interface RoundData {
  readonly totals: readonly TotalToFetch[];
  readonly problems: number; // how many lines
}

/** Something with files that the edge does once the message's writes are durable. Times in milliseconds since 1970. */
export type Errand =
  | {
      readonly kind: 'export';
      readonly from?: number;
      readonly to?: number;
      readonly vessel?: string;
      readonly of?: 'stock';
      /** Names the stretch in the file's name. */
      readonly span: string;
      readonly format: 'csv' | 'xlsx';
      readonly zone: string;
      readonly language: Language;
      readonly decimalMark: '.' | ',';
    }
  | { readonly kind: 'import'; readonly file: string; readonly language: Language }
  | { readonly kind: 'backup'; readonly language: Language }
  | {
      readonly kind: 'round-sheet';
      readonly sheet: RoundSheet;
      readonly format: 'csv' | 'xlsx' | 'picture';
      readonly zone: string;
      readonly language: Language;
    }
  | {
      readonly kind: 'picture';
      readonly vessel: string;
      /** What the free SO2 that a pH asks for is reckoned by. */
      readonly targets: Settings['targets'];
      readonly basis: Settings['basis'];
      /** The limit of total SO2 of its market, in mg/L, where one holds. */
      readonly limit_mg_L?: number;
      readonly unit: 'mg/L' | 'ppm';
      readonly zone: string;
      readonly language: Language;
      readonly decimalMark: '.' | ',';
    };

/** Handling a message returns its writes and its replies as data; the edge commits, then sends. */
export interface Handled {
  readonly writes: readonly Write[];
  readonly replies: readonly Reply[];
  /** What was read and computed, for `ask --jsonl`; absent for a press and for what cannot be read. */
  readonly understood?: Understood;
  /** One element a reading; `null` where nothing may be said. */
  readonly answers?: readonly (Answer | null)[];
  /** What a round takes in all, beside its answers. */
  readonly round?: RoundData;
  readonly errand?: Errand;
  readonly place?: PlaceChange;
  /** What is written has to be kept before the message can be read: it is to be handled once more then. */
  readonly again?: true;
}

/** The conversation, as the edges have it: it looks at the cellar, and neither writes nor sends. */
export type Handle = (message: IncomingMessage, view: CellarView, settings: Settings) => Promise<Handled>;
