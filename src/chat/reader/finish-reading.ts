import { mustOf, type Fruit } from '../../core/dose/fruit.ts';
import { STAGES_WITHOUT_TARGET } from '../../core/wine.ts';
import type { Target } from '../../core/wine.ts';
import type { AskedField, Assumed, Draft, Fields, Reading, ReaderSettings } from './understood.ts';
import { ASKED_FIELDS } from './understood.ts';

const inOrder = (asks: ReadonlySet<AskedField>): AskedField[] =>
  ASKED_FIELDS.filter((field) => asks.has(field));

/** Alcohol from which no usual target holds, % vol (own threshold, no source). */
const STRONG_percent = 17;

/** Whether a wine has no usual target, so that it is asked: sparkling, fortified, 17 % vol and more. */
export const hasNoUsualTarget = ({
  category,
  alcohol_percent,
}: Pick<Fields, 'category' | 'alcohol_percent'>): boolean =>
  category === 'sparkling' || category === 'fortified' || (alcohol_percent ?? 0) >= STRONG_percent;

/** The usual target of this kind of wine; sugar alone never makes it sweet. */
export function usualTarget(
  { style, category }: Pick<Fields, 'style' | 'category'>,
  { targets }: Pick<ReaderSettings, 'targets'>,
): Extract<Target, { molecular_mg_L: number }> {
  if (category === 'sweet') return { molecular_mg_L: targets.sweet };
  return { molecular_mg_L: style === 'red' ? targets.red : targets.white };
}

/** The additive that is taken where none is named, with its strength where it is not pure. */
function usualAdditive({ usualAdditive: additive, usualStrength }: ReaderSettings): Assumed {
  return { additive, ...usualStrength };
}

/** What is missing of the additive: its name, its strength, the size of its tablet. */
function askAdditive({ marks }: Draft, fields: Fields, asks: Set<AskedField>): void {
  const { additive } = fields;
  if (marks.unnamedAdditive && additive === undefined) {
    asks.add('additive');
    if (marks.unnamedSolution && fields.strength_percent === undefined) asks.add('strength_percent');
  }
  if (marks.campden) {
    if (additive === undefined) asks.add('additive');
    if (fields.tablet_salt_g === undefined) asks.add('tablet_salt_g');
  }
  if (additive === 'tablet' && fields.tablet_SO2_g === undefined) asks.add('tablet_SO2_g');
  if (additive?.endsWith('-solution') && fields.strength_percent === undefined) asks.add('strength_percent');
}

/** The fruit of a must told by weight, where its yield is stated or set. */
export function fruitOf(
  { fruit_kg, yield_L_per_100_kg: stated }: Pick<Reading['marks'], 'fruit_kg' | 'yield_L_per_100_kg'>,
  { yield_L_per_100_kg: usual }: Pick<ReaderSettings, 'yield_L_per_100_kg'>,
): Fruit | undefined {
  const yield_L_per_100_kg = stated ?? usual;
  return fruit_kg === undefined || yield_L_per_100_kg === undefined
    ? undefined
    : { fruit_kg, yield_L_per_100_kg };
}

/** Litres that may be assumed: the must of fruit by its yield, barrels without a size, by count or by number. */
function assumedVolume(
  { intent, marks }: Draft,
  fields: Fields,
  settings: Pick<ReaderSettings, 'yield_L_per_100_kg'>,
): number | undefined {
  const fruit = fruitOf(marks, settings);
  if (fruit && fields.volume_L === undefined && (intent === 'dose' || intent === 'effect'))
    return mustOf(fruit);
  if (fields.volume_L !== undefined || marks.fruitByWeight || marks.casksWithoutSize || marks.eachOrTotal)
    return undefined;
  // To rinse a barrel does not take a barrel full.
  if (intent === 'solution' && marks.solutionUse === 'cleaning') return undefined;
  if (intent === 'reading' || (intent === 'added' && !marks.barrelsCounted)) return undefined;
  return marks.barrelsAssumed_L;
}

const isAmount = (fields: Fields): boolean =>
  fields.mass_g !== undefined || fields.additive_volume_mL !== undefined || fields.tablets !== undefined;

