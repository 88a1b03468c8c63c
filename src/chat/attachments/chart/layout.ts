/** The measures of a picture, in its units: a phone shows it about 400 wide. */
export const LAYOUT = {
  width: 400,
  margin: 12,
  title: { baseline: 28, size: 19 },
  legend: { top: 48, row: 20, size: 13, sign: 30, gap: 14 },
  plot: { height: 236, above: 12, inner: 10 },
  /** Below the plot, where additions stand. */
  strip: { arrows: 26, foot: 4 },
  axis: { size: 12.5, aside: 6, day: 16, year: 31, below: 10, gap: 12 },
  figure: { size: 12.5, gap: 4, row: 14, rows: 2 },
} as const;
