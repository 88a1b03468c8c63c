import { makeTakeTurns } from '../store/take-turns.ts';
import type { DrawingThread } from './drawing-thread.ts';
import { startDrawingThread } from './drawing-thread.ts';
import type { GivenPicture } from './draw-given.ts';

/** Draws a picture as PNG, away from whoever answers people. Throws a `PictureFault` when the machine cannot. */
export type DrawPicture = (given: GivenPicture) => Promise<Uint8Array>;

/** A thread without work is kept so long: loading takes longer than drawing, and memory is dear. Own choice. */
const IDLE_ms = 60_000;

/**
 * Makes what draws pictures: one at a time, in a thread that starts with the first picture, ends when nobody asks for
 * more, and is replaced when it has failed.
 */
export function makeDrawPicture(idle_ms: number = IDLE_ms): DrawPicture {
  const takeTurns = makeTakeTurns();
  let thread: DrawingThread | undefined;
  let timer: NodeJS.Timeout | undefined;
  const stop = (): void => {
    void thread?.stop();
    thread = undefined;
  };
  return (given) =>
    takeTurns('picture', async () => {
      clearTimeout(timer);
      thread ??= startDrawingThread();
      try {
        const bytes = await thread.draw(given);
        timer = setTimeout(stop, idle_ms).unref();
        return bytes;
      } catch (fault) {
        stop();
        throw fault;
      }
    });
}
