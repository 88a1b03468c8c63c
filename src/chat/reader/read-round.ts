import type { Board } from './board.ts';
import { isFree, placeOf } from './board.ts';
import type { Command } from './command.ts';
import { finishReading } from './finish-reading.ts';
import { notUnderstood } from './not-understood.ts';
import { readDraft } from './read-draft.ts';
import { sharedFields } from './shared-fields.ts';
import type { Term } from './split-terms.ts';
import { termIn } from './split-terms.ts';
import { withHeading, type Heading } from './with-heading.ts';
import { withSections } from './with-sections.ts';
import type { Draft, Fields, Reading, ReaderSettings } from './understood.ts';

/** A line read on its own. */
interface LineRead {
  readonly terms: readonly Term[];
  readonly draft: Draft;
  readonly vessel: string | undefined;
  readonly hasVolume: boolean;
  /** It says that something was added: as the first line, of all lines. */
  readonly isPast: boolean;
  /** Figures in it that nothing could read. */
  readonly leftover: boolean;
  /** The first figure in it that nothing claims. */
  readonly left?: string;
  /** What it says of when and with which lot, as the first line of all lines. */
  readonly heading: Heading;
}

/** A round: its readings and what the first line says of all. */
export interface Round {
  readonly readings: readonly Reading[];
  readonly shared: Fields;
}

type SetBoard = (terms: readonly Term[]) => Board;

/** `12 Nov` above a list is its day; the name of a day alone may be that of the round. */
function headingOf({ when, command }: Draft, board: Board): Heading {
  const day = command?.name === 'day' ? command.day : undefined;
  const moment = when ?? board.when ?? (day && { day, text: board.message.split('\n')[0]?.trim() ?? '' });
  const isName =
    moment?.hour === undefined &&
    (moment?.day?.is === 'weekday' || moment?.day?.is === 'today') &&
    when === undefined &&
    board.when === undefined;
  return {
    ...(moment && !isName && { when: moment }),
    ...(board.chemicalLot && { chemical_lot: board.chemicalLot.code }),
  };
}

/** Words that mean something only as a whole message: `done` above a round says that all of it went in. */
const ALONE: ReadonlySet<Command['name']> = new Set<Command['name']>([
  'added-it',
  'picture',
  'round-sheet',
  'invite',
  'join',
  'people',
  'remove-person',
  'make-person',
  'at',
  'name-cellar',
  'read-along',
  'set',
  'set-wrong',
]);

function readLine(terms: readonly Term[], setBoard: SetBoard): LineRead {
  let board = setBoard(terms);
  let draft = readDraft(board);
  if (draft.command && ALONE.has(draft.command.name)) {
    board = setBoard(terms);
    draft = readDraft(board, { isNoTalk: true });
  }
  const { vessel, vessels } = draft.fields;
  const left = board.terms.findIndex((_, i) => isFree(board, i));
  const says = (field: string): boolean => board.findings.some((finding) => finding.field === field);
  return {
    terms,
    draft,
    vessel: vessel ?? vessels?.join(),
    hasVolume:
      says('volume_L') ||
      board.marks.barrelsCounted === true ||
      board.problems.some(({ code }) => code === 'volume-not-positive'),
    isPast: board.pastTense,
    heading: headingOf(draft, board),
    leftover: draft.intent === 'chat' && left >= 0,
    ...(left >= 0 && { left: placeOf(board, left, left).text }),
  };
}

const isTitration = ({ draft }: LineRead): boolean => draft.intent === 'titration';

/** What no second line may have: a vessel, or of a titration the vessel with free or total. */
function named(lines: readonly LineRead[]): readonly string[] {
  const others = new Set(lines.filter((one) => !isTitration(one)).flatMap(({ vessel }) => vessel ?? []));
  return lines.flatMap((one) => {
    if (one.vessel === undefined) return [];
    const isApart = isTitration(one) && !others.has(one.vessel);
    return isApart ? `${one.vessel} ${one.draft.titration?.of ?? 'free'}` : one.vessel;
  });
}

/** Whether the lines are a round: two with a vessel, all different, two with a volume, or two titrations. */
function isRound(lines: readonly LineRead[]): boolean {
  const vessels = named(lines);
  if (new Set(vessels).size < vessels.length) return false;
  if (lines.filter(isTitration).length >= 2) return true;
  return vessels.length >= 2 || lines.filter(({ hasVolume }) => hasVolume).length >= 2;
}

const carriesFacts = ({ draft }: LineRead): boolean =>
  Object.keys(draft.fields).length > 0 || Object.keys(draft.marks).length > 0;

/** `Cellar round 10/14`: a day and month above a list. */
const DAY_AND_MONTH = /^(0?[1-9]|1[0-2])\/(0?[1-9]|[12]\d|3[01])$|^(0?[1-9]|[12]\d|3[01])\/(0?[1-9]|1[0-2])$/;

/** What stands above a round and cannot be read; a date alone there is passed over. */
const isDoubtful = (line: LineRead): boolean =>
  line.draft.intent !== 'chat' &&
  line.draft.problems.some(({ about }) => carriesFacts(line) || !DAY_AND_MONTH.test(about));

/** A line takes from the first what it does not say itself: its facts, and the wish to note a reading. */
function withShared(draft: Draft, shared: Draft | undefined): Draft {
  const intent =
    draft.intent === 'chat' || (draft.intent === 'dose' && shared?.intent === 'reading')
      ? shared?.intent === 'reading'
        ? 'reading'
        : 'dose'
      : draft.intent;
  return { ...draft, intent, marks: { ...shared?.marks, ...draft.marks } };
}

