import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import { ADDITIVES } from '../../../core/additives/additives.ts';
import { fruitOf } from '../../reader/finish-reading.ts';
import type { FieldName, Fields, Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import { volumeText } from '../../replies/volume-text.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import type { Manner } from '../manner.ts';
import { countOf } from '../to-requests.ts';
import { partsOf, strengthKind } from './facts.ts';
import { listLine, part } from './line.ts';
import { noteParts, saltFactor } from './notes.ts';
import { targetValues } from './target-text.ts';

type Part = Omit<Line, 'room'>;

/**
 * What the bot filled in, how it read what could be read otherwise, and which figures it did not use. Without a dose
 * (`weighs` false) no additive is spoken of.
 */
export function assumedLines(reading: Reading, manner: Manner, weighs = true): Line[] {
  const set = reading.setAside.map((text) => part('set-aside-figure', { text }));
  return [
    ...listLine('assumed', 'assumed', [
      ...recalledParts(reading, manner, weighs),
      ...filledIn(reading, manner, weighs),
      ...noteParts(reading, manner),
    ]),
    ...listLine('assumed', 'set-aside', set),
  ];
}

/** What is known of the vessel and was not said, each with the day that it is of. */
function recalledParts(reading: Reading, manner: Manner, weighs: boolean): Part[] {
  const { recalled = {}, fields } = reading;
  return Object.entries(recalled).flatMap(([name, at]): Part[] => {
    if (name === 'binding_allowance_percent')
      return [
        part('recalled-allowance', {
          percent: numberText(fields.binding_allowance_percent ?? 0, 1, manner.mark),
        }),
      ];
    if (name === 'strength_percent' || (name === 'additive' && !weighs)) return [];
    const day = manner.day(at);
    if (name === 'total_mg_L' && reading.totalOf) return [totalSum(reading.totalOf, fields, day, manner)];
    if (name === 'additive') return [part('recalled-additive', { day, additive: fields.additive ?? '' })];
    const value = { [name]: fields[name as FieldName] } as Fields;
    return [{ ...part('recalled', { day }), list: partsOf(reading, value, manner) }];
  });
}

/** A total that is a sum: what was measured, and what went in since. */
function totalSum(
  { measured_mg_L, since_mg_L }: NonNullable<Reading['totalOf']>,
  { total_mg_L = 0 }: Fields,
  day: string,
  { mark }: Manner,
): Part {
  const said = (value: number): string => numberText(value, 1, mark);
  return part('total-sum', {
    total: said(total_mg_L),
    measured: said(measured_mg_L),
    since: said(since_mg_L),
    day,
  });
}

function filledIn(reading: Reading, manner: Manner, weighs: boolean): Part[] {
  const { assumed, fields, asks, marks } = reading;
  const parts: Part[] = [];
  const additive = assumed.additive ?? powderWithoutPurity(reading);
  const strength = assumed.additive === undefined ? undefined : assumed.strength_percent;
  if (weighs && additive !== undefined && !asks.includes('additive'))
    parts.push(
      strength === undefined
        ? part('assumed-additive', { additive })
        : part('fact-strength', {
            additive,
            strength: numberText(strength, 2, manner.mark),
            kind: strengthKind(additive, strength),
          }),
    );
  if (weighs && additive !== undefined && assumed.strength_of)
    parts.push(part('note-strength-as-salt', { factor: saltFactor(additive, manner) }));
  if (assumed.target) parts.push(part(targetKey(fields), targetValues(assumed.target, manner)));
  if (assumed.gallon) parts.push(part('assumed-gallon', { gallon: assumed.gallon }));
  const fruit = fruitOf(marks, assumed);
  if (assumed.volume_L !== undefined && fruit !== undefined)
    parts.push(
      part(assumed.yield_L_per_100_kg === undefined ? 'assumed-must' : 'assumed-must-usual', {
        fruit: numberText(fruit.fruit_kg, 1, manner.mark),
        yield: numberText(fruit.yield_L_per_100_kg, 1, manner.mark),
        volume: volumeText(assumed.volume_L, manner.volumeUnit, manner.mark),
      }),
    );
  else if (assumed.volume_L !== undefined)
    parts.push(
      part('assumed-barrels', {
        volume: volumeText(assumed.volume_L, 'L', manner.mark),
        count: countOf(reading) === undefined ? 'one' : 'several',
      }),
    );
  return parts;
}

/** A powder that was named without its purity is reckoned as pure too. */
function powderWithoutPurity({ intent, fields, marks, recalled }: Reading): AdditiveId | undefined {
  const { additive, strength_percent, tablet_salt_g } = fields;
  if (additive === undefined || ADDITIVES[additive].kind !== 'powder' || marks.campden) return undefined;
  if (recalled?.additive !== undefined) return undefined;
  if (strength_percent !== undefined || tablet_salt_g !== undefined) return undefined;
  return intent === 'dose' || intent === 'effect' || intent === 'added' ? additive : undefined;
}

function targetKey(fields: Reading['fields']): SentenceKey {
  if (fields.category === 'sweet') return 'assumed-target-sweet';
  return fields.style === 'red' ? 'assumed-target-red' : 'assumed-target';
}
