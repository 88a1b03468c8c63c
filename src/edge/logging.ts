import { pino, type DestinationStream, type Logger } from 'pino';

import { hideSecret } from './hide-secret.ts';
import type { LogLevel } from './log-level.ts';

/** What the rest of the program needs of a log: data first, then a sentence. */
export type Log = Pick<Logger, 'debug' | 'info' | 'warn' | 'error' | 'fatal'>;

/** What a log is made of. */
export interface LogOptions {
  readonly level: LogLevel;
  /** Taken out of every line after it is made, whatever field or nested cause it stands in. */
  readonly secret?: string | undefined;
  /** Where the lines go; a number is a file descriptor, written synchronously so that a crash loses none. */
  readonly to: number | DestinationStream;
}

/**
 * Makes the log: one JSON object a line. The secret is removed from the finished line and not field by field,
 * because libraries put it where nobody looks (a network error's message carries the URL with the token).
 */
export function createLog({ level, secret, to }: LogOptions): Log {
  const hide = hideSecret(secret);
  return pino(
    { level, base: null, hooks: { streamWrite: hide } },
    typeof to === 'number' ? pino.destination({ fd: to, sync: true }) : to,
  );
}
