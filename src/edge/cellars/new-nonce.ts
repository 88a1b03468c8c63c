/** Bytes of chance: more than anybody can try out. */
const BYTES = 12;

/** Letters and digits that nobody can guess. */
export function newNonce(): string {
  return Buffer.from(crypto.getRandomValues(new Uint8Array(BYTES))).toString('hex');
}
