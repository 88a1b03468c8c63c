/** Stands for whoever sits at the keyboard. */
export const AT_KEYBOARD = 'keyboard';

/** A message of the invented cellar at a time of a day, so many days before the demo is started. */
export interface DemoMessage {
  readonly back_days: number;
  /** The clock of the cellar, `7:40`. */
  readonly clock: string;
  readonly by: string;
  readonly text: string;
}

/** A message of the day on which the demo is started: so long before the start that it is of that day in most hours. */
export interface RecentMessage {
  readonly back_min: number;
  readonly by: string;
  readonly text: string;
}
