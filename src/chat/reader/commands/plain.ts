import type { Command } from '../command.ts';
import type { OwnWordId } from '../words/words.ts';
import type { Talk } from './talk.ts';
import { says, saysOnly } from './talk.ts';

/** A way of saying a command that takes nothing but a vessel: the words it needs and those it may have beside them. */
interface Form {
  readonly command: Command;
  readonly needs: readonly OwnWordId[];
  readonly may?: readonly OwnWordId[];
  readonly ofVessel?: boolean;
  /** It changes something: with a question mark it is none, unless it asks the bot to do it. */
  readonly isAct?: true;
}

/** Words beside the one that says in which form somebody wants the sheet of a round. */
const SHEET: readonly OwnWordId[] = ['show', 'round', 'weigh-sheet', 'last', 'of', 'for', 'article'];

const FORMS: readonly Form[] = [
  {
    command: { name: 'vessel' },
    needs: ['show'],
    may: ['ask', 'of', 'on', 'is', 'in', 'wine', 'today'],
    ofVessel: true,
  },
  { command: { name: 'vessel' }, needs: ['due'], may: ['ask', 'for', 'of', 'is'], ofVessel: true },
  { command: { name: 'vessels' }, needs: ['vessels'], may: ['show', 'all', 'of'] },
  { command: { name: 'history' }, needs: ['history'], may: ['show', 'of', 'for', 'sheet'], ofVessel: true },
  {
    command: { name: 'history' },
    needs: ['what-was-added'],
    may: ['to', 'for', 'today', 'yesterday'],
    ofVessel: true,
  },
  { command: { name: 'history' }, needs: ['history-word'], may: ['show'] },
  { command: { name: 'undo' }, needs: ['undo'], may: ['last', 'entry', 'this'], isAct: true },
  { command: { name: 'open' }, needs: ['open'], may: ['orders', 'ask', 'show', 'is', 'still'] },
  { command: { name: 'open' }, needs: ['orders'], may: ['show', 'all'] },
  { command: { name: 'open' }, needs: ['open', 'orders'], may: ['ask', 'for', 'on', 'of'], ofVessel: true },
  { command: { name: 'open' }, needs: ['orders'], may: ['show', 'for', 'on', 'of'], ofVessel: true },
  { command: { name: 'due' }, needs: ['due'], may: ['ask', 'show', 'is', 'today', 'all', 'sheet', 'now'] },
  { command: { name: 'unwatch' }, needs: ['unwatch'], may: ['of', 'for', 'on'], ofVessel: true, isAct: true },
  { command: { name: 'watch' }, needs: ['watch'], may: ['of', 'again', 'on'], ofVessel: true, isAct: true },
  { command: { name: 'watch' }, needs: ['remind', 'again'], may: ['of', 'on'], ofVessel: true, isAct: true },
  { command: { name: 'settings' }, needs: ['settings'], may: ['show', 'all'] },
  { command: { name: 'backup' }, needs: ['backup'], may: ['now', 'all'], isAct: true },
  { command: { name: 'forget-me' }, needs: ['forget-me'], isAct: true },
  { command: { name: 'forget' }, needs: ['forget'], ofVessel: true, isAct: true },
  { command: { name: 'picture' }, needs: ['picture'], may: ['show', 'of', 'for'], ofVessel: true },
  { command: { name: 'picture' }, needs: ['picture'], may: ['show'] },
  { command: { name: 'round-sheet', form: 'text' }, needs: ['round'], may: ['show', 'all', 'last'] },
  { command: { name: 'round-sheet', form: 'csv' }, needs: ['round', 'csv'], may: SHEET },
  { command: { name: 'round-sheet', form: 'csv' }, needs: ['weigh-sheet', 'csv'], may: SHEET },
  { command: { name: 'round-sheet', form: 'xlsx' }, needs: ['round', 'xlsx'], may: SHEET },
  { command: { name: 'round-sheet', form: 'xlsx' }, needs: ['weigh-sheet', 'xlsx'], may: SHEET },
  { command: { name: 'round-sheet', form: 'picture' }, needs: ['round', 'picture'], may: SHEET },
  { command: { name: 'round-sheet', form: 'picture' }, needs: ['weigh-sheet', 'picture'], may: SHEET },
  { command: { name: 'added-it' }, needs: ['added-it'], may: ['done'], isAct: true },
  { command: { name: 'added-it' }, needs: ['done'], isAct: true },
  {
    command: { name: 'full-dose' },
    needs: ['full-dose'],
    may: ['yes', 'show', 'of', 'for'],
    ofVessel: false,
  },
  { command: { name: 'people' }, needs: ['people'], may: ['show', 'all'] },
  { command: { name: 'read-along', on: true }, needs: ['read-along'], isAct: true },
  { command: { name: 'read-along', on: false }, needs: ['only-called'], isAct: true },
];

const fits = (talk: Talk, { needs, may = [], ofVessel = false, isAct }: Form): boolean =>
  !(isAct && talk.isQuestion && !says(talk, 'request')) &&
  talk.isOfVessel === ofVessel &&
  (ofVessel || talk.board.findings.length === 0) &&
  needs.every((id) => says(talk, id)) &&
  saysOnly(talk, [...needs, ...may]);

/** `T4?`, `/T4`: nothing but the vessel. */
const isVesselAlone = (talk: Talk): boolean =>
  talk.isOfVessel && (talk.isQuestion || talk.isSlashed) && saysOnly(talk, []);

/** `not T4`, in that order and alone. */
const isNotVessel = ({ board, said, isOfVessel, isQuestion }: Talk): boolean =>
  isOfVessel &&
  !isQuestion &&
  said.length === 1 &&
  said[0]?.from === 0 &&
  said[0].ids.includes('not') &&
  board.findings[0]?.from === 1;

/** `done T4`, in that order; the other way round it may be any work. */
const isDoneVessel = ({ board, said, isOfVessel, isQuestion }: Talk): boolean =>
  isOfVessel &&
  !isQuestion &&
  said.length === 1 &&
  said[0]?.ids.includes('done') === true &&
  !said[0].text.includes(' ') &&
  said[0].from < (board.findings[0]?.from ?? 0);

/** Reads what takes nothing but a vessel: `T4?`, `vessels`, `undo`, `what is due`, `not T4`. */
export function readPlain(talk: Talk): Command | undefined {
  if (isVesselAlone(talk)) return { name: 'vessel' };
  if (isNotVessel(talk)) return { name: 'unwatch' };
  if (isDoneVessel(talk)) return { name: 'added-it' };
  return FORMS.find((form) => fits(talk, form))?.command;
}
