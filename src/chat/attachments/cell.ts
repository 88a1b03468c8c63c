/**
 * What stands in a cell of a sheet: a text, a number in full precision, or a time as the clock on the wall showed it
 * (milliseconds since 1970 as if that clock were UTC's). Undefined where there is nothing.
 */
export type Cell = string | number | { readonly local_ms: number } | undefined;

/** A sheet to be written; `struck` tells of each row whether its entry was taken back. */
export interface Sheet {
  readonly columns: readonly SheetColumn[];
  readonly rows: readonly (readonly Cell[])[];
  readonly struck: readonly boolean[];
}

/** A column of a sheet: its heading, its width in letters, and the decimals that a spreadsheet shows. */
export interface SheetColumn {
  readonly heading: string;
  readonly letters: number; // how wide, in characters
  readonly decimals?: number;
}

/** A cell as it was read: a spreadsheet knows numbers and dates, a text file only text. */
export type TableCell = string | number | Date | undefined;

/** A table as it was read. `delimiter` is what parts the cells of a text file. */
export interface Table {
  readonly rows: readonly (readonly TableCell[])[];
  readonly delimiter?: string;
  /** The lines of a text file as they stand there, for lists that are no table; absent for a spreadsheet. */
  readonly lines?: readonly string[];
}
