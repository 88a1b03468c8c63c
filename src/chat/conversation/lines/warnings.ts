import type { Warning, WarningCode } from '../../../core/dose/answer.ts';
import { KEPT_FOR_METHOD_mg_L } from '../../../core/limits/check-limit.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText, molecularText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { Manner } from '../manner.ts';
import { apartFromLimit } from './apart-from-limit.ts';
import { line } from './line.ts';
import { rowOfRule, ruleValues } from './rule.ts';

/** At most so many stand in a reply; the rest is behind `More`. */
const MOST = 3;

/** Said elsewhere in the reply, in a place of their own. */
const SAID_ELSEWHERE = [
  'stage-assumed',
  'style-unknown',
  'no-addition-needed',
  'addition-negligible',
  'gas-too-little',
  'gas-needs-training',
  'allowance-covers-less',
  'does-not-stop-fermentation',
] as const satisfies readonly WarningCode[];

/** A warning that has a sentence of its own. */
type Told = Warning & { readonly code: Exclude<WarningCode, (typeof SAID_ELSEWHERE)[number]> };

function isTold(warning: Warning): warning is Told {
  return SAID_ELSEWHERE.every((code) => code !== warning.code);
}

/** Where nobody has told the market, no limit is spoken of unless it is passed or near. */
const OF_A_MARKET: readonly WarningCode[] = ['no-limit-on-file', 'limit-unconfirmed'];

const isOfNoMarket = ({ code, values }: Warning): boolean =>
  OF_A_MARKET.includes(code) && (values['region'] === undefined || values['region'] === 'oiv');

/** What may forbid the addition: it stands right under the answer, and is never folded away. */
const RIGHT_UNDER = [
  'stage-not-over',
  'additive-not-permitted',
  'total-over-limit',
  'free-over-limit',
] as const satisfies readonly WarningCode[];

/** The warnings that stand right under the first line, with who is to be asked. */
export function underLines(warnings: readonly Warning[], manner: Manner): Line[] {
  return warnings
    .filter(isTold)
    .filter(({ code }) => RIGHT_UNDER.some((one) => one === code))
    .map((warning) => warningLine(warning, manner, 'first'));
}

/** Whether free SO2 will be above half the limit, so that an unknown total is worth a word. */
function totalMatters({ code, values }: Warning): boolean {
  if (code !== 'total-unknown') return true;
  const { free_after_mg_L: after, limit_mg_L: limit } = values;
  return typeof after === 'number' && typeof limit === 'number' && after > limit / 2;
}

/** Where the market is told, an unknown total may be no more than the limit leaves beside the dose. */
function mostMatters({ values }: Warning): boolean {
  const { rule, most_total_mg_L: most } = values;
  return typeof rule === 'string' && !rule.startsWith('oiv') && typeof most === 'number';
}

/** That a limit is unconfirmed stands in the line that says how the wine comes near it. */
function isSaidWith({ code, values }: Warning, warnings: readonly Warning[]): boolean {
  if (code !== 'limit-unconfirmed') return false;
  return warnings.some(
    (one) => one.code !== code && one.values['rule'] === values['rule'] && one.code !== 'total-unknown',
  );
}

/** Near a limit only because of what is kept for bottling, which the vessel's own facts say. */
function isForBottlingOnly({ code, values }: Warning): boolean {
  const { total_after_mg_L: after, limit_mg_L: limit } = values;
  if (code !== 'total-near-limit' || typeof after !== 'number' || typeof limit !== 'number') return false;
  return after < limit - KEPT_FOR_METHOD_mg_L;
}

/** The weightiest warnings, at most three; `besides` are those whose matter stands in the reply already. */
export function warningLines(
  warnings: readonly Warning[],
  manner: Manner,
  room: Line['room'] = 'warning',
  besides: readonly WarningCode[] = [],
): Line[] {
  return warnings
    .filter(isTold)
    .filter(({ code }) => ![...RIGHT_UNDER, ...besides].includes(code))
    .filter((warning) => !isOfNoMarket(warning) && !isForBottlingOnly(warning))
    .filter((warning) => !isSaidWith(warning, warnings))
    .filter((warning) => totalMatters(warning) || mostMatters(warning))
    .filter(({ values }) => values['measure_gives_mg_L'] === undefined) // the tablets' own line says so
    .slice(0, MOST)
    .map((warning) => warningLine(warning, manner, room));
}

/** All warnings that have no place of their own, for the button `More`. */
export function allWarningLines(warnings: readonly Warning[], manner: Manner): Line[] {
  return warnings.filter(isTold).map((warning) => warningLine(warning, manner, 'first'));
}

function warningLine({ code, values }: Told, manner: Manner, room: Line['room']): Line {
  const texts = Object.entries(values).map(
    ([name, value]) => [name, besideLimit(name, values, manner) ?? textOf(name, value, manner)] as const,
  );
  if (code === 'total-unknown' && typeof values['most_total_mg_L'] === 'number')
    return line(room, 'warning-total-unknown-most', {
      ...lawValues(values, manner),
      ...byName(texts),
      unit: manner.unit,
    });
  const change = values['need_change_mg_L'];
  const tellsChange = code === 'basis-fallback' && typeof change === 'number';
  return line(room, tellsChange ? 'warning-basis-fallback-change' : `warning-${code}`, {
    unit: manner.unit,
    ...lawValues(values, manner),
    ...byName(texts),
    ...(code === 'label-threshold' && { comparator: values['comparator'] === '>' ? 'more' : 'from' }),
    ...(tellsChange && {
      change: concentrationText(Math.abs(change), manner.mark),
      direction: change > 0 ? 'more' : 'less',
    }),
  });
}

const byName = (texts: readonly (readonly [string, string])[]): Record<string, string> =>
  Object.fromEntries(texts);

/** A rule of the law by what it says and not by its id; of the label, and of additives, the market alone. */
function lawValues({ rule }: Warning['values'], { mark }: Manner): Line['values'] {
  return typeof rule === 'string' && rowOfRule(rule) !== undefined ? ruleValues(rule, mark) : {};
}

/** A limit to its decimal, and what passes it by a hair never as the limit itself. */
function besideLimit(name: string, values: Warning['values'], { mark }: Manner): string | undefined {
  const { limit_mg_L: limit } = values;
  const value = values[name];
  if (typeof limit !== 'number' || typeof value !== 'number') return undefined;
  if (name === 'limit_mg_L') return numberText(value, 1, mark);
  return name.endsWith('_after_mg_L') && !name.includes('molecular')
    ? apartFromLimit(value, limit, mark)
    : undefined;
}

/** A warning's figure by its name: molecular SO2 to 0.01, concentrations to 1 or 0.1, the rest to 0.01. */
function textOf(name: string, value: number | string, { mark }: Manner): string {
  if (typeof value === 'string') return value;
  if (name.includes('molecular')) return molecularText(value, mark);
  if (name === 'rounding_mg_L') return concentrationText(Math.abs(value), mark);
  return name.endsWith('_mg_L') ? concentrationText(value, mark) : numberText(value, 2, mark);
}
