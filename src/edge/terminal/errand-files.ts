import { mkdir, readFile, stat, writeFile } from 'node:fs/promises';
import { dirname, extname, join, relative, resolve } from 'node:path';
import { FILE_LIMITS } from '../files/file-limits.ts';
import type { ExportFile } from '../files/make-export.ts';
import { momentInName } from '../upkeep/moment-in-name.ts';

/** Reads a file that somebody named; undefined where there is none, and where it is larger than any that is taken. */
export async function readNamedFile(name: string): Promise<Uint8Array | undefined> {
  try {
    const { size } = await stat(name);
    // One byte more than may be is enough to be told that it is too large.
    if (size > FILE_LIMITS.own_bytes) return new Uint8Array(FILE_LIMITS.own_bytes + 1);
    return await readFile(name);
  } catch {
    return undefined;
  }
}

/** Writes an export beside the data, never over another one; gives the path to say. */
export async function writeExport(dataFile: string, { name, bytes }: ExportFile): Promise<string> {
  const folder = join(dirname(dataFile), 'exports');
  await mkdir(folder, { recursive: true });
  const ending = extname(name);
  for (let count = 1; ; count += 1) {
    const own = count === 1 ? name : `${name.slice(0, -ending.length)}-${count}${ending}`;
    const path = join(folder, own);
    try {
      await writeFile(path, bytes, { flag: 'wx' });
      return shownPath(path);
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error;
    }
  }
}

/** Where a backup of the data goes: beside it, named by its moment (milliseconds since 1970). */
export async function backupPathOf(dataFile: string, now: number): Promise<string> {
  const folder = join(dirname(dataFile), 'backups');
  await mkdir(folder, { recursive: true });
  return shownPath(join(folder, `cellar-${momentInName(now)}.db`));
}

/** A path as it is said: from where the program runs, where it lies below. */
function shownPath(path: string): string {
  const below = relative('', path);
  return below.startsWith('..') ? resolve(path) : below;
}
