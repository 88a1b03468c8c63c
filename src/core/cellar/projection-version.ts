/**
 * Which rule `applyEntry` follows, a plain count. Raise it by one with every change of what an entry does to a vessel
 * or a shelf, or of how one is kept: a store that holds them by another rule derives them anew when it is opened.
 */
export const PROJECTION_VERSION = 4;
