/**
 * A vessel by the shortest name that people write for it, and that reads back as the same: numbered tanks as `T4`.
 *
 * @example
 * ```ts
 * vesselName('tank 4') // => "T4"
 * vesselName('barrel 17') // => "barrel 17"
 * vesselName('FV3') // => "FV3"
 * ```
 */
export function vesselName(vessel: string): string {
  const tank = /^tank (\d+[a-z]?)$/i.exec(vessel);
  return tank?.[1] === undefined ? vessel : `T${tank[1].toUpperCase()}`;
}

/** So many rows of vessels are named one by one. */
const MOST_ROWS = 4;

/**
 * Several vessels in one name: the first and the last of a row of them, each row where numbers are left out between.
 *
 * @example
 * ```ts
 * vesselNames(['B1', 'B2', 'B3', 'B4']) // => "B1–B4"
 * vesselNames(['tank 4', 'tank 9']) // => "T4, T9"
 * vesselNames(['barrel 12', 'barrel 13', 'barrel 14']) // => "barrel 12–14"
 * vesselNames(['B1', 'B2', 'B3', 'B5']) // => "B1–B3, B5"
 * ```
 */
export function vesselNames(vessels: readonly string[]): string {
  const rows = rowsOf(vessels.map(vesselName)).map(rowName);
  if (rows.length <= MOST_ROWS) return rows.join(', ');
  return `${rows.slice(0, MOST_ROWS - 1).join(', ')} … ${rows.at(-1) ?? ''}`;
}

/** The name in front of a number, and the number. */
const NUMBERED = /^(.*?)(\d+)$/;

/** Names whose numbers follow each other stand in one row; what has no number goes on with the row before. */
function rowsOf(names: readonly string[]): string[][] {
  const rows: string[][] = [];
  for (const name of names) {
    const row = rows.at(-1);
    const [, word, number] = NUMBERED.exec(name) ?? [];
    const [, lastWord, lastNumber] = NUMBERED.exec(row?.at(-1) ?? '') ?? [];
    const isBroken =
      number !== undefined &&
      lastNumber !== undefined &&
      (word !== lastWord || Number(number) !== Number(lastNumber) + 1);
    if (row === undefined || isBroken) rows.push([name]);
    else row.push(name);
  }
  return rows;
}

function rowName(names: readonly string[]): string {
  const [first, last] = [names[0] ?? '', names.at(-1) ?? ''];
  if (names.length <= 2) return names.join(', ');
  const word = /^\D+ (?=\d)/.exec(first)?.[0] ?? '';
  return `${first}–${last.startsWith(word) ? last.slice(word.length) : last}`;
}
