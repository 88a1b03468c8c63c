import type { AdditiveAtHand } from '../../core/additives/additive-id.ts';
import type {
  AddedRequest,
  DoseRequest,
  EffectRequest,
  SolutionRequest,
  StatedAmount,
  WineFacts,
} from '../../core/dose/request.ts';
import type { OxygenAtBottling } from '../../core/dose/oxygen-loss.ts';
import { litresTo } from '../../core/units/volume.ts';
import { fruitOf } from '../reader/finish-reading.ts';
import type { AskedField, Fields, Reading } from '../reader/understood.ts';
import type { Settings } from './settings.ts';

/** While one of these is asked, the additive is not settled and no amount of it may be given. */
const SETTLES_ADDITIVE: readonly AskedField[] = [
  'additive',
  'strength_percent',
  'tablet_salt_g',
  'tablet_SO2_g',
];

/** `{ [key]: value }` for those of the keys that are there: a request never carries an undefined key. */
function pick<K extends keyof Fields>(fields: Fields, keys: readonly K[]): Pick<Fields, K> {
  return Object.fromEntries(
    keys.flatMap((key) => (fields[key] === undefined ? [] : [[key, fields[key]]])),
  ) as Pick<Fields, K>;
}

/**
 * The additive of a reading as it stands in the cellar, said or assumed; undefined while its name, strength or
 * size is still asked.
 */
export function additiveOf(reading: Reading): AdditiveAtHand | undefined {
  const id = reading.fields.additive ?? reading.assumed.additive;
  if (id === undefined || reading.asks.some((field) => SETTLES_ADDITIVE.includes(field))) return undefined;
  const { strength_percent: usual, strength_of } = reading.assumed;
  const isUsual = usual !== undefined && reading.fields.strength_percent === undefined;
  return {
    id,
    ...(usual !== undefined && { strength_percent: usual }),
    ...pick(reading.fields, ['strength_percent', 'tablet_SO2_g', 'tablet_salt_g']),
    ...(isUsual && strength_of && { strength_of }),
    ...(reading.strength_of && { strength_of: reading.strength_of }),
  };
}

/** How many equal vessels or barrels the volume is the sum of; undefined for one. */
export function countOf(reading: Reading): number | undefined {
  const count = reading.fields.vessels?.length ?? reading.containers ?? 1;
  return count > 1 ? count : undefined;
}

/** The volume in litres, and as it was written, so that the working shows the person's own figure. */
function volumeOf({
  fields,
  assumed,
  volumeUnit,
}: Reading): Pick<DoseRequest, 'volume_L' | 'volume_display'> {
  const volume_L = fields.volume_L ?? assumed.volume_L;
  if (volume_L === undefined) return {};
  if (volumeUnit === undefined || volumeUnit === 'barrel') return { volume_L };
  const value = Number(litresTo(volume_L, volumeUnit).toPrecision(12));
  return { volume_L, volume_display: { value, unit: volumeUnit } };
}

/** The oxygen that is allowed for at bottling. */
function oxygenIn({ marks: { oxygen_mg_L, SO2_mg_per_mg_O2 } }: Reading): OxygenAtBottling {
  return {
    ...(oxygen_mg_L !== undefined && { oxygen_mg_L }),
    ...(SO2_mg_per_mg_O2 !== undefined && { SO2_mg_per_mg_O2 }),
  };
}

/** The fruit of which the volume is the must, so that the working begins with it. */
function fruitIn({ fields, assumed, marks }: Reading): Pick<DoseRequest, 'fruit'> {
  const fruit = fields.volume_L === undefined ? fruitOf(marks, assumed) : undefined;
  return fruit === undefined ? {} : { fruit };
}

/** Whether the wine is organic; in the US one "made with organic grapes" is of a class of its own. */
export function organicOf({ fields, marks }: Reading, region: Settings['region']): WineFacts['organic'] {
  return region === 'us' && marks.ofOrganicFruit ? 'made-with' : fields.organic;
}

/** What is known of the wine; the law of the market is the cellar's. */
function wineOf(reading: Reading, { region }: Pick<Settings, 'region'>): WineFacts {
  const { fields, totalOf } = reading;
  const organic = organicOf(reading, region);
  return {
    region,
    ...(fields.total_mg_L !== undefined && {
      total_from: totalOf === undefined ? ('measured' as const) : ('running-sum' as const),
    }),
    ...pick(fields, WINE_FIELDS),
    ...(organic !== undefined && { organic }),
  };
}

