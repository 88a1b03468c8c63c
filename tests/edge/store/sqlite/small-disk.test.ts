import { fileURLToPath } from 'node:url';
import { expect, test } from 'vitest';
import { canMount, runOnSmallDisk } from './on-small-disk.ts';

const CHILD = fileURLToPath(new URL('small-disk-child.ts', import.meta.url));
test.skipIf(!canMount)(
  'on a disk that fills up every turn is kept whole or refused as such, and all goes on when there is room (skipped where no disk may be mounted)',
  () => {
    const { stdout, stderr } = runOnSmallDisk(CHILD, 3);
    expect(stderr).toBe('');
    expect(JSON.parse(stdout)).toEqual({
      faults: ['StoreError full'],
      readWhileFull: 3,
      wentOn: true,
      manyDurable: true,
      lost: [],
      half: [],
      gaps: 0,
      vesselsDiffer: false,
      differed: [],
      whenReadOnly: expect.stringMatching(/^OperatorError: .*cellar\.db cannot be (written|opened)/),
    });
  },
);
