/** Longer names nobody types; own threshold. */
const LONGEST = 40;

/** One to four words of letters, as people and cellars are called. */
const NAME = /^\p{L}[\p{L}\p{M}'’.&-]*(?: (?:&|\p{L}[\p{L}\p{M}'’.-]*)){0,3}$/u;

/** Whether some words could be what somebody or something is called. */
export function isAName(text: string): boolean {
  return text.length <= LONGEST && NAME.test(text);
}
