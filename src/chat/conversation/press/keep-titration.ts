import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import { emptyReading } from '../../reader/empty-reading.ts';
import { answerSingle } from '../answer-single.ts';
import type { Here } from '../here.ts';
import { line } from '../lines/line.ts';
import type { Remembered } from '../memory.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { isTooMuch, resultOf, titrationOf } from '../to-titration.ts';

/** "Keep it": the result of a titration as a reading of its vessel, once however often and by however many it is pressed. */
export async function keepTitration(found: Remembered, here: Here, view: CellarView): Promise<Handled> {
  const { reading, chat, ref, at } = found;
  const { vessel } = reading.fields;
  const answer = reading.titration && titrationOf(reading.titration);
  if (vessel === undefined || answer === undefined || isTooMuch(answer))
    return replying(here, { lines: [line('first', 'old-button')] });
  const event = `titration ${JSON.stringify([chat, ref])}`;
  const before = await view.entriesOfKeys(event);
  const result = resultOf(answer);
  const kept = emptyReading('reading', {
    fields: {
      vessel,
      ...(reading.fields.style && { style: reading.fields.style }),
      ...(reading.fields.ph !== undefined && { ph: reading.fields.ph }),
      ...(answer.free_mg_L === undefined ? { total_mg_L: result } : { free_mg_L: result }),
    },
    said_at: reading.said_at ?? at,
    ...(reading.when && { when: reading.when }),
    ...(reading.concentrationUnit && { concentrationUnit: reading.concentrationUnit }),
  });
  const { language } = here.settings;
  const decimalMark = here.memory.decimalMark ?? '.';
  const { writes, replies } = answerSingle(
    { readings: [kept], shared: {}, language, decimalMark },
    { ...here, event, done: new Set(before.map(({ key }) => key)) },
  );
  return { writes, replies };
}
