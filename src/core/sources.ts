/** Where a figure comes from, by key. */
export const SOURCES = {
  arithmetic: 'plain arithmetic',
} as const;

export type SourceKey = keyof typeof SOURCES;
