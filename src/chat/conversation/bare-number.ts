import type { Understood } from '../reader/understood.ts';
import type { DecimalMark } from '../replies/number-text.ts';
import { line } from './lines/line.ts';
import type { Memory } from './memory.ts';
import type { Handled, IncomingMessage } from './ports.ts';
import type { Settings } from './settings.ts';
import { WAITS_ms } from './waiting.ts';

/** Whether a message is nothing but a number. */
export function isBareNumber(text: string): boolean {
  return /^[+-]?\d+([.,]\d+)?$/.test(text);
}

/** A number that nothing asks for, as a reading: it is never taken for a figure, and asked about instead. */
export function numberAskedAbout(
  text: string,
  settings: Settings,
  decimalMark: DecimalMark = '.',
): Understood {
  return {
    readings: [
      {
        intent: 'dose',
        fields: {},
        assumed: {},
        asks: [],
        problems: [{ code: 'ambiguous-number', about: text }],
        setAside: [],
        notes: [],
        marks: {},
        where: {},
      },
    ],
    shared: {},
    language: settings.language,
    decimalMark,
  };
}

/**
 * A bare number after "no sulfite now", or after the question how much to add to must: nothing waits for it, so that
 * a figure is never taken for a dose by mistake. It is asked about instead.
 */
export function bareNumberAfterTarget(
  message: IncomingMessage,
  text: string,
  memory: Memory,
  settings: Settings,
): Handled | undefined {
  const { askedTargetAt } = memory;
  if (askedTargetAt === undefined || message.at - askedTargetAt > WAITS_ms) return undefined;
  if (!isBareNumber(text)) return undefined;
  const lines = [line('first', 'bare-number', { text })];
  return {
    writes: [],
    replies: [{ language: settings.language, lines, buttons: [] }],
    understood: numberAskedAbout(text, settings, memory.decimalMark),
    answers: [null],
  };
}
