/** A day of the calendar; months from 1 to 12. */
export interface LocalDate {
  readonly year: number;
  readonly month: number;
  readonly day: number;
}

/** A minute as the clock and the calendar on a wall show it; hours from 0 to 23. */
export interface LocalMinute extends LocalDate {
  readonly hour: number;
  readonly minute: number;
}

/** The same with the day of the week, from 1 (Monday) to 7. */
export interface LocalTime extends LocalMinute {
  readonly weekday: number;
}

/** The minutes of a day from one moment of the clock to another, `to` not included; they may wrap midnight. */
export interface ClockSpan {
  readonly from_minute: number;
  readonly to_minute: number;
}

/** A stretch of time in milliseconds since 1970, `to` not included. */
export interface TimeRange {
  readonly from: number;
  readonly to: number;
}

/** A moment in milliseconds since 1970, and the IANA name of the zone whose clock and calendar are meant. */
export interface ZonedMoment {
  readonly at: number;
  readonly zone: string;
}
