import type { AskedField, Reading } from '../../reader/understood.ts';
import type { Button, Line } from '../../replies/reply.ts';
import { letterButtons } from '../buttons.ts';
import { line } from '../lines/line.ts';
import { questionLine } from '../lines/question.ts';
import type { Manner } from '../manner.ts';
import type { Turn } from '../outcome.ts';
import type { Settings } from '../settings.ts';
import { choicesFor, waitsFor } from '../waiting.ts';

/** A question as it stands in a reply: its line, the lines of its choices, and their buttons. */
export interface Question {
  readonly question: readonly Line[];
  readonly buttons: readonly Button[];
}

/** The question for a field of a remembered reading, with the letters of its choices. */
export function questionFor(
  field: AskedField,
  { ref, reading }: { readonly ref: string; readonly reading: Reading },
  room: Line['room'],
  manner: Manner,
  settings: Settings,
): Question {
  const buttons = letterButtons(ref, field, choicesFor(field, reading, settings), manner);
  const options = buttons.map(({ mark: letter, label, values }) => ({
    ...line(room, 'option', { mark: letter }),
    list: [{ key: label, values }],
  }));
  return { question: [questionLine(field, reading, manner, settings, room), ...options], buttons };
}

/** The one question that a reply to this reading asks, and the field that waits for its answer. */
export function asking(
  reading: Reading,
  { ref, settings, manner }: Turn,
  room: Line['room'],
): Question & { readonly waits?: AskedField } {
  const field = waitsFor(reading);
  if (field === undefined) return { question: [], buttons: [] };
  return { ...questionFor(field, { ref, reading }, room, manner, settings), waits: field };
}
