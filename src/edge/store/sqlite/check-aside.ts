import { execFile } from 'node:child_process';
import { Socket } from 'node:net';
import { DatabaseSync } from 'node:sqlite';
import { fileURLToPath } from 'node:url';
import { findDamage } from './check-file.ts';

/**
 * Checks a large file in a process of its own while the store serves already: reading every page of a gigabyte takes
 * seconds, and a process can be ended in the midst of it. `onDamage` is told what is wrong, if anything is.
 *
 * @returns what ends the check
 */
export function checkAside(path: string, onDamage: (damage: string) => void): () => void {
  const child = execFile(process.execPath, [fileURLToPath(import.meta.url), path], (error, stdout) => {
    // That the check could not be run says nothing of the file.
    if (error === null && stdout !== '') onDamage(stdout);
  });
  // Nobody waits for it who wants to stop.
  child.unref();
  for (const stream of [child.stdout, child.stderr]) if (stream instanceof Socket) stream.unref();
  return () => child.kill('SIGKILL');
}

if (import.meta.main) {
  const path = process.argv[2] ?? '';
  try {
    process.stdout.write(findDamage(new DatabaseSync(path, { readOnly: true })) ?? '');
  } catch (error) {
    process.stdout.write(String(error instanceof Error ? (error.cause ?? error) : error));
  }
}
