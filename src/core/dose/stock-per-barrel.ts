import { assertBetween } from '../bounds.ts';
import { shown } from '../units/shown.ts';
import { over, times, type Term } from '../working.ts';
import type { StockPerBarrel } from './answer.ts';
import { line, printAlike, withEnoughDigits } from './line.ts';
import { STOCK_BARREL_L, STOCK_RISE_mg_L } from './solution-recipes.ts';
import { MG_PER_G } from './volume-in-litres.ts';

const ONE_mL = shown(1, 'mL');
const HUNDRED_mL = shown(100, 'mL');

/**
 * What one millilitre of a stock brings into a barrel of 225 L, and how many millilitres a rise takes there.
 *
 * @param strength_SO2_g_per_100_mL grams of SO2 in 100 mL, above 0 to 100
 * @param more `rise_mg_L`: mg/L of SO2, above 0 to 1000; 10 where none is named. `printed_g`: the strength as a line
 *   before has printed it, so that the working goes on from there
 * @throws RangeError outside those
 *
 * @example
 * ```ts
 * stockPerBarrel(5.763).one_mL_adds_mg_L // => 0.2561
 * stockPerBarrel(5.763).additive_volume_mL // => 39.04
 * ```
 */
export function stockPerBarrel(
  strength_SO2_g_per_100_mL: number,
  more: { readonly rise_mg_L?: number | undefined; readonly printed_g?: number | undefined } = {},
): StockPerBarrel {
  const { rise_mg_L = STOCK_RISE_mg_L, printed_g } = more;
  const action = 'tell the millilitres for a barrel';
  assertBetween(action, 'strength_SO2_g_per_100_mL', strength_SO2_g_per_100_mL, Number.MIN_VALUE, 100);
  assertBetween(action, 'rise_mg_L', rise_mg_L, Number.MIN_VALUE, 1000);
  const one_mL_adds_mg_L = (strength_SO2_g_per_100_mL * 10) / STOCK_BARREL_L;
  const additive_volume_mL = rise_mg_L / one_mL_adds_mg_L;
  const barrel = shown(STOCK_BARREL_L, 'L');
  const lines = withEnoughDigits(
    (digits) => {
      const stock: Term = over(shown(printed_g ?? strength_SO2_g_per_100_mL, 'g', digits), HUNDRED_mL);
      const one = over(times(times(ONE_mL, stock), MG_PER_G), barrel);
      const whole = over(over(times(shown(rise_mg_L, 'mg/L'), barrel), MG_PER_G), stock);
      return [
        line('added-by-one-millilitre', one, 'mg/L', digits),
        line('stock-for-a-barrel', whole, 'mL', digits),
      ];
    },
    ([, whole]) => printAlike(whole?.step.result.value ?? 0, additive_volume_mL, 3),
  );
  return {
    barrel_L: STOCK_BARREL_L,
    one_mL_adds_mg_L,
    rise_mg_L,
    additive_volume_mL,
    steps: lines.map(({ step }) => step),
  };
}
