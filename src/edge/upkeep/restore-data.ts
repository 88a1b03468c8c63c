import { existsSync } from 'node:fs';
import { basename, dirname, extname, join } from 'node:path';
import { OperatorError } from '../operator-error.ts';
import { restoreFile } from '../store/sqlite/restore-file.ts';
import { momentInName } from './moment-in-name.ts';

/** What is restored, to where, and when (milliseconds since 1970). */
export interface RestoreOptions {
  readonly copy: string;
  readonly dataFile: string;
  readonly now: number;
}

/**
 * Puts a backup in the place of the cellar's file. What was there is moved beside it, and never written over.
 *
 * @returns what to tell the operator
 * @throws OperatorError where somebody writes to the file, or the backup is damaged or missing; then nothing has changed
 */
export async function restoreData({ copy, dataFile, now }: RestoreOptions): Promise<string> {
  if (!existsSync(copy)) throw new OperatorError(`There is no ${copy}: name a backup.`);
  const ending = extname(dataFile);
  const name = `${basename(dataFile, ending)}-until-${momentInName(now)}${ending}`;
  const { former } = await restoreFile(copy, dataFile, join(dirname(dataFile), name));
  const restored = `${dataFile} is now what ${copy} holds.`;
  return former === undefined
    ? restored
    : `${restored}\nThe former one is ${former}: nothing reads it any more.`;
}
