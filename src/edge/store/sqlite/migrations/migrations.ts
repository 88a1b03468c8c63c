import { CELLARS } from './1-cellars.ts';
import { MAILBOX } from './2-mailbox.ts';
import { PROJECTION } from './3-projection.ts';
import { SHELVES } from './4-shelves.ts';

/**
 * The steps from an empty file to the present form, in order; forward only. A step that is out in the world is never
 * changed: a new one is put behind it. The number of steps that a file has gone through is its `user_version`.
 */
export const MIGRATIONS: readonly string[] = [CELLARS, MAILBOX, PROJECTION, SHELVES];
