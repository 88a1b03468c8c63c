/** A day as people say it; what it is on the calendar depends on when and where they say it. */
export type SaidDay =
  | { readonly is: 'today' | 'yesterday' | 'before-yesterday' }
  /** So many days ago, 3 or more. */
  | { readonly is: 'days-ago'; readonly days: number }
  /** The last such day before today; 1 is Monday. */
  | { readonly is: 'weekday'; readonly weekday: number }
  /** Without a year the last such date that is not in the future. */
  | { readonly is: 'date'; readonly day: number; readonly month: number; readonly year?: number };

/** A moment as people say it: a day, an hour of the clock (0–23) and minute, or so many hours ago. */
export interface SaidWhen {
  readonly day?: SaidDay;
  readonly hour?: number;
  readonly minute?: number;
  readonly hours_ago?: number;
}
