import { existsSync } from 'node:fs';
import { OperatorError } from '../operator-error.ts';
import { copyFile } from '../store/sqlite/copy-file.ts';
import { backupPathOf } from '../terminal/errand-files.ts';

/**
 * Copies the cellar's file as it is at this moment, also while another program writes to it.
 *
 * @param now in milliseconds since 1970
 * @returns what to tell the operator
 * @throws OperatorError where there is no such file, it is damaged, or there is no room
 */
export async function backupData(dataFile: string, now: number): Promise<string> {
  if (!existsSync(dataFile)) throw new OperatorError(`There is no ${dataFile}: check DATA_FILE.`);
  const path = await backupPathOf(dataFile, now);
  await copyFile(dataFile, path);
  return `Backup written: ${path}`;
}
