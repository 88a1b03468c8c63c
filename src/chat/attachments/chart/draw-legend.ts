import { CHART_WORDS } from './chart-words.ts';
import type { ChartWord, ChartWords } from './chart-words.ts';
import { textAt } from './elements.ts';
import type { Place } from './elements.ts';
import { LAYOUT } from './layout.ts';
import * as signs from './signs.ts';
import { fitText, textWidth } from './text-width.ts';

/** A drawing, and how far down it reaches, in units of the picture. */
export interface Drawn {
  readonly drawing: string;
  readonly bottom: number; // in units of the picture
}

const RADIUS = 5;

const addedSample = ({ x, y }: Place): string =>
  signs.additionSign({ x, y: y + signs.ARROW / 2 }, { isKnown: true });

const SAMPLES: Readonly<Record<Exclude<ChartWord, 'unit'>, (place: Place) => string>> = {
  free: (place) => signs.freeSign(place, RADIUS),
  total: (place) => signs.totalSign(place, RADIUS),
  bound: ({ x, y }) => signs.boundSign({ x, y: y + 8 }, { x, y: y - 8 }, RADIUS),
  odd: (place) => signs.oddCross(place, RADIUS),
  needed: (place) => signs.lineSample(place, signs.NEEDED_LOOK),
  limit: (place) => signs.lineSample(place, signs.LIMIT_LOOK),
  added: addedSample,
  'added-thinned': addedSample,
  'added-unknown': ({ x, y }) => signs.additionSign({ x, y: y + signs.ARROW / 2 }, { isKnown: false }),
  blended: ({ x, y }) => signs.lineSampleUpright({ x, y }, signs.BLENDED_LOOK),
};

/** What the signs stand for but for a hidden one, one after the other in as many rows as that takes. */
export function drawLegend({ words }: ChartWords, hidden: ChartWord): Drawn {
  const { legend, margin, width } = LAYOUT;
  let [x, y]: [number, number] = [margin, legend.top];
  const drawn: string[] = [];
  for (const word of CHART_WORDS) {
    const said = words[word];
    if (word === 'unit' || word === hidden || said === undefined) continue;
    const text = fitText(said, { size: legend.size, room: width - 2 * margin - legend.sign });
    const taken = legend.sign + textWidth(text, legend.size);
    if (x > margin && x + taken > width - margin) [x, y] = [margin, y + legend.row];
    drawn.push(SAMPLES[word]({ x: x + legend.sign / 2 - 2, y }));
    drawn.push(textAt({ x: x + legend.sign, y: y + legend.size * 0.36 }, text, { size: legend.size }));
    x += taken + legend.gap;
  }
  return { drawing: drawn.join(''), bottom: y + legend.row / 2 };
}
