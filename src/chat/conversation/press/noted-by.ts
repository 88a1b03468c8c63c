import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../../core/cellar/entry.ts';

/** What a button has noted that still holds, and the key of what it notes next: what was taken back may be noted anew. */
export async function notedBy(
  key: string,
  view: CellarView,
): Promise<{ readonly standing: LoggedEntry | undefined; readonly next: string }> {
  const before = (await view.entriesOfKeys(key)).filter(
    (one) => one.key === key || one.key.startsWith(`${key} `),
  );
  const standing = before.find(({ struck }) => struck === undefined);
  return { standing, next: before.length === 0 ? key : `${key} ${before.length}` };
}
