import { fileURLToPath } from 'node:url';
import { expect, test } from 'vitest';
import { canMount, runOnSmallDisk } from '../store/sqlite/on-small-disk.ts';

const CHILD = fileURLToPath(new URL('small-disk-child.ts', import.meta.url));

test.skipIf(!canMount)(
  'while the disk is full a person is told that nothing was noted, and all that was said to be noted is there (skipped where no disk may be mounted)',
  () => {
    const { stdout, stderr } = runOnSmallDisk(CHILD, 4);
    expect(stderr).toBe('');
    const { keptBefore, keptAfter, ...told } = JSON.parse(stdout) as Record<string, unknown>;
    expect(told).toEqual({
      sentences: [expect.stringMatching(/^Not noted: .*again/)],
      refused: 20,
      wentOn: true,
      lost: [],
      half: [],
      twice: 0,
      rebuilt: expect.stringContaining('none differed'),
      status: 0,
      toldOperator: true,
    });
    expect(keptBefore).toBeGreaterThan(20);
    expect(keptAfter).toBeGreaterThan(10);
  },
  60_000,
);
