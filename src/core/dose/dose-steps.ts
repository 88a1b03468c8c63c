import type { SO2Content } from '../additives/so2-content.ts';
import type { Dissociation } from '../chemistry/dissociation.ts';
import { SHOWN_UNITS, shown } from '../units/shown.ts';
import { minus, over, times, type Step, type Term } from '../working.ts';
import type { Aim } from './aim.ts';
import { mustLine } from './fruit.ts';
import { line, printAlike, withEnoughDigits, type Line } from './line.ts';
import { oxygenLines } from './oxygen-loss.ts';
import type { DoseRequest } from './request.ts';
import { toStep, type Rounded } from './rounding.ts';
import {
  AMOUNT_LINES,
  allowanceTerm,
  contentTerm,
  freeToMolecularTerm,
  number,
  pKLine,
  remainderTerm,
} from './terms.ts';
import { MG_PER_G, volumeInLitres } from './volume-in-litres.ts';

/** What a dose's working is made from. */
export interface DoseWork {
  readonly request: DoseRequest;
  readonly dissociation: Dissociation;
  readonly aim: Aim;
  /** Present where an amount was worked out. */
  readonly content?: SO2Content;
  /** What the instrument shows of the whole dose, and of one vessel's share of it. */
  readonly rounded?: Rounded;
  readonly roundedEach?: Rounded;
}

/** Digits of the molecular SO2, which leads nowhere else. */
const MOLECULAR_DIGITS = 3;

interface Made {
  readonly lines: Line[];
  /** Free SO2 needed and SO2 that goes in, as printed, mg/L. */
  readonly needed?: number | undefined;
  readonly dose?: number | undefined;
  /** Amount for one vessel, in g, mL or tablets … */
  each?: number | undefined;
  /** … and for all, in the same unit: g, mL or tablets. */
  whole?: number;
}

function readingLines(work: DoseWork, digits: number): { lines: Line[]; needed?: Term } {
  const { request, dissociation } = work;
  const { ph, free_mg_L, target } = request;
  if (ph === undefined) return { lines: [] };
  const { pK, lines: found } = pKLine(dissociation, request.alcohol_percent, request.temperature_C, digits);
  const lines = [...found];
  const times10 = freeToMolecularTerm(ph, pK, digits);
  if (free_mg_L !== undefined) {
    const now = over(shown(free_mg_L, 'mg/L', digits), times10);
    lines.push(line('molecular-now', now, 'mg/L', MOLECULAR_DIGITS, dissociation.source));
  }
  if (target === undefined || !('molecular_mg_L' in target)) return { lines };
  const needed = line(
    'free-needed',
    times(shown(target.molecular_mg_L, 'mg/L', digits), times10),
    'mg/L',
    digits,
    dissociation.source,
  );
  lines.push(needed);
  return { lines, needed: needed.result };
}

/** Where oxygen is stated, what it takes has to be there too. */
function withOxygen(
  { request }: DoseWork,
  { lines, needed }: { lines: Line[]; needed?: Term },
  digits: number,
): { lines: Line[]; needed?: Term } {
  const { target } = request;
  const isFree = target !== undefined && 'free_mg_L' in target;
  const after = needed ?? (isFree ? shown(target.free_mg_L, 'mg/L', digits) : undefined);
  const found = after === undefined ? [] : oxygenLines(request, after, digits);
  const before = found.at(-1)?.result ?? needed;
  return { lines: [...lines, ...found], ...(before === undefined ? {} : { needed: before }) };
}

function additionLines(
  work: DoseWork,
  needed: Term | undefined,
  digits: number,
): { lines: Line[]; dose?: Term } {
  const { request, aim } = work;
  const { target, free_mg_L, binding_allowance_percent: percent, binding_share: share } = request;
  if (target === undefined || aim.add_mg_L === undefined || aim.add_mg_L === 0) return { lines: [] };
  const lines: Line[] = [];
  let dose: Term;
  if ('add_mg_L' in target) dose = shown(target.add_mg_L, 'mg/L', digits);
  else {
    const wanted = needed ?? shown(aim.target_free_mg_L ?? 0, 'mg/L', digits);
    const addition = line('addition', minus(wanted, shown(free_mg_L ?? 0, 'mg/L', digits)), 'mg/L', digits);
    lines.push(addition);
    dose = addition.result;
  }
  if (percent !== undefined && percent > 0) {
    lines.push(line('dose-with-allowance', times(dose, allowanceTerm(percent, digits)), 'mg/L', digits));
  } else if (share !== undefined && share > 0) {
    lines.push(line('dose-with-share', over(dose, remainderTerm(share, digits)), 'mg/L', digits));
  }
  return { lines, dose: lines.at(-1)?.result ?? dose };
}

