import type { BlendBounds, ShareFound } from '../../../core/blend/share-within.ts';
import type { Vessel } from '../../../core/cellar/vessel.ts';

/** A wine with another, and which shares of that one keep to the bounds. */
export interface Tried {
  readonly wine: Vessel;
  readonly other: Vessel;
  readonly bounds: BlendBounds;
  readonly found: ShareFound;
}
