import type { SourceKey } from './sources.ts';

/** What is the same in every line of one name. */
export interface StepKind {
  readonly symbol: string;
  readonly formula: string;
  readonly source?: SourceKey;
}

/**
 * The lines that a working can have. The name is the key of the line's sentence in the locales.
 * Symbols: M molecular, F free, A wanted rise, D what goes in, S grams of SO2, m additive in grams,
 * v additive in millilitres, n tablets, V wine.
 */
export const STEP_KINDS = {
  dissociation: {
    symbol: 'pK',
    formula: 'between the four nearest values by alcohol and temperature',
    source: 'oiv-as323-04c-table-2',
  },
  'molecular-now': { symbol: 'M', formula: 'free SO2 ÷ (10^(pH − pK) + 1)' },
  'free-needed': { symbol: 'F', formula: 'target molecular SO2 × (10^(pH − pK) + 1)' },
  'oxygen-loss': { symbol: 'L', formula: 'oxygen × SO2 for 1 mg of it' },
  'free-before-bottling': { symbol: 'F', formula: 'free SO2 wanted at bottling + what oxygen takes' },
  addition: { symbol: 'A', formula: 'free SO2 wanted − free SO2 now' },
  'dose-with-allowance': { symbol: 'D', formula: 'addition × (1 + allowance)' },
  'dose-with-share': { symbol: 'D', formula: 'addition ÷ (1 − share that binds)' },
  'volume-in-litres': { symbol: 'V', formula: 'volume × litres in one unit of it' },
  'room-to-limit': { symbol: 'D', formula: 'limit − what is kept below it − SO2 now' },
  'must-of-fruit': { symbol: 'V', formula: 'fruit × litres from 100 kg ÷ 100 kg' },
  'so2-mass': { symbol: 'S', formula: 'SO2 that goes in × volume ÷ 1000' },
  'so2-mass-each': { symbol: 'S', formula: 'SO2 that goes in × volume of one vessel ÷ 1000' },
  'all-vessels': { symbol: 'm', formula: 'amount for one vessel × number of vessels' },
  'additive-mass': { symbol: 'm', formula: 'SO2 ÷ share of SO2 in the additive', source: 'ciaaw-2021' },
  'additive-mass-by-assay': {
    symbol: 'm',
    formula: 'SO2 ÷ (assay of the powder × share of SO2 in the pure salt)',
    source: 'ciaaw-2021',
  },
  'additive-mass-by-yield': { symbol: 'm', formula: 'SO2 ÷ stated SO2 yield of the powder', source: 'label' },
  'additive-volume-by-salt': {
    symbol: 'v',
    formula: 'SO2 ÷ (salt in the solution × share of SO2 in the salt)',
    source: 'ciaaw-2021',
  },
  'additive-volume-by-so2': { symbol: 'v', formula: 'SO2 ÷ SO2 in the solution', source: 'label' },
  'tablets-by-so2': { symbol: 'n', formula: 'SO2 ÷ SO2 that one tablet gives', source: 'label' },
  'tablets-by-salt': {
    symbol: 'n',
    formula: 'SO2 ÷ (salt in one tablet × share of SO2 in the salt)',
    source: 'ciaaw-2021',
  },
  'gas-by-purity': { symbol: 'm', formula: 'SO2 ÷ purity of the gas', source: 'label' },
  'so2-in-amount': { symbol: 'S', formula: 'amount of additive × SO2 in it' },
  'added-concentration': { symbol: 'A', formula: 'SO2 × 1000 ÷ volume' },
  'added-by-rate': { symbol: 'A', formula: 'rate of additive × share of SO2 in it' },
  'mass-by-rate': { symbol: 'm', formula: 'rate of additive × volume ÷ 1000' },
  'free-after': { symbol: 'F', formula: 'free SO2 now + SO2 that goes in' },
  'molecular-after': { symbol: 'M', formula: 'free SO2 after ÷ (10^(pH − pK) + 1)' },
  'salt-mass': { symbol: 'm', formula: 'salt in 100 mL ÷ 0.1 L × volume' },
  'salt-by-recipe': { symbol: 'm', formula: 'salt in a litre × volume', source: 'common-practice' },
  'citric-acid-by-recipe': {
    symbol: 'k',
    formula: 'citric acid in a litre × volume',
    source: 'common-practice',
  },
  'added-by-one-millilitre': { symbol: 'A', formula: '1 mL × SO2 in the stock ÷ volume of the barrel' },
  'stock-for-a-barrel': { symbol: 'v', formula: 'rise × volume of the barrel ÷ SO2 in the stock' },
  'solution-strength': { symbol: 'c', formula: 'SO2 that goes in ÷ volume of the solution × 0.1 L' },
  'solution-strength-by-salt': {
    symbol: 'c',
    formula: 'salt in the solution × share of SO2 in the salt',
    source: 'ciaaw-2021',
  },
  'titrant-normality': { symbol: 'N', formula: '2 × molarity of the iodine', source: 'iodine-equivalents' },
  'iodate-normality': {
    symbol: 'N',
    formula: '6 × iodate ÷ its molar mass ÷ volume of the flask',
    source: 'iupac-conventional',
  },
  'titrant-used': { symbol: 'n', formula: 'titrant − blank' },
  'so2-by-titration': {
    symbol: 'C',
    formula: '32 000 × normality × titrant ÷ sample',
    source: 'titration-general',
  },
  'ascorbic-counted': {
    symbol: 'C',
    formula: 'ascorbic acid × molar mass of SO2 ÷ molar mass of ascorbic acid',
    source: 'iupac-conventional',
  },
  'so2-without-ascorbic': { symbol: 'C', formula: 'titrated − what the ascorbic acid counts as' },
  'spread-of-need': { symbol: '±', formula: 'target × 10^(pH − pK) × ln 10 × ± of the pH' },
  'spread-of-dose': { symbol: '±', formula: 'root of the sum of both squared' },
  'dose-lowest': { symbol: 'D', formula: 'SO2 that goes in − its ±' },
  'dose-highest': { symbol: 'D', formula: 'SO2 that goes in + its ±' },
  'molecular-sure': {
    symbol: 'M',
    formula: 'molecular SO2 after × (1 − root of the sum of both relative ± squared)',
  },
  'blend-free': { symbol: 'F', formula: '(free × volume + free × volume) ÷ both volumes' },
  'blend-total': { symbol: 'T', formula: '(total × volume + total × volume) ÷ both volumes' },
} as const satisfies Readonly<Record<string, StepKind>>;

/** Which line of a working. */
export type StepName = keyof typeof STEP_KINDS;

/**
 * All names, so that the locales can be checked against them.
 *
 * @example
 * ```ts
 * STEP_NAMES.includes('free-needed') // => true
 * ```
 */
export const STEP_NAMES = Object.keys(STEP_KINDS) as readonly StepName[];
