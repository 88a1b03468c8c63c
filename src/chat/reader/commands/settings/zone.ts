import { placeOf, termAt } from '../../board.ts';
import type { Command } from '../../command.ts';
import type { Piece } from '../../own-pieces.ts';
import type { Talk } from '../talk.ts';
import { says } from '../talk.ts';
import { set, setWrong } from './set.ts';

/** The areas of the IANA time zone database; what stands behind the stroke the conversation checks. */
const AREAS =
  /^(africa|america|antarctica|arctic|asia|atlantic|australia|brazil|canada|chile|etc|europe|indian|mexico|pacific|us)$/i;

/** A place has not more words; own threshold. */
const MOST_WORDS = 4;

const isOwnWord = ({ ids }: Piece): boolean => ids.some((id) => id !== 'us');
const isStop = ({ ids }: Piece): boolean =>
  ids.some((id) => id === 'now' || id === 'filler' || id === 'tomorrow' || id === 'not');

/** A piece of a place's name: no figure of its own, and no word of a wine. */
const isOfPlace = ({ board }: Talk, { kind, gap, from }: Piece): boolean =>
  kind === 'number' ? !gap : termAt(board, from).tags.every((tag) => tag.startsWith('cue:'));

/** Reads `time zone Europe/Madrid`, `we are in Europe/Madrid`, `timezone UTC`; whether there is such a zone is not looked up. */
export function readZone(talk: Talk): Command | undefined {
  const isNamed = says(talk, 'zone');
  if (!isNamed && !says(talk, 'we-are-in')) return undefined;
  const opener = talk.said.findLastIndex(({ ids }) => ids.includes('zone') || ids.includes('we-are-in'));
  const before = talk.said.slice(0, opener);
  const behind = talk.said.slice(opener + 1).filter(({ ids }) => !ids.includes('is'));
  const end = behind.findIndex(isStop);
  const place = end < 0 ? behind : behind.slice(0, end);
  const isAlone =
    before.every(({ ids }) => ids.includes('filler') || ids.includes('work-in')) &&
    behind.slice(place.length).every(({ ids }) => ids.includes('now') || ids.includes('filler')) &&
    place.every((piece) => isOfPlace(talk, piece));
  if (place.length === 0 || !isAlone || place.length > MOST_WORDS * 2 + 2) return undefined;
  if (place.length === 1 && place[0]?.ids.includes('utc'))
    return isNamed ? set({ of: 'zone', zone: 'UTC' }) : undefined;
  const zone = placeOf(talk.board, place[0]?.from ?? 0, place.at(-1)?.to ?? 0)
    .text.replaceAll(/\s*\/\s*/g, '/')
    .replaceAll(/\s+/g, '_');
  const [area, city] = zone.split('/');
  if (area !== undefined && AREAS.test(area) && /^[A-Za-z][\w+/-]*$/.test(zone) && city)
    return set({ of: 'zone', zone });
  const isPlace = place.every(
    (piece) => !isOwnWord(piece) || piece.ids.includes('utc') || piece.kind !== 'word',
  );
  return isNamed && isPlace && place.length <= MOST_WORDS ? setWrong(talk, 'zone', place) : undefined;
}
