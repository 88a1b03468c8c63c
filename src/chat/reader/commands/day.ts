import type { SaidDay } from '../../../core/time/said-when.ts';
import type { Command } from '../command.ts';
import { dayAt } from '../moments/day-at.ts';
import type { Talk } from './talk.ts';
import { says, saysOnly } from './talk.ts';

/** `12.11.`: so a whole message names a day; beside anything else it may be a figure. */
const DOTTED = /^(\d{1,2})\.(\d{1,2})\.$/;

function dotted(text: string): SaidDay | undefined {
  const [, day, month] = DOTTED.exec(text.trim()) ?? [];
  const said = { day: Number(day), month: Number(month) };
  return said.day >= 1 && said.day <= 31 && said.month >= 1 && said.month <= 12
    ? { is: 'date', ...said }
    : undefined;
}

/** Reads the sheet of a day: `today`, `12 Nov`, `what did we add on friday?`, `sheet`. */
export function readDay(talk: Talk): Command | undefined {
  if (talk.board.findings.length > 0) return undefined;
  const alone = dotted(talk.board.message);
  if (alone) return { name: 'day', day: alone };
  const { said } = talk;
  const k = said.findIndex((_, at) => dayAt(said, at) !== undefined);
  const found = k < 0 ? undefined : dayAt(said, k);
  const rest = new Set(found ? said.slice(k, found.to + 1) : []);
  if (!saysOnly(talk, ['sheet', 'what-was-added', 'show', 'for', 'on', 'of'], rest)) return undefined;
  if (found) return { name: 'day', day: found.day };
  return says(talk, 'sheet') ? { name: 'day', day: { is: 'today' } } : undefined;
}
