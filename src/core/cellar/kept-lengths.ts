/** How many of each a vessel keeps in sight; the whole of it stands in the log. Own choice. */
export const KEPT = { readings: 12, additions: 12, landings: 10, orders: 20 } as const;
