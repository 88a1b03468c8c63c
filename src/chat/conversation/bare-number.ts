import type { Reading, Understood } from '../reader/understood.ts';
import type { DecimalMark } from '../replies/number-text.ts';
import { line } from './lines/line.ts';
import { wholeExample } from './lines/whole-example.ts';
import { mannerOf } from './manner.ts';
import type { Here } from './here.ts';
import { keeping } from './next-memory.ts';
import type { Handled } from './ports.ts';
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

/** The addition that a message states and nothing else, in mg/L; undefined where it says more, or less. */
function additionAlone({ intent, fields, problems }: Reading): number | undefined {
  const { target, free_mg_L, ...others } = fields;
  if (intent !== 'dose' || problems.length > 0 || Object.keys(others).length > 0) return undefined;
  if (target === undefined) return free_mg_L;
  return free_mg_L === undefined && 'add_mg_L' in target ? target.add_mg_L : undefined;
}

/**
 * A figure alone after "no sulfite now", or after the question how much to add to must: nothing waits for it, so that
 * a figure is never taken for a dose by mistake. It is to be written whole, with the person's own vessel and volume.
 */
export function figureAfterTarget(text: string, understood: Understood, here: Here): Handled | undefined {
  const { message, memory, settings } = here;
  const { askedTarget } = memory;
  if (askedTarget === undefined || message.at - askedTarget.at > WAITS_ms) return undefined;
  const [only, another] = understood.readings;
  const isBare = isBareNumber(text);
  const figure = only === undefined ? undefined : additionAlone(only);
  if (another !== undefined || (!isBare && figure === undefined)) return undefined;
  const decimalMark = memory.decimalMark ?? '.';
  const unit = only?.concentrationUnit ?? askedTarget.reading.concentrationUnit;
  const asked: Reading = { ...askedTarget.reading, ...(unit && { concentrationUnit: unit }) };
  const manner = mannerOf(asked, decimalMark, here);
  const adds = isBare ? text.replace(/^[+-]/, '') : String(figure);
  const lines = [
    line('first', 'figure-alone', { text, ...wholeExample(askedTarget.reading, manner, settings, adds) }),
  ];
  return {
    writes: keeping(here, { ...memory, lastButtons: [] }),
    replies: [{ language: settings.language, lines, buttons: [] }],
    understood: isBare ? numberAskedAbout(text, settings, decimalMark) : understood,
    answers: [null],
  };
}

/** A number on a keyboard that no button has. */
export function noSuchButton(text: string, { memory, settings }: Here): Handled {
  const lines = [line('first', 'no-such-button', { text, last: String(memory.lastButtons.length) })];
  return {
    writes: [],
    replies: [{ language: settings.language, lines, buttons: [] }],
    understood: numberAskedAbout(text, settings, memory.decimalMark),
    answers: [null],
  };
}
