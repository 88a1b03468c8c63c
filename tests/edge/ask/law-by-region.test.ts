import { PassThrough, Readable } from 'node:stream';
import { expect, test } from 'vitest';
import type { DoseAnswer } from '../../../src/core/dose/answer.ts';
import type { LimitFacts } from '../../../src/core/limits/limit-facts.ts';
import type { Region } from '../../../src/core/limits/region.ts';
import { runAsk } from '../../../src/edge/ask/run-ask.ts';
import { SULFITE_LIMITS, type LimitCase } from '../../tables/sulfite-limits.ts';

/** A message of the table's wine as somebody writes it, so that 20 mg/L bring the one in question to `SO2_mg_L`. */
function written({ facts, of }: LimitCase, SO2_mg_L: number): string {
  const before = Number((SO2_mg_L - 20).toFixed(2));
  const total = of === 'free' ? before + 10 : before;
  const readings = `free ${of === 'free' ? before : Math.min(10, total)}, total ${total}`;
  return `${nameOf(facts)}, 10 hl${saidOf(facts)}, pH 3.3, ${readings}, add 20 ppm, kmbs, ML done`;
}

function nameOf({ style, category, product, organic, quality, pdo }: LimitFacts): string {
  const sparkling = quality === undefined ? 'sparkling' : quality ? 'quality sparkling' : 'other sparkling';
  const kind = category === 'sparkling' ? sparkling : category;
  const wine = product === undefined ? 'wine' : product === 'alcohol-free' ? 'alcohol-free wine' : product;
  return [pdo && 'PDO', organic === true && 'organic', style, kind, wine].filter(Boolean).join(' ');
}

function saidOf({ sugar_g_L, designated_mg_L, density_kg_L, uplift, bulk }: LimitFacts): string {
  return [
    sugar_g_L !== undefined && `, RS ${sugar_g_L} g/L`,
    designated_mg_L !== undefined && `, designated ${designated_mg_L}`,
    density_kg_L !== undefined && `, density ${density_kg_L.toFixed(3)}`,
    uplift && ', declared year',
    bulk && ', in bulk',
  ]
    .filter(Boolean)
    .join('');
}

async function answersIn(region: Region, texts: readonly string[]): Promise<(DoseAnswer | undefined)[]> {
  const output = new PassThrough({ encoding: 'utf8' });
  let out = '';
  output.on('data', (chunk) => (out += String(chunk)));
  const input = texts.map((text, id) => JSON.stringify({ id, text })).join('\n');
  await runAsk({
    args: ['--jsonl', '--region', region],
    input: Readable.from([input]),
    output,
    tell: () => undefined,
    now: () => Date.parse('2026-10-05T12:00:00Z'),
  });
  return out
    .trimEnd()
    .split('\n')
    .map((line) => (JSON.parse(line) as { answers: (DoseAnswer | undefined)[] }).answers[0]);
}

const CASES = SULFITE_LIMITS.flatMap(({ cases }) => cases);
const REGIONS = [...new Set(CASES.map(({ facts }) => facts.region ?? 'oiv'))];

// The figures are the table's, typed from the texts that it names.
test.each(REGIONS)(
  'what is written of a wine meets the law of %s on both sides of each figure',
  async (region) => {
    const cases = CASES.filter(({ facts }) => (facts.region ?? 'oiv') === region);
    const within = await answersIn(
      region,
      cases.map((one) => written(one, one.passes)),
    );
    const over = await answersIn(
      region,
      cases.map((one) => written(one, one.fails)),
    );
    for (const [at, one] of cases.entries()) {
      const { rule, of = 'total', fails } = one;
      const codes = within[at]?.warnings.map(({ code }) => code) ?? ['none'];
      expect([written(one, one.passes), codes.filter((code) => /over-limit|none/.test(code))]).toEqual([
        written(one, one.passes),
        [],
      ]);
      expect(within[at]).not.toHaveProperty('capped');
      expect([written(one, fails), over[at]?.limit]).toMatchObject([written(one, fails), { rule, of }]);
      expect(over[at]?.warnings.map(({ code }) => code)).toContain(`${of}-over-limit`);
      expect(over[at]?.capped?.dose_mg_L).toBeLessThan(20);
      expect(over[at]?.dose_mg_L).toBe(20);
    }
  },
);
