import type { Errand, IncomingMessage } from '../chat/conversation/ports.ts';
import type { Say } from '../chat/replies/say.ts';
import type { Brought } from './brought.ts';

/** The weigh-out sheet of a round as a file, or as pictures for a phone. */
export async function runRoundSheet(
  errand: Extract<Errand, { kind: 'round-sheet' }>,
  message: IncomingMessage,
  say: Say,
): Promise<Brought> {
  if (errand.format === 'picture') {
    const { makeRoundPictures } = await import('./pictures/make-round-pictures.ts');
    const [file, ...more] = await makeRoundPictures(errand, message.at, say);
    return { said: [], ...(file && { file }), more };
  }
  const { makeRoundFile } = await import('./files/make-round-file.ts');
  return { said: [], file: await makeRoundFile(errand, errand.format, say) };
}
