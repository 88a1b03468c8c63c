import { expect, test } from 'vitest';
import { ADDITIVES } from '../../../src/core/additives/additives.ts';
import type { AdditiveId } from '../../../src/core/additives/additive-id.ts';
import { notPermittedBy } from '../../../src/core/limits/permitted.ts';
import { REGIONS } from '../../../src/core/limits/region.ts';

const IDS = Object.keys(ADDITIVES) as AdditiveId[];
const POTASSIUM_OR_SO2 = IDS.filter((id) => !['sodium', 'ammonium'].includes(ADDITIVES[id].contains ?? ''));

test('potassium salts and SO2 go into wine in every market on file', () => {
  expect(POTASSIUM_OR_SO2.length).toBe(6);
  for (const region of REGIONS)
    for (const id of POTASSIUM_OR_SO2) expect(notPermittedBy(id, { region })).toBeUndefined();
});

// OIV II.1.12 and Oeno 7/2003, read: grapes and must only.
test('ammonium bisulfite goes into must and nowhere else', () => {
  for (const region of REGIONS) {
    expect(notPermittedBy('ammonium-bisulfite-solution', { region, stage: 'must' })).toBeUndefined();
    for (const stage of ['finished', 'fermenting', 'malolactic', 'base', 'bottled'] as const)
      expect(notPermittedBy('ammonium-bisulfite-solution', { region, stage })?.reason).toBe('ammonium');
  }
});

test.each([
  ['oiv', 'oiv-ii-1.12', 'read'], // neither sheet of the OIV names it, read
  ['eu', 'eu-2019-934-practices', 'unconfirmed'], // from memory
  ['uk', 'uk-2019-934-practices', 'unconfirmed'], // from memory
  ['ar', 'ar-inv-281-85', 'read'], // the wine institute's list by Resolution 281/85, read
  ['us', 'no-list-read', 'unconfirmed'],
  ['au', 'no-list-read', 'unconfirmed'],
] as const)('sodium metabisulfite for wine in %s: %s, %s', (region, rule, confidence) => {
  for (const id of ['sodium-metabisulfite', 'sodium-metabisulfite-solution'] as const)
    expect(notPermittedBy(id, { region })).toEqual({ rule, reason: 'sodium', region, confidence });
});

// Regulation 889/2008, Annex VIIIa, read; a UK certification body's notice of 17.6.2025, read: cider, mead, fruit wine too.
test.each(['eu', 'uk'] as const)('organic wine of %s takes SO2 and potassium salts only', (region) => {
  for (const id of POTASSIUM_OR_SO2) expect(notPermittedBy(id, { region, organic: true })).toBeUndefined();
  for (const product of [undefined, 'cider', 'mead', 'fruit-wine'] as const)
    expect(
      notPermittedBy('sodium-metabisulfite', { region, organic: true, ...(product && { product }) }),
    ).toMatchObject({ reason: 'organic', confidence: 'read' });
  expect(
    notPermittedBy('ammonium-bisulfite-solution', { region, organic: true, stage: 'must' })?.reason,
  ).toBe('organic');
});

// The US agency's page on organic wine, read: no added sulfite; with organic grapes some may go in (from memory).
test('wine labelled organic in the US takes no sulfite at all', () => {
  for (const id of IDS)
    expect(notPermittedBy(id, { region: 'us', organic: true })).toMatchObject({
      rule: 'us-organic',
      reason: 'organic-none',
      confidence: 'read',
    });
  expect(notPermittedBy('potassium-metabisulfite', { region: 'us', organic: 'made-with' })).toBeUndefined();
});
