import { Worker } from 'node:worker_threads';
import type { GivenPicture } from './draw-given.ts';
import { PictureFault } from './picture-fault.ts';

/** A thread that draws one picture at a time. */
export interface DrawingThread {
  /** The PNG of a picture. Throws a `PictureFault` when the machine cannot draw it; the thread is of no use then. */
  draw(given: GivenPicture): Promise<Uint8Array>;
  stop(): Promise<void>;
}

/** The thread's own program: it loads what draws once, and tells of each picture its bytes or why there are none. */
const PROGRAM = `
const { parentPort, workerData } = require('node:worker_threads');
const loaded = import(workerData.file);
parentPort.on('message', (given) => {
  loaded
    .then((file) => parentPort.postMessage({ bytes: file.drawGiven(given) }))
    .catch((fault) => parentPort.postMessage({ fault }));
});
`;

type Told = { readonly bytes: Uint8Array } | { readonly fault: unknown };

/** Own choices: a picture takes a twentieth of a second, and some megabytes. */
const LIMITS = { time_ms: 20_000, memory_MB: 256 } as const;

/** Starts a thread that draws. It sees no environment, and keeps no program from ending. */
export function startDrawingThread(): DrawingThread {
  const file = new URL('draw-given.ts', import.meta.url);
  const thread = new Worker(PROGRAM, {
    eval: true,
    env: {},
    execArgv: [],
    workerData: { file: file.href },
    resourceLimits: { maxOldGenerationSizeMb: LIMITS.memory_MB },
  });
  return {
    async draw(given) {
      const { promise, resolve, reject } = Promise.withResolvers<Uint8Array>();
      const fail = (cause: unknown): void => reject(new PictureFault('failed', { cause }));
      const take = (told: Told): void => ('bytes' in told ? resolve(told.bytes) : fail(told.fault));
      const timer = setTimeout(() => reject(new PictureFault('time')), LIMITS.time_ms);
      const heard = [['message', take] as const, ...ENDS.map((name) => [name, fail] as const)];
      for (const [name, hear] of heard) thread.on(name, hear);
      thread.ref();
      thread.postMessage(given);
      try {
        return await promise;
      } finally {
        clearTimeout(timer);
        for (const [name, hear] of heard) thread.off(name, hear);
        thread.unref();
      }
    },
    async stop() {
      await thread.terminate();
    },
  };
}

/** What else than a message a thread may come to. */
const ENDS = ['messageerror', 'error', 'exit'] as const;