/** Fills in what is usual and lists what is missing, by intent. */
function work(
  draft: Draft,
  fields: Fields,
  settings: ReaderSettings,
): { assumed: Assumed; asks: Set<AskedField> } {
  const { intent, marks } = draft;
  const asks = new Set<AskedField>();
  const volume_L = assumedVolume(draft, fields, settings);
  const { yield_L_per_100_kg: usualYield } = settings;
  const isByUsualYield =
    volume_L !== undefined && marks.fruit_kg !== undefined && marks.yield_L_per_100_kg === undefined;
  const gallon = marks.gallonRead ? { gallon: settings.gallon } : {};
  const base: Assumed = {
    ...(volume_L === undefined ? {} : { volume_L }),
    ...(isByUsualYield && usualYield !== undefined ? { yield_L_per_100_kg: usualYield } : {}),
    ...gallon,
  };
  const unknownVolume = fields.volume_L === undefined && volume_L === undefined;
  const nameless = fields.additive === undefined && !marks.unnamedAdditive && !marks.campden;
  // Millilitres are of no powder: which solution it was has to be asked.
  const unnamedLiquid =
    nameless && fields.additive_volume_mL !== undefined && !settings.usualAdditive.endsWith('-solution');
  const additive: Assumed = nameless && !unnamedLiquid ? usualAdditive(settings) : {};
  if (unnamedLiquid) asks.add('additive');
  const vesselless = fields.vessel === undefined && fields.vessels === undefined;
  if (intent === 'dose') {
    const stage = fields.stage ?? 'finished';
    const bare = fields.target === undefined && STAGES_WITHOUT_TARGET.includes(stage);
    if (unknownVolume) asks.add('volume_L');
    if (bare) asks.add('target');
    else if (fields.target === undefined || !('add_mg_L' in fields.target)) {
      const byMolecular = fields.target === undefined || 'molecular_mg_L' in fields.target;
      if (byMolecular && fields.ph === undefined) asks.add('ph');
      if (fields.free_mg_L === undefined) asks.add('free_mg_L');
    }
    askAdditive(draft, fields, asks);
    const target =
      bare || fields.target !== undefined
        ? undefined
        : hasNoUsualTarget(fields)
          ? 'ask'
          : usualTarget(fields, settings);
    if (target === 'ask') asks.add('target');
    return {
      assumed: {
        ...additive,
        ...(target === undefined || target === 'ask' ? {} : { target }),
        ...(fields.stage === undefined ? { stage: 'finished' as const } : {}),
        ...base,
      },
      asks,
    };
  }
  if (intent === 'effect') {
    if (unknownVolume && (fields.rate_mg_L === undefined || marks.fruitByWeight)) asks.add('volume_L');
    if (!isAmount(fields) && fields.rate_mg_L === undefined && !marks.fruitByWeight) asks.add('mass_g');
    askAdditive(draft, fields, asks);
    return {
      assumed: {
        ...additive,
        ...(fields.stage === undefined ? { stage: 'finished' as const } : {}),
        ...base,
      },
      asks,
    };
  }
  if (intent === 'added') {
    if (vesselless) asks.add('vessel');
    if (fields.added_mg_L !== undefined && unknownVolume) asks.add('volume_L');
    if (!isAmount(fields) && fields.added_mg_L === undefined && fields.rate_mg_L === undefined)
      asks.add('mass_g');
    if (fields.rate_mg_L !== undefined && unknownVolume) asks.add('volume_L');
    // The log must not name a salt that nobody named: `added 1.2 L bisulfite 15%`.
    if (marks.unnamedAdditive && fields.additive === undefined) asks.add('additive');
    return { assumed: { ...additive, ...base }, asks };
  }
  if (intent === 'command' && draft.command?.name === 'order') {
    if (fields.added_mg_L !== undefined && unknownVolume) asks.add('volume_L');
    if (!isAmount(fields) && fields.added_mg_L === undefined && fields.rate_mg_L === undefined)
      asks.add('mass_g');
    askAdditive(draft, fields, asks);
    return { assumed: { ...additive, ...base }, asks };
  }
  if (intent === 'reading') {
    if (vesselless) asks.add('vessel');
    return { assumed: gallon, asks };
  }
  if (intent === 'solution') {
    if (unknownVolume) asks.add('volume_L');
    if (marks.unnamedAdditive && fields.additive === undefined) asks.add('additive');
    if (marks.solutionUse !== 'holding' && fields.strength_percent === undefined && !isAmount(fields))
      asks.add('strength_percent');
    return { assumed: { ...additive, ...base }, asks };
  }
  return { assumed: {}, asks };
}

/**
 * Works out what is assumed and what is asked for a reading. Beside a problem nothing is asked.
 *
 * @param draft What was read of it.
 * @param settings The chat's usual additive, targets and gallon.
 * @param shared Facts of the round's first line, which count as said.
 * @example
 * ```ts
 * import { READER_DEFAULTS } from './reader-defaults.ts';
 * const draft = { intent: 'dose', fields: { ph: 3.5, free_mg_L: 20 }, problems: [], setAside: [], notes: [], marks: {}, where: {} };
 * finishReading(draft, READER_DEFAULTS).asks // => ['volume_L']
 * ```
 */
export function finishReading(draft: Draft, settings: ReaderSettings, shared: Fields = {}): Reading {
  const fields = { ...shared, ...draft.fields };
  const { assumed, asks } = work(draft, fields, settings);
  return { ...draft, assumed, asks: draft.problems.length > 0 ? [] : inOrder(asks) };
}
