const LAST = 0x10ffff;

/**
 * The first text, in the order of code points, behind all texts that begin with `begin`; undefined where there is none.
 * With it "begins with" is a range of an index, and no letter of it has a meaning of its own as in a pattern.
 */
export function pastPrefix(begin: string): string | undefined {
  const points = Array.from(begin, (letter) => letter.codePointAt(0) ?? 0);
  for (let at = points.length - 1; at >= 0; at -= 1) {
    const point = points[at] ?? LAST;
    if (point === LAST) continue;
    // The surrogates are no letters: what follows the last one before them is the first one behind them.
    const next = point === 0xd7ff ? 0xe000 : point + 1;
    return String.fromCodePoint(...points.slice(0, at), next);
  }
  return undefined;
}
