import type { Command, SaidRole } from '../command.ts';
import type { Piece } from '../own-pieces.ts';
import type { OwnWordId } from '../words/words.ts';
import { isAName } from './a-name.ts';
import type { Talk } from './talk.ts';
import { says, saysOnly } from './talk.ts';
import { textBehind, textBetween } from './text-behind.ts';

const SAID_ROLES: readonly SaidRole[] = ['keeper', 'hand', 'guest'];

const roleIn = (piece: Piece | undefined): SaidRole | undefined =>
  SAID_ROLES.find((role) => piece?.ids.includes(role));

/** `invite hand`, `invite somebody as guest`; `invite` alone has no role yet. */
function readInvite(talk: Talk): Command | undefined {
  const roles = talk.said.flatMap((piece) => roleIn(piece) ?? []);
  if (!talk.said.some((piece) => piece.ids.includes('invite')) || roles.length > 1) return undefined;
  if (!saysOnly(talk, ['invite', 'as-role', 'article', ...SAID_ROLES])) return undefined;
  const [role] = roles;
  return { name: 'invite', ...(role !== undefined && { role }) };
}

/** `persona 3`: the number that a sheet gives to somebody without a name, in words of any language. */
function numbered([word, number, more]: readonly Piece[]): string | undefined {
  const isNumber = more === undefined && number?.kind === 'number' && /^\d{1,6}$/.test(number.text);
  return isNumber && word?.ids.includes('as-role') ? `person ${number.text}` : undefined;
}

/** `remove Ben`. */
function readRemove({ board, said }: Talk): Command | undefined {
  const at = said.findIndex(({ ids }) => !ids.includes('filler'));
  const piece = said[at];
  if (piece?.ids.includes('remove') !== true) return undefined;
  const who = numbered(said.slice(at + 1)) ?? textBehind(board, piece);
  return isPerson(who) && !said.slice(at + 1).some(isOfTheBot) ? { name: 'remove-person', who } : undefined;
}

/** `Ben is keeper`, `make Ben a guest`. */
function readMake({ board, said }: Talk): Command | undefined {
  const last = said.at(-1);
  const role = roleIn(last);
  if (last === undefined || role === undefined) return undefined;
  const before = said.slice(0, -1);
  while (before.at(-1)?.ids.some((id) => id === 'article' || id === 'now' || id === 'as-role')) before.pop();
  const [first] = before;
  const is = before.at(-1);
  const isStated = is?.ids.includes('is') === true && before.length > 1;
  if (!isStated && first?.ids.includes('make-role') !== true) return undefined;
  const named = isStated ? before.slice(0, -1) : before.slice(1);
  const behind = isStated ? is : (said[before.length] ?? last);
  const who = numbered(named) ?? textBetween(board, isStated ? undefined : first, behind);
  if (named.length === 0 || named.some(isOfTheBot) || !isPerson(who)) return undefined;
  return { name: 'make-person', who, role };
}

const NO_NAMES: ReadonlySet<OwnWordId> = new Set<OwnWordId>([
  'ask',
  'this',
  'filler',
  'article',
  'who',
  'if',
  'not',
]);

/** Words by which nobody is called. */
const isOfTheBot = ({ ids }: Piece): boolean => ids.some((id) => NO_NAMES.has(id));

/** A name as it is written, or a number that a sheet gives to somebody without one. */
const isPerson = (who: string): boolean => isAName(who) || /^person \d{1,6}$/i.test(who);

/** Reads what is done about people: `invite hand`, `remove Ben`, `Ben is keeper`, `make Ben a guest`. */
export function readPersonWord(talk: Talk): Command | undefined {
  if (talk.board.findings.length > 0 || (talk.isQuestion && !says(talk, 'request'))) return undefined;
  return readInvite(talk) ?? readRemove(talk) ?? readMake(talk);
}
