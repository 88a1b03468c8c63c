/** A minute in milliseconds, by definition. */
export const MINUTE_ms = 60_000;

/** An hour in milliseconds, by definition. */
export const HOUR_ms = 60 * MINUTE_ms;

/** Twenty-four hours in milliseconds, by definition. A day of the calendar may have 23 or 25. */
export const DAY_ms = 24 * HOUR_ms;
