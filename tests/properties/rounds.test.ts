import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { DoseAnswer } from '../../src/core/dose/answer.ts';
import type { Handled } from '../../src/chat/conversation/ports.ts';
import { startTalk } from '../chat/conversation/talk.ts';

/** A line of a round as people write it; some have no figure, some a slip. */
const line = fc
  .record({
    volume: fc.oneof(
      fc.integer({ min: 2, max: 400 }).map((hl) => `${hl} hl`),
      fc.integer({ min: 40, max: 9000 }).map((gal) => `${gal} gal`),
      fc.integer({ min: 20, max: 900 }).map((litres) => `${litres} L`),
    ),
    ph: fc.integer({ min: 290, max: 410 }).map((hundredths) => (hundredths / 100).toFixed(2)),
    free: fc.integer({ min: 0, max: 60 }),
    additive: fc.constantFrom(
      '',
      '',
      'kmbs',
      '10% kmbs solution',
      '6% so2',
      '5 g tabs',
      '0.44 g potassium campden',
    ),
    target: fc.constantFrom('', '', 'target free 35', 'target 0.5 mol', '+30%', 'add 20 ppm SO2'),
    slip: fc.constantFrom('', '', '', '', 'pH 36', 'no free'),
  })
  .map(({ volume, ph, free, additive, target, slip }) =>
    [
      volume,
      slip === 'pH 36' ? slip : `pH ${ph}`,
      slip === 'no free' ? '' : `free ${free}`,
      target,
      additive === '' ? '' : `, ${additive}`,
    ]
      .filter((part) => part !== '')
      .join(' '),
  );

/** Figures of an answer: what is weighed, and what it does. */
function figuresOf({ answers }: Handled, at: number): Partial<DoseAnswer> | null {
  const answer = (answers?.[at] ?? null) as DoseAnswer | null;
  if (answer === null) return null;
  const { measure, stock, dose_mg_L, free_after_mg_L, choices, capped, add_mg_L } = answer;
  return {
    ...(measure && { measure }),
    ...(stock && { stock }),
    ...(dose_mg_L !== undefined && { dose_mg_L }),
    ...(add_mg_L !== undefined && { add_mg_L }),
    ...(free_after_mg_L !== undefined && { free_after_mg_L }),
    ...(choices && { choices }),
    ...(capped && { capped }),
  };
}

test('a round gives each vessel what it would get alone: 200 rounds', async () => {
  await fc.assert(
    fc.asyncProperty(fc.array(line, { minLength: 2, maxLength: 4 }), async (lines) => {
      const named = lines.map((text, at) => `T${at + 1} ${text}`);
      const round = await startTalk().write(named.join('\n'));
      expect(round.understood?.readings).toHaveLength(lines.length);
      for (const [at, text] of named.entries())
        expect({ text, figures: figuresOf(round, at) }).toEqual({
          text,
          figures: figuresOf(await startTalk().write(text), 0),
        });
    }),
    { numRuns: 200 },
  );
}, 60_000);

test('what a round takes in all is what its lines show: 200 rounds of one powder', async () => {
  const plain = fc.record({
    hl: fc.integer({ min: 1, max: 300 }),
    ph: fc.integer({ min: 300, max: 360 }),
    free: fc.integer({ min: 5, max: 20 }),
  });
  await fc.assert(
    fc.asyncProperty(fc.array(plain, { minLength: 2, maxLength: 20 }), async (lines) => {
      const text = lines.map(
        ({ hl, ph, free }, at) => `T${at + 1} ${hl} hl pH ${(ph / 100).toFixed(2)} free ${free}`,
      );
      const { answers, round } = await startTalk().write(text.join('\n'));
      // What is too little to be worth a weighing is told as nothing to add.
      const shown = (answers as DoseAnswer[])
        .filter(({ warnings }) => warnings.every(({ code }) => code !== 'addition-negligible'))
        .map(({ capped, measure }) => (capped ?? { measure }).measure);
      const grams = shown.map((one) =>
        one === undefined ? 0 : one.unit === 'kg' ? one.value * 1000 : one.value,
      );
      const sum = grams.reduce((all, one) => all + one, 0);
      expect(round?.totals[0]?.mass_g ?? 0).toBeCloseTo(sum, 6);
    }),
    { numRuns: 200 },
  );
});
