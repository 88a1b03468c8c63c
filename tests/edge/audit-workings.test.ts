import { expect, test } from 'vitest';
import { dose } from '../../src/core/dose/dose.ts';
import { makeAudit } from '../../src/edge/audit-workings.ts';

const answer = dose({
  volume_L: 2000,
  ph: 3.5,
  free_mg_L: 12,
  additive: { id: 'potassium-metabisulfite' },
  target: { molecular_mg_L: 0.8 },
  targetStated: false,
  stage: 'finished',
  stageStated: true,
  basis: 'pk-1.81',
});

async function told(answers: Parameters<ReturnType<typeof makeAudit>>[0]): Promise<readonly string[]> {
  const sentences: string[] = [];
  let said = (): void => {};
  const first = new Promise<void>((resolve) => (said = resolve));
  const audit = makeAudit((sentence) => {
    sentences.push(sentence);
    said();
  });
  audit(answers);
  // A working that holds says nothing, so a broken one behind it marks the end.
  audit([
    { ...answer, steps: [{ ...answer.steps[0]!, name: 'solution-strength', substituted: '1 g + 1 L' }] },
  ]);
  await first;
  return sentences;
}

test('a working that holds is passed over in silence, and nothing is checked where nothing was said', async () => {
  expect(await told([answer, null])).toHaveLength(1);
  expect(await told([])).toHaveLength(1);
});

test('a working that does not hold is told to the operator with its line', async () => {
  const broken = {
    ...answer,
    steps: answer.steps.map((step) =>
      step.symbol === 'm' ? { ...step, result: { value: 1, unit: 'g' } } : step,
    ),
  };
  expect((await told([broken]))[0]).toMatch(
    /^A working does not hold, please report it: additive-mass: .* g, not 1 g$/,
  );
});
