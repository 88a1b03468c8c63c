import { at, element, lineFrom, textAt } from '../chart/elements.ts';
import { INK } from '../chart/palette.ts';
import { fitText, textWidth } from '../chart/text-width.ts';

/** A row of the picture as it is told: the vessel, what was read of it, and what to measure. */
export interface ShownRow {
  readonly name: string;
  readonly facts: string;
  readonly amount: string;
  /** A word beside the amount: held back by a limit, nothing to add, the rest as a stock. */
  readonly aside: string;
  /** Whether there is anything to tick. */
  readonly isToDo: boolean;
}

/** A page of a weigh-out sheet in its words. */
export interface ShownPage {
  readonly title: string;
  /** On the right: the day, and which page it is. */
  readonly corner: string;
  /** What to fetch in all, a line for each additive; on the first page. */
  readonly totals: readonly string[];
  readonly rows: readonly ShownRow[];
  /** Under the rows: what has no amount, the cautions. */
  readonly foot: readonly string[];
}

/** The measures of the picture, in its units: a phone shows it about 400 wide. */
const LAYOUT = {
  width: 400,
  margin: 12,
  title: { baseline: 28, size: 19 },
  corner: 13,
  totals: { top: 50, row: 20, size: 14.5 },
  row: { height: 36, name: 16, facts: 12, amount: 18, aside: 12, box: 15, gap: 9 },
  foot: { above: 8, row: 17, size: 12.5 },
} as const;

/**
 * A page of a weigh-out sheet as SVG, made for a phone: a box to tick, the vessel with what was read of it, the amount
 * large on the right. The same page always makes the same text.
 */
export function roundSvg({ title, corner, totals, rows, foot }: ShownPage): string {
  const { width, margin, totals: above, row, foot: below } = LAYOUT;
  const room = width - 2 * margin;
  const top = above.top + totals.length * above.row - 8;
  const rowsBottom = top + rows.length * row.height;
  const footLines = foot.flatMap((text) => wrapped(text, below.size, room));
  const height = Math.ceil(rowsBottom + below.above + footLines.length * below.row + margin);
  const { size, baseline } = LAYOUT.title;
  const cornerRoom = textWidth(corner, LAYOUT.corner) + row.gap;
  const drawing = [
    element('rect', { width: at(width), height: at(height), fill: INK.paper }),
    textAt({ x: margin, y: baseline }, fitText(title, { size, room: room - cornerRoom }), { size }),
    textAt({ x: width - margin, y: baseline }, corner, {
      size: LAYOUT.corner,
      anchor: 'end',
      colour: INK.aside,
    }),
    ...totals.map((text, i) =>
      textAt({ x: margin, y: above.top + i * above.row }, fitText(text, { size: above.size, room }), {
        size: above.size,
      }),
    ),
    ...rows.map((one, i) => drawRow(one, top + i * row.height)),
    ruleAt(rowsBottom),
    ...footLines.map((text, i) =>
      textAt({ x: margin, y: rowsBottom + below.above + 10 + i * below.row }, text, {
        size: below.size,
        colour: INK.text,
      }),
    ),
  ].join('');
  const view = `width="${width}" height="${height}" viewBox="0 0 ${width} ${height}"`;
  return `<svg xmlns="http://www.w3.org/2000/svg" ${view} font-family="Noto Sans">${drawing}</svg>`;
}

const ruleAt = (y: number): string =>
  lineFrom({ x: LAYOUT.margin, y }, { x: LAYOUT.width - LAYOUT.margin, y }, { stroke: INK.grid });

/**
 * A box to tick.
 *
 * @param y in units of the picture
 */
function boxAt(y: number): string {
  const { margin, row } = LAYOUT;
  const look = { fill: 'none', stroke: INK.aside, 'stroke-width': '1.2' };
  return element('rect', { x: at(margin), y: at(y), width: at(row.box), height: at(row.box), ...look });
}

/**
 * A row whose upper edge is at `top`.
 *
 * @param top in units of the picture
 */
function drawRow({ name, facts, amount, aside, isToDo }: ShownRow, top: number): string {
  const { width, margin, row } = LAYOUT;
  const right = width - margin;
  const left = margin + row.box + row.gap;
  const amountWidth = Math.max(textWidth(amount, row.amount), textWidth(aside, row.aside));
  const room = right - left - amountWidth - row.gap;
  const upper = top + 16;
  const lower = top + 30;
  return [
    ruleAt(top),
    isToDo ? boxAt(top + (row.height - row.box) / 2) : '',
    textAt({ x: left, y: upper }, fitText(name, { size: row.name, room }), { size: row.name }),
    textAt({ x: left, y: lower }, fitText(facts, { size: row.facts, room }), {
      size: row.facts,
      colour: INK.aside,
    }),
    textAt({ x: right, y: aside === '' ? top + 24 : upper + 2 }, amount, {
      size: row.amount,
      anchor: 'end',
    }),
    textAt({ x: right, y: lower + 1 }, aside, { size: row.aside, anchor: 'end', colour: INK.aside }),
  ].join('');
}

/**
 * A text in lines of whole words; a word that is too long alone is cut.
 *
 * @param size of the letters, in units of the picture
 * @param room how wide a line may be, in units of the picture
 */
function wrapped(text: string, size: number, room: number): string[] {
  const lines: string[] = [];
  for (const word of text.split(' ')) {
    const last = lines.at(-1);
    const longer = last === undefined ? word : `${last} ${word}`;
    if (last !== undefined && textWidth(longer, size) <= room) lines[lines.length - 1] = longer;
    else lines.push(fitText(word, { size, room }));
  }
  return lines;
}
