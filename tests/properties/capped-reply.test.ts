import fc from 'fast-check';
import { expect, test } from 'vitest';
import { dose } from '../../src/core/dose/dose.ts';
import { play, readScene } from '../dialogues/scene.ts';

/** A red wine under EU law, of which as much may be there as the law lets be and more; figures in mg/L. */
const wine = fc.record({
  ph_hundredths: fc.integer({ min: 320, max: 380 }),
  free_mg_L: fc.integer({ min: 0, max: 40 }),
  total_mg_L: fc.integer({ min: 90, max: 170 }),
  volume_hL: fc.integer({ min: 1, max: 300 }),
});

test('of a dose that passes a limit no amount shows before the rule has been agreed to', async () => {
  const seen = { capped: 0, whole: 0 };
  await fc.assert(
    fc.asyncProperty(wine, async ({ ph_hundredths, free_mg_L, total_mg_L, volume_hL }) => {
      const ph = ph_hundredths / 100;
      const answer = dose({
        region: 'eu',
        style: 'red',
        sugar_g_L: 2,
        ph,
        free_mg_L,
        total_mg_L,
        volume_L: volume_hL * 100,
        additive: { id: 'potassium-metabisulfite' },
        target: { add_mg_L: 30 },
        targetStated: true,
        stage: 'finished',
        stageStated: true,
        basis: 'pk-1.81',
      });
      const said = `T4 ${volume_hL} hl red RS 2 pH ${ph} free ${free_mg_L} total ${total_mg_L} add 30 ppm ML done`;
      const scene = `# t\nthem: law EU\n\nthem: ${said}\n\nthem: full dose\n\nthem: yes\n`;
      const [, first = [], asked = [], full = []] = await play(readScene(scene));
      const full_weigh = /weigh ([\d.\u202f ]+ k?g)/u;
      if (answer.capped === undefined) {
        seen.whole++;
        expect(first[0]).toMatch(full_weigh);
        expect(asked[0]).toContain('no dose above');
        return;
      }
      seen.capped++;
      const amount = full_weigh.exec(full.join('\n'))?.[1] ?? 'none';
      expect(amount).not.toBe('none');
      expect(full.join('\n')).toContain('over 150');
      expect(asked.join('\n')).toContain('150 ppm (EU, red under 5 g/L sugar)');
      for (const line of [...first, ...asked]) expect(line).not.toContain(`${amount} `);
      expect(first[0]).toMatch(total_mg_L < 135 ? /not more: total then 135/ : /no sulfite now/);
    }),
    { numRuns: 60 },
  );
  expect(Math.min(seen.capped, seen.whole)).toBeGreaterThan(3);
});
