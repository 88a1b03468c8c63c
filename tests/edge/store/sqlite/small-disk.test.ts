import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { expect, test } from 'vitest';
import { temporaryFolder } from './temporary-folder.ts';

const CHILD = fileURLToPath(new URL('small-disk-child.ts', import.meta.url));
/** Runs a command where a disk of 3 MB is mounted on a folder, for nobody else to see. */
const onSmallDisk = (folder: string, ...command: readonly string[]) =>
  spawnSync(
    'unshare',
    [
      '--map-root-user',
      '--mount',
      'sh',
      '-ec',
      'mount -t tmpfs -o size=3m small "$0"; cd "$0"; exec "$@"',
      folder,
      ...command,
    ],
    { encoding: 'utf8' },
  );
const canMount = onSmallDisk('.', 'true').status === 0;

test.skipIf(!canMount)(
  'on a disk that fills up every turn is kept whole or refused as such, and all goes on when there is room (skipped where no disk may be mounted)',
  () => {
    const { stdout, stderr } = onSmallDisk(temporaryFolder(), process.execPath, CHILD);
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