const WINE_FIELDS = [
  'ph',
  'free_mg_L',
  'total_mg_L',
  'temperature_C',
  'alcohol_percent',
  'sugar_g_L',
  'style',
  'category',
  'product',
  'designated_mg_L',
  'uplift',
  'quality',
  'pdo',
  'bulk',
  'density_kg_L',
  'reserve_mg_L',
] as const satisfies readonly (keyof Fields)[];

function amountOf({ fields }: Reading): StatedAmount {
  return pick(fields, ['mass_g', 'additive_volume_mL', 'tablets', 'rate_mg_L', 'added_mg_L']);
}

function stageOf({ fields, assumed }: Reading): Pick<DoseRequest, 'stage' | 'stageStated'> {
  return { stage: fields.stage ?? assumed.stage ?? 'finished', stageStated: fields.stage !== undefined };
}

function optionalAdditive(reading: Reading): { additive?: AdditiveAtHand } {
  const additive = additiveOf(reading);
  return additive === undefined ? {} : { additive };
}

/** The question for a dose that a reading asks. Assumptions count as facts; what is asked stays out. */
export function toDoseRequest(
  reading: Reading,
  settings: Pick<Settings, 'basis' | 'region' | 'targets'>,
): DoseRequest {
  const { basis, targets } = settings;
  const count = countOf(reading);
  const target = reading.asks.includes('target')
    ? undefined
    : (reading.fields.target ?? reading.assumed.target);
  return {
    ...wineOf(reading, settings),
    ...volumeOf(reading),
    ...fruitIn(reading),
    ...oxygenIn(reading),
    ...(count !== undefined && { vessels: count }),
    ...optionalAdditive(reading),
    ...(target !== undefined && { target }),
    targetStated: reading.fields.target !== undefined,
    ...stageOf(reading),
    ...pick(reading.fields, ['binding_allowance_percent', 'binding_share']),
    basis,
    red_target_mg_L: targets.red,
  };
}

/** The question for what an amount does. */
export function toEffectRequest(
  reading: Reading,
  settings: Pick<Settings, 'basis' | 'region'>,
): EffectRequest {
  return {
    ...wineOf(reading, settings),
    ...amountOf(reading),
    ...volumeOf(reading),
    ...optionalAdditive(reading),
    ...stageOf(reading),
    toStopFermentation: reading.notes.some(({ id }) => id === 'ferment-stop'),
    basis: settings.basis,
  };
}

/** The addition that was made. */
export function toAddedRequest(reading: Reading): AddedRequest {
  return { ...amountOf(reading), ...volumeOf(reading), ...optionalAdditive(reading) };
}

/** What a solution in water is for, where it is no stock. */
const USES = { holding: 'holding', cleaning: 'rinse' } as const;

/** What goes into a holding solution or a rinse: of no strength of its own, metabisulfite powder. */
function powderForUse({ fields, assumed }: Reading): AdditiveAtHand | undefined {
  const id = fields.additive ?? assumed.additive ?? '';
  if (fields.additive !== undefined && !id.includes('metabisulfite')) return undefined;
  return { id: id.startsWith('sodium') ? 'sodium-metabisulfite' : 'potassium-metabisulfite' };
}

/** The solution that is to be made up; undefined while its volume or its salt is asked. */
export function toSolutionRequest(reading: Reading): SolutionRequest | undefined {
  const { fields, marks } = reading;
  const { volume_L, ...shown } = volumeOf(reading);
  const { solutionUse } = marks;
  const use = solutionUse === 'holding' || solutionUse === 'cleaning' ? USES[solutionUse] : undefined;
  const amounts = pick(fields, ['mass_g', 'additive_volume_mL']);
  const isByRecipe =
    use !== undefined && fields.strength_percent === undefined && Object.keys(amounts).length === 0;
  const additive = isByRecipe ? powderForUse(reading) : additiveOf(reading);
  if (additive === undefined || volume_L === undefined) return undefined;
  const { target } = fields;
  return {
    volume_L,
    ...shown,
    additive,
    ...amounts,
    ...pick(fields, ['temperature_C']),
    ...(use !== undefined && { use }),
    ...(target !== undefined && 'add_mg_L' in target && target.add_mg_L > 0
      ? { rise_mg_L: target.add_mg_L }
      : {}),
  };
}
