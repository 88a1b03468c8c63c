import fc from 'fast-check';
import { expect, test } from 'vitest';
import { anyTalk, play } from '../fuzz/conversation-of.ts';
import { faults } from '../fuzz/faults.ts';

test('no message throws, nor gets a dose beside a problem, an amount without what it needs, or a hidden assumption', async () => {
  await fc.assert(
    fc.asyncProperty(anyTalk, async (talk) => {
      for await (const turn of play(talk)) expect(faults(turn)).toEqual([]);
    }),
    // The same talks every time: the gate does not wander, `npm run fuzz` does.
    { numRuns: 1500, seed: 20260914 },
  );
});