function amountLines(work: DoseWork, dose: Term, made: Made, digits: number): void {
  const { request, content } = work;
  if (content === undefined || request.volume_L === undefined) return;
  const count = request.vessels ?? 1;
  const ofFruit = request.fruit && mustLine(request.fruit, digits);
  const { volume: all, lines } = ofFruit
    ? { volume: ofFruit.result, lines: [ofFruit] }
    : volumeInLitres(request.volume_L, request.volume_display, digits);
  const volume = count > 1 ? over(all, number(count, digits)) : all;
  const SO2_g = over(times(dose, volume), MG_PER_G);
  const SO2 = line(count > 1 ? 'so2-mass-each' : 'so2-mass', SO2_g, 'g', digits);
  made.lines.push(...lines, SO2);
  const [name, unit] = AMOUNT_LINES[content.of];
  const inOne = contentTerm(content, digits);
  let last = SO2;
  if (inOne !== undefined) made.lines.push((last = line(name, over(SO2.result, inOne), unit, digits)));
  made.each = last.result.value / SHOWN_UNITS[unit];
  if (count > 1) {
    made.lines.push((last = line('all-vessels', times(last.result, number(count, digits)), unit, digits)));
  }
  made.whole = last.result.value / SHOWN_UNITS[unit];
}

const showsSame = (printed: number, { step, down, exact }: Rounded): boolean =>
  toStep(printed, step, down) === toStep(exact, step, down);

/** The figures on the way are said elsewhere in the reply too, with three digits. */
const agrees = (printed: number | undefined, exact: number | undefined): boolean =>
  printed === undefined || exact === undefined || printAlike(printed, exact, 3);

function isRight(work: DoseWork, made: Made): boolean {
  const { rounded, roundedEach, aim } = work;
  if (!agrees(made.needed, aim.target_free_mg_L) || !agrees(made.dose, aim.dose_mg_L)) return false;
  if (made.whole !== undefined && rounded !== undefined) {
    return (
      showsSame(made.whole, rounded) &&
      (roundedEach === undefined || made.each === undefined || showsSame(made.each, roundedEach))
    );
  }
  const last = made.lines.at(-1)?.step;
  if (last === undefined || last.name === 'molecular-now') return true;
  return printAlike(last.result.value, aim.dose_mg_L || (aim.target_free_mg_L ?? 0));
}

/**
 * The working of a dose: molecular now, free needed, addition, allowance, SO2 in grams, amount of the additive.
 * Each line carries on with what the one before printed, with enough digits that the last rounds to the measure.
 *
 * @example
 * ```ts
 * doseSteps({
 *   request: { target: { add_mg_L: 28 }, targetStated: true, stage: 'finished', stageStated: true, basis: 'pk-1.81', volume_L: 1000 },
 *   dissociation: { pK: 1.81, basis: 'pk-1.81', source: 'uc-1982' },
 *   aim: { add_mg_L: 28, dose_mg_L: 28 },
 *   content: { of: 'SO2-solution', per: 'mL', SO2_g_per_100_mL: 6 },
 * }).map((step) => step.substituted) // => ['28 mg/L * 1000 L / (1000 mg/g)', '28 g / (6 g / (100 mL))']
 * ```
 */
export function doseSteps(work: DoseWork): readonly Step[] {
  const make = (digits: number): Made => {
    const reading = readingLines(work, digits);
    const read = withOxygen(work, reading, digits);
    const addition = additionLines(work, read.needed, digits);
    const made: Made = {
      lines: [...read.lines, ...addition.lines],
      needed: read.needed?.value,
      dose: addition.dose?.value,
    };
    if (addition.dose !== undefined) amountLines(work, addition.dose, made, digits);
    return made;
  };
  return withEnoughDigits(make, (made) => isRight(work, made)).lines.map(({ step }) => step);
}
