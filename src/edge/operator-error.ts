/** Exit statuses of the program, by the names and numbers of BSD's `sysexits`. */
export const EXIT = { fine: 0, software: 70, config: 78 } as const;

/**
 * Something that only the operator can mend. `message` is a whole sentence for the screen that names the
 * variable to look at; it never holds a secret.
 */
export class OperatorError extends Error {
  override readonly name = 'OperatorError';
  /** What the process ends with. */
  readonly exitStatus: number;

  constructor(sentence: string, options?: ErrorOptions & { exitStatus?: number }) {
    super(sentence, options);
    this.exitStatus = options?.exitStatus ?? EXIT.config;
  }
}
