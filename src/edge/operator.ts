import { hideSecret } from './hide-secret.ts';
import { EXIT, OperatorError } from './operator-error.ts';

/** Whoever runs the program: plain sentences on stderr, and the exit status. */
export interface Operator {
  /** Shows a sentence. */
  readonly tell: (sentence: string) => void;
  /** Shows a fault of the program's own with its trace; the program goes on. */
  readonly report: (fault: unknown) => void;
  /** Ends the process: with the sentence and status of an OperatorError, else with the trace of the fault. */
  readonly end: (error: unknown) => never;
}

/** Makes the way to the operator, on which the secret is never shown. */
export function createOperator(secret: string | undefined): Operator {
  const hide = hideSecret(secret);
  const tell = (sentence: string): void => void process.stderr.write(`${hide(sentence)}\n`);
  return {
    tell,
    report: (fault) => tell(`A message could not be answered.\n${traceOf(fault)}`),
    end: (error) => {
      if (error instanceof OperatorError) {
        tell(error.message);
        process.exit(error.exitStatus);
      }
      // Whoever read our output has gone: there is nobody to tell.
      if (isClosedPipe(error)) process.exit(EXIT.fine);
      tell(`brimnote stopped by a fault of its own.\n${traceOf(error)}`);
      process.exit(EXIT.software);
    },
  };
}

const isClosedPipe = (error: unknown): boolean =>
  error instanceof Error && (error as NodeJS.ErrnoException).code === 'EPIPE';

const traceOf = (error: unknown): string => {
  if (!(error instanceof Error)) return String(error);
  const cause = error.cause === undefined ? '' : `\ncaused by ${traceOf(error.cause)}`;
  return `${error.stack ?? error.message}${cause}`;
};
