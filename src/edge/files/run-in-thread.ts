import { Worker } from 'node:worker_threads';

/** Work in a thread that did not end well: it took too long, too much memory, or failed. */
export class ThreadFault extends Error {
  override readonly name = 'ThreadFault';
  readonly reason: 'time' | 'memory' | 'failed';

  constructor(reason: ThreadFault['reason'], options?: ErrorOptions) {
    super(`Cannot finish the work in a thread of its own: ${reason}`, options);
    this.reason = reason;
  }
}

/** What a thread does: a function that a file exports, and what it may cost. */
export interface ThreadWork {
  readonly file: URL;
  readonly function: string;
  readonly time_ms: number;
  readonly memory_MB: number;
}

/** The thread's own program: it takes the function from its file, so that importing that file does nothing. */
const PROGRAM = `
const { parentPort, workerData } = require('node:worker_threads');
import(workerData.file)
  .then((file) => file[workerData.function](workerData.given))
  .then((result) => parentPort.postMessage(result));
`;

/**
 * Does work in a thread of its own, so that nobody waits for it and it cannot take the program down. It sees no
 * environment. Throws a `ThreadFault` when it fails.
 */
export async function runInThread<T>(work: ThreadWork, given: unknown): Promise<T> {
  const thread = new Worker(PROGRAM, {
    eval: true,
    env: {},
    execArgv: [],
    workerData: { file: work.file.href, function: work.function, given },
    resourceLimits: { maxOldGenerationSizeMb: work.memory_MB, maxYoungGenerationSizeMb: 32 },
  });
  const late = Promise.withResolvers<never>();
  const timer = setTimeout(() => late.reject(new ThreadFault('time')), work.time_ms);
  try {
    return await Promise.race([outcome<T>(thread), late.promise]);
  } finally {
    clearTimeout(timer);
    await thread.terminate();
  }
}

function outcome<T>(thread: Worker): Promise<T> {
  const { promise, resolve, reject } = Promise.withResolvers<T>();
  thread.on('message', resolve);
  thread.on('messageerror', (cause) => reject(new ThreadFault('failed', { cause })));
  thread.on('error', (cause: unknown) => {
    const isMemory = cause instanceof Error && 'code' in cause && cause.code === 'ERR_WORKER_OUT_OF_MEMORY';
    reject(new ThreadFault(isMemory ? 'memory' : 'failed', { cause }));
  });
  thread.on('exit', (status) => reject(new ThreadFault('failed', { cause: status })));
  return promise;
}
