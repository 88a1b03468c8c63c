import { added } from '../../../core/dose/added.ts';
import { effect } from '../../../core/dose/effect.ts';
import { solution } from '../../../core/dose/solution.ts';
import type { Warning } from '../../../core/dose/answer.ts';
import type { Step } from '../../../core/working.ts';
import type { Reading } from '../../reader/understood.ts';
import type { Button, Line } from '../../replies/reply.ts';
import { buttonsFor, type LABELS } from '../buttons.ts';
import { redFigures } from '../lines/condition.ts';
import { cautionLines } from '../lines/cautions.ts';
import { stepsOfSolution } from '../intents/solution.ts';
import { givenAnswer } from '../lines/given-answer.ts';
import { line } from '../lines/line.ts';
import { vesselText } from '../lines/vessel.ts';
import { allWarningLines } from '../lines/warnings.ts';
import { wholeWorking } from '../lines/working.ts';
import { doseOf } from '../dose-of.ts';
import type { Here } from '../here.ts';
import { mannerOf } from '../manner.ts';
import type { Remembered } from '../memory.ts';
import type { Settings } from '../settings.ts';
import { toBeWeighed } from '../to-be-weighed.ts';
import { vesselsIn } from '../vessels-named.ts';
import { additiveOf, toAddedRequest, toEffectRequest, toSolutionRequest } from '../to-requests.ts';

interface Reckoned {
  readonly steps: readonly Step[];
  readonly warnings: readonly Warning[];
}

/** The same reckoning once more: nothing of it was kept, as it always comes out alike. */
function reckonAgain(reading: Reading, settings: Settings): Reckoned {
  switch (reading.intent) {
    case 'effect':
      return effect(toEffectRequest(reading, settings));
    case 'added':
      return { ...added(toAddedRequest(reading)), warnings: [] };
    case 'solution': {
      const request = toSolutionRequest(reading);
      return { steps: request ? stepsOfSolution(solution(request)) : [], warnings: [] };
    }
    case 'dose':
      return givenAnswer(doseOf(reading, settings));
    case 'reading':
    case 'titration':
    case 'command':
    case 'emergency':
    case 'chat':
      return { steps: [], warnings: [] };
  }
}

/** The whole working of a remembered reading, line by line, with its sources. */
export function workingOf(reading: Reading, here: Here): Line[] {
  const { steps } = reckonAgain(reading, here.settings);
  return [
    line('first', 'working-head', { vessel: vesselText(reading) }),
    ...wholeWorking(steps, mannerOf(reading, here.memory.decimalMark ?? '.', here)),
  ];
}

/** The cautions of a reading's additive in full. */
export function safetyLines(reading: Reading): Line[] {
  const additive = additiveOf(reading);
  if (additive === undefined) return [line('first', 'old-button')];
  return [
    line('first', 'safety-head', { additive: additive.id }),
    ...cautionLines(additive, true, reading.intent === 'solution' ? 'water' : 'wine'),
  ];
}

function buttonsBehind(
  reading: Reading,
  warned: readonly Warning[],
  hasDose: boolean,
): (keyof typeof LABELS)[] {
  if (reading.intent !== 'dose') return ['w', 's'];
  return [
    ...(reading.assumed.stage === undefined ? [] : (['nf'] as const)),
    ...(redFigures({ warnings: warned }) === undefined ? [] : (['red'] as const)),
    'w',
    's',
    't',
    ...(vesselsIn(reading.fields).length > 0 && hasDose ? (['o'] as const) : []),
  ];
}

/** All that stands behind `More`: every warning, and the buttons that had no room. */
export function moreLines(found: Remembered, here: Here): { lines: Line[]; buttons: Button[] } {
  const { settings, memory } = here;
  const { reading, ref } = found;
  const manner = mannerOf(reading, memory.decimalMark ?? '.', here);
  const reckoned = reckonAgain(reading, settings);
  const warned = reckoned.warnings;
  const warnings = allWarningLines(warned, manner);
  const head = line('first', 'more-head', { vessel: vesselText(reading) });
  return {
    lines: [head, ...(warnings.length > 0 ? warnings : [line('first', 'more-no-warnings')])],
    buttons: buttonsFor(ref, buttonsBehind(reading, warned, toBeWeighed(reading, reckoned) !== undefined)),
  };
}
