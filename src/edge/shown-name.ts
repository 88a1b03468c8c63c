/** Longer names are cut: they stand in a line of a sheet on a phone. */
const LONGEST = 64;

/** Letters that end a line, or that turn the direction of all that follows them. */
const UNSHOWN = /[\p{Cc}\p{Cs}\u200e\u200f\u2028\u2029\u202a-\u202e\u2066-\u2069]+/gu;

/** A person's name as it may stand in a reply and a sheet: on one line; undefined where nothing is left of it. */
export function shownName(given: string | undefined): string | undefined {
  const plain = (given ?? '').replaceAll(UNSHOWN, ' ').replaceAll(/\s+/g, ' ').trim();
  const name = Array.from(plain).slice(0, LONGEST).join('').trim();
  return name === '' ? undefined : name;
}
