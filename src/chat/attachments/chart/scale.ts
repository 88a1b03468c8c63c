/** Gives the place in the picture, in its units, of a time (milliseconds since 1970) or of a concentration (mg/L). */
export type Scale = (value: number) => number;
