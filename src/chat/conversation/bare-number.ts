import type { Reading } from '../reader/understood.ts';
import { line } from './lines/line.ts';
import type { Memory } from './memory.ts';
import type { Handled, IncomingMessage } from './ports.ts';
import type { Settings } from './settings.ts';
import { WAITS_ms } from './waiting.ts';

/**
 * A bare number after "no sulfite now", or after the question how much to add to must: nothing waits for it, so that
 * a figure is never taken for a dose by mistake. It is asked about instead.
 */
export function bareNumberAfterTarget(
  message: IncomingMessage,
  mark: string,
  memory: Memory,
  settings: Settings,
): Handled | undefined {
  const { askedTargetAt } = memory;
  if (askedTargetAt === undefined || message.at - askedTargetAt > WAITS_ms) return undefined;
  if (!/^[+-]?\d+([.,]\d+)?$/.test(mark)) return undefined;
  const reading: Reading = {
    intent: 'dose',
    fields: {},
    assumed: {},
    asks: [],
    problems: [{ code: 'ambiguous-number', about: mark }],
    setAside: [],
    notes: [],
    marks: {},
    where: {},
  };
  return {
    writes: [],
    replies: [
      {
        language: settings.language,
        lines: [line('first', 'bare-number', { text: mark })],
        buttons: [],
      },
    ],
    understood: { readings: [reading], shared: {}, language: settings.language, decimalMark: '.' },
    answers: [null],
  };
}
