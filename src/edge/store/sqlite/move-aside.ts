import { existsSync, renameSync } from 'node:fs';
import { OperatorError } from '../../operator-error.ts';

/** A cellar file and what SQLite keeps beside it: they only mean something together, under names that go together. */
const PARTS = ['', '-wal', '-shm'] as const;

/**
 * Gives a cellar file another name, with all that goes with it. Nobody may write to it meanwhile.
 *
 * @returns what undoes it; undefined where there was nothing
 * @throws OperatorError where there is something at `to` already
 */
export function moveAside(path: string, to: string): (() => void) | undefined {
  const there = PARTS.filter((part) => existsSync(`${path}${part}`));
  if (there.length === 0) return undefined;
  if (PARTS.some((part) => existsSync(`${to}${part}`)))
    throw new OperatorError(`There is something at ${to} already: try again in a second.`);
  for (const part of there) renameSync(`${path}${part}`, `${to}${part}`);
  return () => {
    for (const part of there) renameSync(`${to}${part}`, `${path}${part}`);
  };
}
