import { expect, test } from 'vitest';
import { ADDITIVES } from '../../../src/core/additives/additives.ts';
import type { AdditiveId } from '../../../src/core/additives/additive-id.ts';
import { cautionsOf, type CautionId } from '../../../src/core/additives/cautions.ts';

const IDS = Object.keys(ADDITIVES) as AdditiveId[];

/** What holds for every additive: ICSC 0074, 1134, 1175 and 1254 (read); the last two common practice, no source. */
const ALWAYS: readonly CautionId[] = [
  'ventilate',
  'never-lean-in',
  'gloves-goggles',
  'no-acid-no-chlorine',
  'asthma',
  'mix-and-measure-again',
  'label-and-rules-first',
];

test.each(IDS)('%s goes with the usual cautions, each said once', (id) => {
  const cautions = cautionsOf(id);
  expect(cautions).toEqual(expect.arrayContaining([...ALWAYS]));
  expect(new Set(cautions).size).toBe(cautions.length);
});

/** The one thing that stands before all others: ICSC 0074 of the gas (read); OIV II.1.12, Oeno 7/2003 (read). */
test.each([
  ['sulfur-dioxide-gas', 'trained-people-with-breathing-apparatus'],
  ['ammonium-bisulfite-solution', 'grapes-and-must-only'],
] as const)('of %s it is said first: %s', (id, first) => {
  expect(cautionsOf(id)[0]).toBe(first);
  expect(IDS.filter((one) => cautionsOf(one).includes(first))).toEqual([id]);
});

test('a powder is dissolved first, and nothing else is', () => {
  const powders = IDS.filter((id) => ADDITIVES[id].kind === 'powder');
  expect(IDS.filter((id) => cautionsOf(id).includes('dissolve-first'))).toEqual(powders);
});
