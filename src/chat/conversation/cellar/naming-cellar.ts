import { line } from '../lines/line.ts';
import type { Handled, IncomingMessage } from '../ports.ts';
import { cellarPart } from './cellar-name.ts';

/** The first line of a reply says which cellar it is about, where the chat has several; an emergency comes before it. */
export function namingCellar(
  handled: Handled,
  { cellar, cellars = [] }: Pick<IncomingMessage, 'cellar' | 'cellars'>,
): Handled {
  const { place, understood, replies } = handled;
  const present = cellars.find((one) => one.cellar === cellar);
  if (cellars.length < 2 || present === undefined || place !== undefined) return handled;
  if (understood?.readings.some(({ intent }) => intent === 'emergency')) return handled;
  const name = { ...line('first', 'at-cellar'), list: [cellarPart(present)] };
  return { ...handled, replies: replies.map((one) => ({ ...one, lines: [name, ...one.lines] })) };
}
