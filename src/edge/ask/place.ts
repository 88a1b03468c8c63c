import type { CellarStore } from '../../core/cellar/cellar-store.ts';

/** Where what a line says is kept. */
export interface Place {
  readonly store: CellarStore;
  readonly cellar: string;
  readonly chat: string;
}

/** The place of a line: of its chat, or of a chat that no other line ever comes back to. */
export type PlaceOf = (chat: string | undefined) => Place;
