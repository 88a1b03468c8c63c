import { chartOf } from '../chat/attachments/chart/chart-of.ts';
import { pictureLines } from '../chat/attachments/chart/picture-lines.ts';
import type { Errand, IncomingMessage } from '../chat/conversation/ports.ts';
import type { Say } from '../chat/replies/say.ts';
import type { CellarStore } from '../core/cellar/cellar-store.ts';
import type { Brought } from './brought.ts';

/** The picture of a vessel, and beside it the same in words; where nothing is measured, the words alone. */
export async function runPicture(
  errand: Extract<Errand, { kind: 'picture' }>,
  message: IncomingMessage,
  { store, say }: { readonly store: Pick<CellarStore, 'look'>; readonly say: Say },
): Promise<Brought> {
  const { vessel, targets, basis, limit_mg_L, zone, language, decimalMark: mark, unit } = errand;
  const entries = await store.look(message.cellar, (view) => view.entries({ vessel }));
  const data = chartOf(entries, { vessel, targets, basis, ...(limit_mg_L !== undefined && { limit_mg_L }) });
  const manner = { telling: { zone, language, now: message.at }, mark, unit };
  const said = [say({ language, lines: pictureLines(data, { vessel, manner }), buttons: [] })];
  if (data === undefined) return { said };
  const { makePicture } = await import('./pictures/make-picture.ts');
  return { said, file: { ...(await makePicture({ data, manner }, say)), isPicture: true } };
}
