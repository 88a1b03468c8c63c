/** A label above a row of signs: where its middle is and how wide it is, in units of the picture. */
export interface RowLabel {
  readonly middle: number; // in units of the picture
  readonly width: number; // in units of the picture
}

/** How many rows there are at most, and how far labels are apart in them. */
export interface RowRoom {
  readonly count: number;
  readonly gap: number; // in units of the picture
}

/**
 * Puts labels in so many rows at most, where none touches another; what has no room is left out. The last ones come
 * first, as the newest say most.
 */
export function labelRows<T extends RowLabel>(
  labels: readonly T[],
  { count, gap }: RowRoom,
): readonly (readonly T[])[] {
  const rows: T[][] = [];
  for (const label of labels.toReversed()) {
    const hasRoom = (row: readonly T[]): boolean =>
      row.every(({ middle, width }) => Math.abs(middle - label.middle) >= (width + label.width) / 2 + gap);
    const row = rows.find(hasRoom);
    if (row) row.push(label);
    else if (rows.length < count) rows.push([label]);
  }
  return rows;
}
