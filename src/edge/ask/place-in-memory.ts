import type { CellarStore } from '../../core/cellar/cellar-store.ts';
import { createMemoryCellars } from '../store/memory-cellars.ts';
import type { PlaceOf } from './place.ts';

/** The places of a run that keeps nothing: each chat is a cellar, and a line without one a cellar of its own. */
export function placeInMemory(store: CellarStore, { now }: { readonly now: () => number }): PlaceOf {
  return (chat) =>
    chat === undefined
      ? // Gone with its line, so that a long run takes no more memory than a short one.
        { store: createMemoryCellars({ now }), cellar: 'line', chat: 'line' }
      : { store, cellar: `chat ${chat}`, chat };
}
