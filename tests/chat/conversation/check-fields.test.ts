import { describe, expect, test } from 'vitest';
import { checkFields } from '../../../src/chat/conversation/check-fields.ts';
import { emptyReading } from '../../../src/chat/reader/empty-reading.ts';
import type { Fields, Reading } from '../../../src/chat/reader/understood.ts';

const reading = (fields: Fields, more: Partial<Reading> = {}): Reading =>
  emptyReading('dose', { fields, asks: ['volume_L'], ...more });

describe('figures that were said apart must fit each other', () => {
  test.each<[Fields, string[]]>([
    [{ ph: 3.5, free_mg_L: 18, total_mg_L: 60 }, []],
    [{ free_mg_L: 60, total_mg_L: 18 }, ['total-below-free']],
    [{ free_mg_L: 18, total_mg_L: 18 }, []],
    [{ additive: 'potassium-metabisulfite-solution', strength_percent: 10 }, []],
    [{ additive: 'potassium-metabisulfite-solution', strength_percent: 40 }, ['strength-out-of-range']],
    [{ additive: 'potassium-metabisulfite', strength_percent: 70 }, ['strength-out-of-range']],
    [{ additive: 'sulfur-dioxide-solution', strength_percent: 10 }, ['ambiguous-number']],
    [{ additive: 'potassium-bisulfite-solution', strength_percent: 30 }, ['ambiguous-number']],
    [{ ph: 36 }, ['ph-out-of-range']],
    [{ volume_L: 0 }, ['value-out-of-range']],
    [{ mass_g: 1e9 }, ['value-out-of-range']],
    [{ target: { free_mg_L: 5000 } }, ['value-out-of-range']],
    [{ target: { add_mg_L: 30 } }, []],
    [{ tablet_salt_g: 0 }, ['value-out-of-range']],
  ])('%j: %j', (fields, codes) => {
    expect(checkFields(reading(fields)).problems.map(({ code }) => code)).toEqual(codes);
  });

  test('also where one of them stands in the first line of a round', () => {
    const shared: Fields = { additive: 'sodium-metabisulfite', strength_percent: 10 };
    expect(checkFields(reading({ volume_L: 900 }), shared).problems).toHaveLength(1);
  });

  test('a bisulfite strength of the salt is no slip', () => {
    const fields: Fields = { additive: 'potassium-bisulfite-solution', strength_percent: 30 };
    expect(checkFields(reading(fields, { strength_of: 'salt' })).problems).toEqual([]);
  });
});

test('with a problem nothing is asked, the figures it is about are left out and the others stay', () => {
  const checked = checkFields(reading({ ph: 3.5, free_mg_L: 60, total_mg_L: 18 }));
  expect([checked.asks, checked.fields]).toEqual([[], { ph: 3.5 }]);
});

test('a reading that has a problem already stays as it is', () => {
  const slip = reading({ ph: 3.5 }, { problems: [{ code: 'ambiguous-number', about: '12°' }] });
  expect(checkFields(slip)).toBe(slip);
});
