import { line, printAlike, withEnoughDigits, type Line } from '../dose/line.ts';
import { freeToMolecularTerm, number } from '../dose/terms.ts';
import { shown } from '../units/shown.ts';
import { minus, over, plus, tenTo, termOf, times, type Step, type Term } from '../working.ts';
import type { DoseRange, RangeRequest } from './range-request.ts';

/** The figures that the working of a range leads to, mg/L; `gain` is what binding makes of 1 mg/L. */
export interface RangeFound extends Omit<DoseRange, 'steps'> {
  readonly needed_mg_L: number;
  readonly after_mg_L: number;
  /** Pure number. */
  readonly gain: number;
}

/** ln 10 as the working shows it. */
const LN_10 = termOf(2.302585, '', 1, 7);
const ONE = termOf(1, '', 1, 4);

const squared = (term: Term): string => `(${term.text})^2`;

/** The root of the sum of two squares. */
const rootOf = (a: Term, b: Term): Term => ({
  text: `sqrt(${squared(a)} + ${squared(b)})`,
  value: Math.hypot(a.value, b.value),
  holds: 'number',
});

/**
 * The working of a range: the ± of what is needed and of what is there, both together, lowest and highest dose, and
 * the molecular SO2 that one is sure of. Concentrations in mg/L.
 *
 * @example
 * ```ts
 * import { pKOf } from '../chemistry/dissociation.ts';
 * rangeSteps(
 *   { ph: 3.5, free_mg_L: 20, target: { free_mg_L: 30 }, dissociation: pKOf('pk-1.81') },
 *   { dose_mg_L: [8, 12], plus_minus_mg_L: 2, ph_plus_minus: 0.05, free_plus_minus_mg_L: 2, molecular_sure_mg_L: 0.522, needed_mg_L: 30, after_mg_L: 30, gain: 1 },
 * ).map((step) => step.substituted)[0] // => '30 mg/L - 20 mg/L - 2 mg/L'
 * ```
 */
export function rangeSteps(request: RangeRequest, found: RangeFound): readonly Step[] {
  const [low, high] = found.dose_mg_L;
  const made = withEnoughDigits(
    (digits) => linesOf(request, found, digits),
    (lines) =>
      lines.every(({ step, result }) => {
        if (step.name === 'dose-lowest') return printAlike(result.value, low, 3);
        return step.name !== 'dose-highest' || printAlike(result.value, high, 3);
      }),
  );
  return made.map(({ step }) => step);
}

function linesOf(request: RangeRequest, found: RangeFound, digits: number): readonly Line[] {
  const { ph, free_mg_L, target, dissociation } = request;
  const { ph_plus_minus, free_plus_minus_mg_L, gain, needed_mg_L, after_mg_L } = found;
  const lines: Line[] = [];
  const take = (made: Line): Term => (lines.push(made), made.result);
  const pK = number(dissociation.pK, digits);
  const power = minus(number(ph, digits), pK);
  const ofFree = shown(free_plus_minus_mg_L, 'mg/L', digits);
  let rise = ofFree;
  if ('molecular_mg_L' in target) {
    const slope = times(times(shown(target.molecular_mg_L, 'mg/L', digits), tenTo(power)), LN_10);
    const ofNeed = take(line('spread-of-need', times(slope, number(ph_plus_minus, digits)), 'mg/L', digits));
    rise = take(line('spread-of-dose', rootOf(ofNeed, ofFree), 'mg/L', digits));
  }
  const wanted = minus(shown(needed_mg_L, 'mg/L', digits), shown(free_mg_L, 'mg/L', digits));
  const withGain = (term: Term): Term => (gain === 1 ? term : times(term, number(gain, digits)));
  if (found.dose_mg_L[0] > 0) take(line('dose-lowest', withGain(minus(wanted, rise)), 'mg/L', digits));
  if (found.dose_mg_L[1] > 0) take(line('dose-highest', withGain(plus(wanted, rise)), 'mg/L', digits));
  if (after_mg_L <= 0 || found.molecular_sure_mg_L <= 0) return lines;
  const ratio = freeToMolecularTerm(ph, pK, digits);
  const ofPH = times(times(LN_10, over(tenTo(power), ratio)), number(ph_plus_minus, digits));
  const after = shown(after_mg_L, 'mg/L', digits);
  const both = rootOf(over(ofFree, after), ofPH);
  take(line('molecular-sure', times(over(after, ratio), minus(ONE, both)), 'mg/L', 3, dissociation.source));
  return lines;
}
