import { createInterface } from 'node:readline';

/** How lines become messages. */
export interface Batching {
  /** Lines that come within this many milliseconds of each other are one message. */
  readonly quiet_ms: number;
  readonly signal?: AbortSignal;
}

/**
 * Makes messages of lines: those that arrive together are one, and a blank line or the end of the input ends it.
 * Gives nothing for blank lines alone.
 */
export async function* batchLines(
  input: NodeJS.ReadableStream,
  { quiet_ms, signal }: Batching,
): AsyncGenerator<string> {
  const ready: string[] = [];
  let held: string[] = [];
  let ended = false;
  let wake: (() => void) | undefined;
  let timer: NodeJS.Timeout | undefined;
  const release = (): void => {
    clearTimeout(timer);
    if (held.length > 0) ready.push(held.join('\n'));
    held = [];
    wake?.();
  };
  const lines = createInterface({ input, crlfDelay: Infinity });
  lines.on('line', (text) => {
    clearTimeout(timer);
    if (text.trim() === '') return release();
    held.push(text);
    timer = setTimeout(release, quiet_ms);
  });
  lines.on('close', () => {
    ended = true;
    release();
  });
  signal?.addEventListener('abort', () => lines.close(), { once: true });
  if (signal?.aborted) lines.close();
  while (!ended || ready.length > 0) {
    const next = ready.shift();
    if (next !== undefined) yield next;
    else await new Promise<void>((resolve) => (wake = resolve));
  }
}
