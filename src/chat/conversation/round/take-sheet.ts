import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { RoundSheet } from '../../attachments/round/round-sheet.ts';
import type { Line, Reply } from '../../replies/reply.ts';
import type { Here } from '../here.ts';
import { line } from '../lines/line.ts';
import { linesOf, totalLines } from '../lines/round-body.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { zoneOf } from '../zone.ts';
import { keptRound } from './kept-round.ts';

/** In which form somebody wants the sheet of a round. */
export type SheetForm = 'text' | 'csv' | 'xlsx' | 'picture';

/** Rows of a round in one message. */
const A_MESSAGE = 25;

/** The sheet of the last round in this chat. */
export async function lastSheet(form: SheetForm, here: Here, view: CellarView): Promise<Handled> {
  const sheet = await keptRound(here, view);
  return sheet === undefined
    ? replying(here, { lines: [line('first', 'round-gone')] })
    : takeSheet(sheet, form, here);
}

/** The sheet of a round: as messages, or made into a file or pictures at the edge. */
export function takeSheet(sheet: RoundSheet, form: SheetForm, here: Here): Handled {
  if (form === 'text') return asMessages(sheet, here);
  const { settings } = here;
  return {
    ...replying(here, { lines: [], keepsButtons: true }),
    replies: [],
    errand: {
      kind: 'round-sheet',
      sheet,
      format: form,
      zone: zoneOf(settings),
      language: settings.language,
    },
  };
}

function asMessages({ head, rows, mark, foot }: RoundSheet, here: Here): Handled {
  const { writes, replies } = replying(here, { lines: [], keepsButtons: true });
  const [reply] = replies;
  if (reply === undefined) return { writes, replies };
  const done = rows.filter(({ is }) => is !== 'open');
  const open = rows.filter(({ is }) => is === 'open');
  const count = Math.max(1, Math.ceil(done.length / A_MESSAGE));
  const messages = Array.from({ length: count }, (_, at): Line[] => [
    ...head,
    ...linesOf(done.slice(at * A_MESSAGE, (at + 1) * A_MESSAGE)),
  ]);
  const last: Line[] = [
    ...totalLines(rows, mark),
    ...(open.length === 0
      ? []
      : [line('first', 'round-open', { count: open.length === 1 ? 'one' : String(open.length) })]),
    ...linesOf(open),
    ...foot.filter(({ room }) => room !== 'caution'),
  ];
  return {
    writes,
    replies: messages.map((lines, at): Reply => ({
      ...reply,
      lines: at === messages.length - 1 ? [...lines, ...last] : lines,
    })),
  };
}
