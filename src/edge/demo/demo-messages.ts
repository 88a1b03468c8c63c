import type { IncomingMessage, Who } from '../../chat/conversation/ports.ts';
import { addDays } from '../../core/time/add-days.ts';
import { MINUTE_ms } from '../../core/time/durations.ts';
import { localTimeOf } from '../../core/time/local-time-of.ts';
import type { ZonedMoment } from '../../core/time/local-time.ts';
import { momentOf } from '../../core/time/moment-of.ts';
import { AT_TERMINAL } from '../terminal/chat.ts';
import { AT_KEYBOARD, type DemoMessage } from './demo-message.ts';
import { LAST_HOUR } from './last-hour.ts';
import { VINTAGE } from './vintage.ts';

/** All that the invented cellar has written by a moment, in order, each person in a chat of their own. */
export function demoMessages(now: ZonedMoment): readonly IncomingMessage[] {
  const told = [
    ...VINTAGE.map(({ by, text, ...when }) => ({ by, text, at: momentBefore(when, now) })),
    ...LAST_HOUR.map(({ by, text, back_min }) => ({ by, text, at: now.at - back_min * MINUTE_ms })),
  ];
  return told.map(({ by, text, at }, count) => ({
    ...whoIs(by),
    id: `demo ${count}`,
    at,
    language: 'en',
    content: { kind: 'text', text },
  }));
}

/** In the cellar of the terminal, but in a chat of their own: what falls due for these people is not said there. */
function whoIs(by: string): Who {
  if (by === AT_KEYBOARD) return AT_TERMINAL;
  return { cellar: AT_TERMINAL.cellar, chat: `demo ${by}`, person: `demo ${by}`, name: by };
}

function momentBefore(
  { back_days, clock }: Pick<DemoMessage, 'back_days' | 'clock'>,
  now: ZonedMoment,
): number {
  const [hour = NaN, minute = NaN] = clock.split(':').map(Number);
  return momentOf({ ...addDays(localTimeOf(now.at, now.zone), -back_days), hour, minute }, now.zone);
}
