import type { ImportProblemCode } from '../../chat/attachments/import-read.ts';

/** A file that cannot be read, and why. It is thrown and caught in this room; a person gets the code as a sentence. */
export class FileFault extends Error {
  override readonly name = 'FileFault';
  readonly code: ImportProblemCode;

  constructor(code: ImportProblemCode, options?: ErrorOptions) {
    super(`Cannot read the file: ${code}`, options);
    this.code = code;
  }
}