/** `total 2100 gal` under a round: the sum of its tanks, and no tank's volume. */
const isSum = ({ terms, hasVolume }: LineRead): boolean =>
  hasVolume && termIn(terms, 0).tags.includes('label:total');

/** `red` below a tank: one word that is a fact of it. */
const isBareFact = ({ terms, draft }: LineRead): boolean =>
  terms.length === 1 && Object.keys(draft.fields).length > 0;

/** The lines of each reading: one that opens it and those below; a line that nobody can read is one of its own. */
function groupsOf(lines: readonly LineRead[], opens: (line: LineRead) => boolean): LineRead[][] {
  const groups: LineRead[][] = [];
  for (const [i, line] of lines.entries()) {
    const last = groups.at(-1);
    if (opens(line)) groups.push([line]);
    else if (isSum(line)) continue;
    else if (i > 0 && (line.draft.intent !== 'chat' || isBareFact(line)) && last && !last[0]?.leftover)
      last.push(line);
    else if (i > 0 && line.leftover) groups.push([line]);
  }
  return groups;
}

const joined = (group: readonly LineRead[]): readonly Term[] =>
  group.flatMap(({ terms }, i): readonly Term[] =>
    i === 0 ? terms : [{ ...termIn(terms, 0), kind: 'break', text: '\n', tags: [] }, ...terms],
  );

/** Reads the lines of one vessel as one message. */
function readTogether(group: readonly LineRead[], setBoard: SetBoard, isPast: boolean): Draft {
  const board = setBoard(joined(group));
  if (isPast) board.marks.pastLine = true;
  return readDraft(board);
}

/** The draft of a group. Among readings a line that tells only what a vessel is (`T5 red`) is a reading too. */
function draftOf(
  group: readonly LineRead[],
  setBoard: SetBoard,
  { isPast, isMixed }: { readonly isPast: boolean; readonly isMixed: boolean },
): Draft {
  const [line] = group as [LineRead];
  if (group.length > 1 || isPast) return readTogether(group, setBoard, isPast);
  return isMixed && line.draft.command?.name === 'told'
    ? readDraft(setBoard(line.terms), { isNoTalk: true })
    : line.draft;
}

/**
 * Reads several lines as a round of tanks: each vessel a reading, lines below it its own, the first line shared.
 *
 * @param lines The terms of each line.
 * @param setBoard Makes a fresh table for some terms.
 * @returns The round, or undefined where the lines are one message.
 */
export function readRound(
  lines: readonly (readonly Term[])[],
  setBoard: SetBoard,
  settings: ReaderSettings,
): Round | undefined {
  const below = withSections(lines, (terms) => readLine(terms, setBoard).draft);
  const read = below.map((terms) => readLine(terms, setBoard));
  if (!isRound(read)) return undefined;
  const byVessel = read.filter(({ vessel }) => vessel !== undefined).length >= 2;
  const isOpen = ({ vessel, hasVolume }: LineRead): boolean => (byVessel ? vessel !== undefined : hasVolume);
  // Headings and greetings may stand above what holds for all.
  const telling = read
    .slice(
      0,
      read.findIndex((line) => isTitration(line) || isOpen(line)),
    )
    .filter(
      (line) => carriesFacts(line) || isDoubtful(line) || line.isPast || Object.keys(line.heading).length > 0,
    );
  const [first] = (telling.length === 0 ? read : telling.length > 1 ? [readLine(joined(telling), setBoard)] : telling) as [LineRead]; // prettier-ignore
  // `AO 20 mL sample 0.01 N` above `T4 1.9` and `T5 1.2`: what holds for all their titrations.
  const lab =
    first.vessel === undefined && first.draft.titration?.titrant_mL === undefined && isTitration(first);
  const opens = (line: LineRead): boolean => {
    if (isTitration(line)) return !(lab && line === first);
    return isOpen(line);
  };
  const isPast = first.isPast && !opens(first);
  const isShared = !opens(first) && carriesFacts(first) && first.draft.problems.length === 0;
  const shared = isShared ? { ...first.draft, fields: sharedFields(first.draft.fields) } : undefined;
  const heading = opens(first) ? {} : first.heading;
  // What holds for all and cannot be read makes all of them a question: `target 30-35`.
  const doubts: Reading['problems'] =
    opens(first) || lab
      ? []
      : isDoubtful(first)
        ? first.draft.problems
        : first.left !== undefined && carriesFacts(first)
          ? [{ code: 'ambiguous-number', about: first.left }]
          : [];
  const isMixed = read.some((line) => opens(line) && line.draft.command === undefined);
  const readings = groupsOf(read, opens).map((group): Reading => {
    const [line] = group;
    if (!line) return notUnderstood(setBoard([]));
    if (line.leftover) return notUnderstood(setBoard(line.terms));
    const draft = lab
      ? readTogether([first, ...group], setBoard, false)
      : draftOf(group, setBoard, { isPast, isMixed });
    const reading = finishReading(withHeading(withShared(draft, shared), heading), settings, shared?.fields);
    return doubts.length === 0
      ? reading
      : { ...reading, asks: [], problems: [...reading.problems, ...doubts] };
  });
  return { readings, shared: shared?.fields ?? {} };
}
