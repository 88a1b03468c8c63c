import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { parseEnv } from 'node:util';

import { OperatorError } from './operator-error.ts';

/** Variables by name, as the process has them. */
export type Environment = Readonly<Record<string, string | undefined>>;

/**
 * The environment with what a `.env` file in `folder` adds to it; what is set already wins. No file is no fault.
 *
 * @throws OperatorError when there is a `.env` that cannot be read.
 */
export function loadEnvironment(folder: string, set: Environment): Environment {
  try {
    return { ...parseEnv(readFileSync(join(folder, '.env'), 'utf8')), ...set };
  } catch (cause) {
    const { code } = cause as NodeJS.ErrnoException;
    if (code === 'ENOENT') return set;
    throw new OperatorError(`.env cannot be read (${code ?? 'unknown cause'}): check that it is a file.`, {
      cause,
    });
  }
}
