import { symbol } from 'd3-shape';
import type { SymbolType } from 'd3-shape';
import { escapeMarkup } from './escape-markup.ts';
import { INK } from './palette.ts';

/** A place in the picture, in its units, from the upper left corner. */
export interface Place {
  readonly x: number; // in units of the picture
  readonly y: number; // in units of the picture
}

/** A rectangle of the picture, in its units. */
export interface Box {
  readonly left: number; // in units of the picture
  readonly right: number; // in units of the picture
  readonly top: number; // in units of the picture
  readonly bottom: number; // in units of the picture
}

/** How a text stands: its size in units of the picture, which point of it `x` is, its colour. */
export interface TextManner {
  readonly size: number; // in units of the picture
  readonly anchor?: 'start' | 'middle' | 'end';
  readonly colour?: string;
}

/** Coordinates to a hundredth, so that the same data always make the same letters. */
export const at = (value: number): string => String(Math.round(value * 100) / 100);

/** The attributes of an element. */
export type Attributes = Readonly<Record<string, string>>;

/** An element without content. */
export function element(name: string, attributes: Attributes): string {
  const written = Object.entries(attributes).map(([key, value]) => ` ${key}="${escapeMarkup(value)}"`);
  return `<${name}${written.join('')}/>`;
}

/** A straight line. */
export function lineFrom(from: Place, to: Place, attributes: Attributes): string {
  return element('line', { x1: at(from.x), y1: at(from.y), x2: at(to.x), y2: at(to.y), ...attributes });
}

/** A text whose letters stand on `y`. */
export function textAt({ x, y }: Place, text: string, manner: TextManner): string {
  const { size, anchor = 'start', colour = INK.text } = manner;
  const head = `<text x="${at(x)}" y="${at(y)}" font-size="${at(size)}" text-anchor="${anchor}" fill="${colour}">`;
  return `${head}${escapeMarkup(text)}</text>`;
}

/** A shape such as a circle or a diamond. */
export interface Shape {
  readonly type: SymbolType;
  readonly area: number; // in square units of the picture
}

/** A shape whose middle is at a place. */
export function shapeAt({ x, y }: Place, { type, area }: Shape, attributes: Attributes): string {
  const d = symbol(type, area)() ?? '';
  return element('path', { d, transform: `translate(${at(x)} ${at(y)})`, ...attributes });
}
