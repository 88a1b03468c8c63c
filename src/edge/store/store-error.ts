/** What failed in the world: the disk is full, somebody else holds the file, it cannot be written or read. */
export type StoreFault = 'full' | 'locked' | 'read-only' | 'damaged' | 'other';

/** The store could not do its work. Nothing of what was to be written is kept, and it may be tried again. */
export class StoreError extends Error {
  override readonly name = 'StoreError';
  readonly kind: StoreFault;

  constructor(kind: StoreFault, options: ErrorOptions) {
    super(`the store failed: ${kind}`, options);
    this.kind = kind;
  }
}
