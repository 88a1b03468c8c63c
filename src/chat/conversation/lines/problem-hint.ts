import type { Reading } from '../../reader/understood.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';

/** Which kind of figure can be read in more than one way: each has its own way to write it plainly. */
export type DoubtKind =
  | 'split' // a blank inside a decimal
  | 'volume' // a volume that could be off by a thousand
  | 'mass' // a mass that could be
  | 'thousands' // another figure that could be
  | 'powder' // SO2 or the powder
  | 'salt' // a bisulfite's strength: of SO2 or of the salt
  | 'water' // SO2 in water, or a stock of metabisulfite
  | 'percent' // alcohol or a strength
  | 'SO2-percent' // alcohol, SO2 in water or a stock
  | 'degree' // alcohol or temperature
  | 'to' // from one figure to another, or a range
  | 'range'
  | 'pair' // free and total, or a reading between two marks
  | 'free' // free or total
  | 'aim' // an addition or a target
  | 'other';

/** What a sentence about such a figure takes: its kind, and the person's own figures as they can be written plainly. */
export interface Hint {
  readonly kind: DoubtKind;
  readonly one: string;
  readonly two: string;
  readonly named: string;
}

/** Longer figures than this are slips; own threshold. */
const MOST_DIGITS = 9;

/** More than any wine holds, in mg/L of SO2; own threshold. */
const MOST_mg_L = 1000;

const NUMBER = /\d+(?:[.,]\d+)?/g;

/** The way to write a figure plainly, made of the person's own words and figures. */
export function hintFor(reading: Reading, words: string, mark: DecimalMark): Hint {
  const about = withoutSO2(words);
  const [first = '', second = ''] = about.match(NUMBER) ?? [];
  const none = { one: first, two: second, named: '' };
  const { fields } = reading;
  const { additive } = fields;
  // A figure of a titration is no SO2, and what no wine has is no figure to write otherwise.
  if (reading.intent === 'titration' || first.length > MOST_DIGITS || second.length > MOST_DIGITS)
    return { kind: 'other', one: '', two: '', named: '' };
  const split = /(\d)[.,]\s+(\d+)/.exec(about);
  if (split) return { ...none, kind: 'split', one: `${split[1]}${mark}${split[2]}` };
  const thousands = /^\D*?(\d{1,3})[.,](\d{3})\s*(\p{L}[\p{L}\d]*)?$/u.exec(about);
  if (thousands) return offByThousand(thousands[1] ?? '', thousands[2] ?? '', thousands[3] ?? '', mark);
  if (/%/.test(about)) return { ...none, kind: percentKind(reading), named: stockName(reading) };
  if (/°/.test(about)) return { ...none, kind: 'degree' };
  if (/^\D*\d[\d.,]*\s*[-–]\s*\d/.test(about)) return { ...none, kind: isPh(first) ? 'other' : 'range' };
  if (/^\d+\s*\/\s*\d+/.test(about)) return { ...none, kind: 'pair' };
  if (second !== '' && /^\d+\s+\p{L}+\s+\d+$/u.test(about)) return { ...none, kind: 'to' };
  const named = additive === undefined ? '' : (reading.where.additive?.text ?? '');
  const hint = ofConcentration(about, first, { named, mark });
  return hint.kind === 'free' && fields.free_mg_L !== undefined ? { ...hint, kind: 'other' } : hint;
}

/** A person's words without "SO2", whose 2 is no figure. */
export function withoutSO2(words: string): string {
  return words.replace(/\bso[2₂]/giu, '').trim();
}

function isPh(text: string): boolean {
  return /^[2-4][.,]\d+$/.test(text);
}

/** A figure in mg/L, or alone: of SO2 or powder beside an additive, else free or total, or an aim after a verb. */
function ofConcentration(
  about: string,
  first: string,
  { named, mark }: { readonly named: string; readonly mark: DecimalMark },
): Hint {
  const isPerHectolitre = /g\s*(\/|\p{L}+)\s*h/iu.test(about);
  const mg_L = Number(first.replace(',', '.')) * (isPerHectolitre ? 10 : 1);
  if (!(mg_L <= MOST_mg_L)) return { kind: 'other', one: '', two: '', named };
  const one = plain(mg_L, mark);
  const hasUnit = isPerHectolitre || /ppm|mg/i.test(about);
  if (hasUnit && named !== '') return { kind: 'powder', one, two: plain(mg_L / 100, mark), named };
  if (isPerHectolitre || /^\s*[\d.,]+\s*(ppm|mg\/l)?$/i.test(about))
    return { kind: first === '' || isPh(first) ? 'other' : 'free', one, two: '', named };
  return { kind: hasUnit ? 'aim' : 'other', one, two: '', named };
}

function plain(value: number, mark: DecimalMark): string {
  return numberText(value, 4, mark).replace(/\s/g, '');
}

/** Both figures written so that no mark is left that could part thousands. */
function offByThousand(whole: string, broken: string, unit: string, mark: DecimalMark): Hint {
  const large = `${Number(whole + broken)} ${unit}`.trim();
  const small = Number(`${whole}.${broken}`);
  if (unit.toLowerCase() === 'kg')
    return { kind: 'mass', one: large, two: `${Number(whole + broken)} g`, named: '' };
  const two = `${String(Number(small.toFixed(2))).replace('.', mark)} ${unit}`.trim();
  if (/^(l|hl|gal|m3)/i.test(unit)) return { kind: 'volume', one: large, two, named: '' };
  return { kind: /^(g|lb|oz)$/i.test(unit) ? 'mass' : 'thousands', one: large, two, named: '' };
}

function percentKind({ fields, where }: Reading): DoubtKind {
  if (fields.additive === 'sulfur-dioxide-solution') return 'water';
  if (fields.additive?.endsWith('bisulfite-solution') && !fields.additive.includes('meta')) return 'salt';
  return fields.additive === undefined || where.additive === undefined ? 'SO2-percent' : 'percent';
}

/** The salt whose solution may be meant, as an id: potassium unless another was named. */
function stockName({ fields }: Reading): string {
  return fields.additive ?? 'potassium-metabisulfite';
}
