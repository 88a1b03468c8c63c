import { REGIONS, type Region } from '../../../core/limits/region.ts';
import type { Piece } from '../own-pieces.ts';
import type { OwnWordId } from '../words/words.ts';

/** The ids of the words for all markets. */
export const LAW_IDS: readonly OwnWordId[] = REGIONS.map((region): OwnWordId => `law:${region}`);

/** The markets that pieces name, each once. */
export function regionsSaid(pieces: readonly Piece[]): readonly Region[] {
  return REGIONS.filter((region) => pieces.some(({ ids }) => ids.includes(`law:${region}`)));
}
