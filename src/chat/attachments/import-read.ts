import type { Person } from '../../core/cellar/cellar-store.ts';
import type { Entry } from '../../core/cellar/entry.ts';
import type { VolumeUnit } from '../reader/understood.ts';

/** Why a file cannot be taken. */
export type ImportProblemCode =
  | 'empty' // nothing stands in it
  | 'too-large' // more bytes than a file may have
  | 'too-many-rows'
  | 'too-many-columns'
  | 'cell-too-long'
  | 'not-a-table' // a picture, a program, a text without lines of vessels
  | 'old-spreadsheet' // a spreadsheet of before 2007, or one locked by a password
  | 'broken' // it ends in the middle, or does not hold together
  | 'too-heavy' // it took too long to read, or too much memory
  | 'columns-missing' // our own export without columns that it must have; `about` names them
  | 'columns-unknown' // our own export with columns that we do not know; `about` names them
  | 'unclear-numbers' // one number has a comma and another a point
  | 'not-understood' // lines of our own export that are none
  | 'doubled' // lines whose number or key stands in another line too
  | 'refers-outside' // lines about an entry that is not in the file
  | 'already-noted' // lines that the cellar has
  | 'no-vessels'; // not one line was understood

/** A reason, the lines of the file that it is about, and the words. Lines are counted from 1, as spreadsheets do. */
export interface ImportProblem {
  readonly code: ImportProblemCode;
  readonly lines?: readonly number[];
  readonly about?: string;
}

/** Readings of several vessels in a file, as the lines that a message would have. */
export interface RoundInFile {
  readonly text: string;
  readonly count: number;
  /** A target, an addition or an additive asks for a dose; readings alone may be meant to be noted. */
  readonly means: 'dose' | 'either';
  /** What its sheet is made as. */
  readonly format: 'csv' | 'xlsx';
  /** Lines of the file that are no part of it, as they were not understood. */
  readonly left: readonly number[];
}

/** What a file holds, to be shown before anything of it is taken. Beside a problem nothing can be taken. */
export interface ImportRead {
  /** Our own export, a plain list of vessels, a round that is no such list, or nothing that can be taken. */
  readonly kind: 'log' | 'vessels' | 'round' | 'nothing';
  /** The lines of it that are a round of readings, whatever else it is. */
  readonly round?: RoundInFile;
  /** In their order, with the numbers that the file has for them; those of a list of vessels count from 1. */
  readonly entries: readonly Entry[];
  /** Beside each entry the line it stands in. */
  readonly lines: readonly number[];
  /** Who noted them, by the file's numbers; nobody for a list of vessels. */
  readonly people: readonly Person[];
  /** How many vessels the entries are about. */
  readonly vessels: number;
  /** Lines that were not understood. Those of a list of vessels are left out, one of a log is a problem. */
  readonly notUnderstood: readonly number[];
  /** What was understood and is not taken: headings and names of fields. */
  readonly notTaken: readonly string[];
  /** The unit that volumes without one were read in. */
  readonly assumedUnit?: VolumeUnit;
  readonly problems: readonly ImportProblem[];
}

/** A file of which nothing can be taken. */
export function nothingRead(
  code: ImportProblemCode,
  more: Pick<ImportProblem, 'lines' | 'about'> = {},
): ImportRead {
  return {
    kind: 'nothing',
    entries: [],
    lines: [],
    people: [],
    vessels: 0,
    notUnderstood: [],
    notTaken: [],
    problems: [{ code, ...more }],
  };
}
