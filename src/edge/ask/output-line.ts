import { isDeepStrictEqual } from 'node:util';
import { saidFields } from '../../chat/conversation/recall.ts';
import type { FieldName, Fields, Reading } from '../../chat/reader/understood.ts';
import type { Served } from '../serve-message.ts';
import type { Unasked } from '../serve-due.ts';

/** What is told of a reading; how it was read in detail is no one's business outside. */
function asUnderstood(reading: Reading, shared: Fields): object {
  const { intent, topic, titration, assumed, asks, problems, setAside } = reading;
  return {
    intent,
    ...(topic !== undefined && { topic }),
    ...(titration !== undefined && { titration }),
    fields: without(shared, saidFields(reading)),
    assumed: { ...assumed, ...recalledFields(reading) },
    asks,
    problems,
    setAside,
  };
}

/** The fields of a line of a round without those that stand above it and hold for all. */
function without(shared: Fields, fields: Fields): Fields {
  const own = Object.entries(fields).filter(
    ([name, value]) => !isDeepStrictEqual(value, shared[name as FieldName]),
  );
  return Object.fromEntries(own);
}

/** The fields that were filled in from what is known of the vessel and the cellar. */
function recalledFields({ fields, recalled = {} }: Reading): Fields {
  return Object.fromEntries(
    Object.keys(recalled).flatMap((name) => {
      const value = fields[name as FieldName];
      return value === undefined ? [] : [[name, value]];
    }),
  );
}

function asReply(said: Served['said']): object {
  return {
    reply: said.map(({ text }) => text).join('\n\n'),
    buttons: said.flatMap(({ buttons }) => buttons).map(({ key, label }) => ({ key, label })),
  };
}

/** One answer as the line that a program reads: what was understood, the figures, the text, the buttons. */
export function toOutputLine(
  id: string | number | null,
  { said, understood, answers, round }: Served,
): object {
  const { readings = [], shared = {} } = understood ?? {};
  return {
    id,
    understood: readings.map((reading) => asUnderstood(reading, shared)),
    shared,
    answers: answers ?? [],
    ...(round && { round }),
    ...asReply(said),
  };
}

/** The answer to a tick: the messages that fell due, each with the chat that it goes to. */
export function toSendsLine(id: string | number | null, sends: readonly Unasked[]): object {
  return { id, sends: sends.map(({ chat, said }) => ({ chat, ...asReply(said) })) };
}
