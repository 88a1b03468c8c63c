import type { LoggedEntry } from '../../../../core/cellar/entry.ts';
import { MINUTE_ms } from '../../../../core/time/durations.ts';
import { momentText } from '../../../replies/moment-text.ts';
import { vesselNames } from '../../../replies/vessel-name.ts';
import type { Here } from '../../here.ts';
import { line } from '../../lines/line.ts';
import { entryPart } from '../../lines/entry-part.ts';
import { noting, type Note } from '../../note.ts';
import { whoText } from '../../people.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { tellingOf } from '../../telling.ts';

/** So long one takes back one's own last entry without a reason, in milliseconds. */
export const UNDO_ms = 15 * MINUTE_ms;

/** Takes back one's own entry of the last quarter of an hour. */
export function undoEntry(entry: LoggedEntry | undefined, here: Here): Handled {
  if (entry === undefined) return replying(here, { lines: [line('first', 'undo-nothing')] });
  const values = { entry: String(entry.entry), vessel: vesselNames(entry.vessels) };
  if (entry.struck) return strikeEntry(entry, '', here);
  const isLate = here.message.at - entry.noted_at > UNDO_ms;
  if (entry.by !== here.me || isLate)
    return replying(here, {
      lines: [
        line('first', isLate ? 'undo-late' : 'undo-not-yours', { ...values, who: whoText(entry.by, here) }),
      ],
    });
  return struck(entry, 'undo', here);
}

/** Takes back any entry, with a reason; what was taken back before stays so. */
export function strikeEntry(entry: LoggedEntry | undefined, reason: string, here: Here, asked = ''): Handled {
  if (entry === undefined) return replying(here, { lines: [line('first', 'strike-none', { entry: asked })] });
  const values = { entry: String(entry.entry), vessel: vesselNames(entry.vessels) };
  if (entry.struck) {
    const by = { by: String(entry.struck.entry), reason: reasonText(entry.struck.reason) };
    return replying(here, { lines: [line('first', 'strike-again', { ...values, ...by })] });
  }
  if (entry.kind === 'correction')
    return replying(here, { lines: [line('first', 'strike-correction', values)] });
  if (reason === '') return replying(here, { lines: [line('first', 'strike-why', values)] });
  return struck(entry, reason, here);
}

function struck(entry: LoggedEntry, reason: string, here: Here): Handled {
  const note: Note = {
    happening: { kind: 'correction', vessels: entry.vessels, corrects: entry.entry, reason },
    at: here.message.at,
    key: `strike ${entry.entry}`,
  };
  const values = {
    entry: String(entry.entry),
    by: String(here.nextEntry),
    when: momentText(entry.at, tellingOf(here)),
  };
  const { writes, ...said } = replying(here, {
    lines: [
      { ...line('first', 'struck', values), list: [entryPart(entry, here)] },
      ...(entry.kind === 'addition' ? [line('effect', 'struck-addition', values)] : []),
    ],
  });
  return { ...said, writes: [...noting(here, [note]), ...writes] };
}

/** A reason as the sentences select on it: `undo` is ours, every other is the person's own words. */
function reasonText(reason: string): string {
  return reason === '' ? 'none' : reason;
}
