import { spawnSync } from 'node:child_process';
import { temporaryFolder } from './temporary-folder.ts';

/** Runs a command where a disk of so many megabytes is mounted on a folder, its working directory, for nobody else to see. */
function onSmallDisk(size_MB: number, folder: string, ...command: readonly string[]) {
  const script = `mount -t tmpfs -o size=${size_MB}m small "$0"; cd "$0"; exec "$@"`;
  return spawnSync('unshare', ['--map-root-user', '--mount', 'sh', '-ec', script, folder, ...command], {
    encoding: 'utf8',
  });
}

/** Whether a disk may be mounted here. */
export const canMount = onSmallDisk(1, '.', 'true').status === 0;

/** Runs a program of tests on a small disk, and gives what it says. */
export function runOnSmallDisk(
  program: string,
  size_MB: number,
): { readonly stdout: string; readonly stderr: string } {
  return onSmallDisk(size_MB, temporaryFolder(), process.execPath, program);
}
