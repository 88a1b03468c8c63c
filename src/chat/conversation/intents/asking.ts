import type { AskedField, Reading } from '../../reader/understood.ts';
import type { Button, Line } from '../../replies/reply.ts';
import { letterButtons } from '../buttons.ts';
import { line, part } from '../lines/line.ts';
import { questionLine } from '../lines/question.ts';
import type { Turn } from '../outcome.ts';
import { choicesFor, waitsFor } from '../waiting.ts';

/** The one question of a reply, the letters of its choices, and the field that waits. */
export function asking(
  reading: Reading,
  turn: Turn,
  room: Line['room'],
): { question: Line[]; buttons: Button[]; waits?: AskedField } {
  const field = waitsFor(reading);
  if (field === undefined) return { question: [], buttons: [] };
  const choices = choicesFor(field, reading, turn.settings);
  const buttons = letterButtons(turn.number, field, choices, turn.manner.mark);
  return {
    question: [
      questionLine(field, reading, turn.settings, room),
      ...buttons.map(({ mark, label, values }) => ({
        ...line(room, 'option', { mark }),
        list: [part(label, values)],
      })),
    ],
    buttons,
    waits: field,
  };
}
