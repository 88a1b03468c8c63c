import { realpathSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';

/** The place of a cellar file itself, so that whoever comes by a link finds the same lock. Its folder must be there. */
export function realPath(path: string): string {
  try {
    return realpathSync(path);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'ENOENT') throw error;
    return join(realpathSync(dirname(path)), basename(path));
  }
}
