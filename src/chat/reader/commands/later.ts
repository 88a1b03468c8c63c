import type { Command } from '../command.ts';
import { daysAt } from '../moments/count-at.ts';
import type { Piece } from '../own-pieces.ts';
import type { Talk } from './talk.ts';
import { says, saysOnly } from './talk.ts';

/** Longer nobody puts a check off; own threshold. */
const MOST_DAYS = 366;

/** Days that are put off by, with the pieces that say so. */
interface PutOff {
  readonly days: number;
  readonly pieces: readonly Piece[];
}

/** `3 days`, `a week`, `tomorrow`, `next week`. */
function putOffBy({ said }: Talk): PutOff | undefined {
  for (const [k, piece] of said.entries()) {
    if (piece.ids.includes('tomorrow')) return { days: 1, pieces: [piece] };
    if (piece.ids.includes('next-week')) return { days: 7, pieces: [piece] };
    const found = daysAt(said, k);
    if (found) return { days: found.count, pieces: said.slice(k, found.to + 1) };
  }
  return undefined;
}

/** `later T4 3`: with the word in front and nothing else a whole number is days. */
function bareDays({ said, board }: Talk): PutOff | undefined {
  const [first, figure, another] = said;
  const isFirst = first?.ids.includes('later') === true && first.from < (board.findings[0]?.from ?? 0);
  if (!isFirst || figure === undefined || another !== undefined || !/^\d{1,2}$/.test(figure.text))
    return undefined;
  return { days: Number(figure.text), pieces: [figure] };
}

/** Reads `later T4 3 days`, `snooze T4 for two weeks`, `remind me of T4 in 5 days`. */
export function readLater(talk: Talk): Command | undefined {
  if (!talk.isOfVessel || talk.isQuestion || !says(talk, 'later', 'remind')) return undefined;
  const by = putOffBy(talk) ?? bareDays(talk);
  if (!by || !Number.isInteger(by.days) || by.days < 1 || by.days > MOST_DAYS) return undefined;
  return saysOnly(talk, ['later', 'remind', 'of', 'for', 'on', 'until'], new Set(by.pieces))
    ? { name: 'later', days: by.days }
    : undefined;
}
