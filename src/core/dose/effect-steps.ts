import type { SO2Content } from '../additives/so2-content.ts';
import type { Dissociation } from '../chemistry/dissociation.ts';
import type { SourceKey } from '../sources.ts';
import { shown } from '../units/shown.ts';
import { over, plus, times, type Step, type Term } from '../working.ts';
import { line, printAlike, withEnoughDigits, type Line } from './line.ts';
import type { AddedRequest, WineFacts } from './request.ts';
import { contentTerm, freeToMolecularTerm, number, pKLine } from './terms.ts';
import { MG_PER_G, volumeInLitres } from './volume-in-litres.ts';

/** What the working of an amount that is given is made from. */
export interface EffectWork {
  readonly request: AddedRequest & WineFacts;
  /** SO2 in the additive by the unit in which the amount is given. */
  readonly content?: SO2Content;
  /** Where the wine's pH and free SO2 are known and it is asked where it lands. */
  readonly dissociation?: Dissociation;
  /** The figure that the working must lead to: mg/L, or g of SO2 where the volume is unknown. */
  readonly leadsTo: number | undefined;
}

const SOURCE_OF: Readonly<Record<SO2Content['of'], SourceKey>> = {
  salt: 'ciaaw-2021',
  assay: 'ciaaw-2021',
  yield: 'label',
  gas: 'label',
  'salt-solution': 'ciaaw-2021',
  'SO2-solution': 'label',
  'SO2-tablet': 'label',
  'salt-tablet': 'ciaaw-2021',
};

function amountTerm(request: AddedRequest, digits: number): Term | undefined {
  if (request.mass_g !== undefined) return shown(request.mass_g, 'g', digits);
  if (request.additive_volume_mL !== undefined) return shown(request.additive_volume_mL, 'mL', digits);
  return request.tablets === undefined ? undefined : number(request.tablets, digits);
}

/** The SO2 in the amount, with the line that finds it; a mass of effervescent tablets, and of the gas, is SO2 already. */
function SO2Of(work: EffectWork, digits: number): { SO2?: Term; lines: Line[] } {
  const { request, content } = work;
  const amount = amountTerm(request, digits);
  if (amount === undefined || content === undefined) return { lines: [] };
  const inOne = contentTerm(content, digits);
  if (inOne === undefined || (request.mass_g !== undefined && content.of === 'SO2-tablet'))
    return { SO2: amount, lines: [] };
  const SO2 = line('so2-in-amount', times(amount, inOne), 'g', digits, SOURCE_OF[content.of]);
  return { SO2: SO2.result, lines: [SO2] };
}

function rateLines(work: EffectWork, digits: number): { lines: Line[]; added?: Term } {
  const { request, content } = work;
  const lines: Line[] = [];
  if (request.rate_mg_L === undefined) return { lines };
  const rate = shown(request.rate_mg_L, 'mg/L', digits);
  if (request.volume_L !== undefined) {
    const { volume, lines: found } = volumeInLitres(request.volume_L, request.volume_display, digits);
    lines.push(...found, line('mass-by-rate', over(times(rate, volume), MG_PER_G), 'g', digits));
  }
  if (content?.per !== 'g' && content?.of !== 'SO2-tablet') return { lines };
  const inOne = content.of === 'SO2-tablet' ? undefined : contentTerm(content, digits);
  const rise = inOne === undefined ? rate : times(rate, inOne);
  const added = line('added-by-rate', rise, 'mg/L', digits, SOURCE_OF[content.of]);
  lines.push(added);
  return { lines, added: added.result };
}

function addedLines(work: EffectWork, digits: number): { lines: Line[]; added?: Term } {
  const { request } = work;
  if (request.rate_mg_L !== undefined) return rateLines(work, digits);
  if (request.added_mg_L !== undefined) {
    const added = shown(request.added_mg_L, 'mg/L', digits);
    if (request.volume_L === undefined) return { lines: [], added };
    const { volume, lines } = volumeInLitres(request.volume_L, request.volume_display, digits);
    return { lines: [...lines, line('so2-mass', over(times(added, volume), MG_PER_G), 'g', digits)], added };
  }
  const { SO2, lines } = SO2Of(work, digits);
  if (SO2 === undefined || request.volume_L === undefined) return { lines };
  const { volume, lines: found } = volumeInLitres(request.volume_L, request.volume_display, digits);
  const added = line('added-concentration', over(times(SO2, MG_PER_G), volume), 'mg/L', digits);
  return { lines: [...lines, ...found, added], added: added.result };
}

function landingLines(work: EffectWork, added: Term | undefined, digits: number): Line[] {
  const { request, dissociation } = work;
  const { free_mg_L, ph } = request;
  if (added === undefined || free_mg_L === undefined) return [];
  const after = line('free-after', plus(shown(free_mg_L, 'mg/L', digits), added), 'mg/L', digits);
  if (ph === undefined || dissociation === undefined) return [after];
  const { pK, lines } = pKLine(dissociation, request.alcohol_percent, request.temperature_C, digits);
  const term = over(after.result, freeToMolecularTerm(ph, pK, digits));
  return [after, ...lines, line('molecular-after', term, 'mg/L', 3, dissociation.source)];
}

/**
 * The working of an amount, or a rate, that is given: SO2 in it, mg/L, where the wine lands.
 *
 * @example
 * ```ts
 * effectSteps({ request: { mass_g: 100, volume_L: 2000 }, content: { of: 'yield', per: 'g', fraction: 0.5 }, leadsTo: 25 }).map((step) => step.substituted) // => ['100 g * 0.5', '50 g * 1000 mg/g / (2000 L)']
 * ```
 */
export function effectSteps(work: EffectWork): readonly Step[] {
  const make = (digits: number) => {
    const { lines, added } = addedLines(work, digits);
    const reached = added?.value ?? lines.at(-1)?.step.result.value;
    return { lines: [...lines, ...landingLines(work, added, digits)], reached };
  };
  const { leadsTo } = work;
  const made = withEnoughDigits(
    make,
    ({ reached }) => reached === undefined || leadsTo === undefined || printAlike(reached, leadsTo),
  );
  return made.lines.map(({ step }) => step);
}
