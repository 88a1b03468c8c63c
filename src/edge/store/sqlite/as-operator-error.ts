import { OperatorError } from '../../operator-error.ts';
import { StoreError, type StoreFault } from '../store-error.ts';

/** Tells the operator in a sentence what is wrong with a cellar file that could not be opened. */
export function asOperatorError(error: unknown, path: string): unknown {
  const kind = error instanceof StoreError ? error.kind : isFileFault(error) ? 'other' : undefined;
  if (kind === undefined) return error;
  return new OperatorError(SENTENCES[kind](path, reasonOf(error)), { cause: error });
}

const SENTENCES: Record<StoreFault, (path: string, reason: string) => string> = {
  full: (path) => `The disk of ${path} is full: make room and start again.`,
  locked: (path) => `Another program holds ${path}: close it and start again.`,
  'read-only': (path) =>
    `${path} cannot be written: give the user that runs brimnote the right to write it and its folder.`,
  damaged: damagedSentence,
  other: (path, reason) =>
    `${path} cannot be opened (${reason}): check DATA_FILE, and that the folder can be written.`,
};

/** What the operator is told of a file that is damaged. */
export function damagedSentence(path: string, reason: string): string {
  const oneLine = reason.replaceAll(/\*\*\*[^*]*\*\*\*|\s+/g, ' ').trim();
  return `${path} is damaged (${oneLine}). It is left as it is. To put a backup in the place of the cellar's file: npm run restore -- BACKUP`;
}

/** The faults of `node:fs`. */
const isFileFault = (error: unknown): boolean => error instanceof Error && 'syscall' in error;

const reasonOf = (error: unknown): string => {
  const cause = error instanceof StoreError ? error.cause : error;
  return cause instanceof Error ? cause.message : String(cause);
};
