import type { Board } from './board.ts';
import { isFree } from './board.ts';
import { finishReading } from './finish-reading.ts';
import { readDraft } from './read-draft.ts';
import type { Term } from './split-terms.ts';
import { termIn } from './split-terms.ts';
import type { Draft, Fields, Reading, ReaderSettings } from './understood.ts';

/** A line read on its own. */
interface LineRead {
  readonly terms: readonly Term[];
  readonly draft: Draft;
  readonly vessel: string | undefined;
  readonly hasVolume: boolean;
  readonly isPastWord: boolean;
  /** Figures in it that nothing could read. */
  readonly leftover: boolean;
}

/** A round: its readings and what the first line says of all. */
export interface Round {
  readonly readings: readonly Reading[];
  readonly shared: Fields;
}

type SetBoard = (terms: readonly Term[]) => Board;

function readLine(terms: readonly Term[], setBoard: SetBoard): LineRead {
  const board = setBoard(terms);
  const draft = readDraft(board);
  const { vessel, vessels } = draft.fields;
  const says = (field: string): boolean => board.findings.some((finding) => finding.field === field);
  return {
    terms,
    draft,
    vessel: vessel ?? vessels?.join(),
    hasVolume:
      says('volume_L') ||
      board.marks.barrelsCounted === true ||
      board.problems.some(({ code }) => code === 'volume-not-positive'),
    isPastWord: board.pastTense && draft.intent === 'chat',
    leftover: draft.intent === 'chat' && terms.some((_, i) => isFree(board, i)),
  };
}

/** Whether the lines are a round: two with a vessel, all different, or two with a volume. */
function isRound(lines: readonly LineRead[]): boolean {
  const vessels = lines.flatMap(({ vessel }) => vessel ?? []);
  if (new Set(vessels).size < vessels.length) return false;
  return vessels.length >= 2 || lines.filter(({ hasVolume }) => hasVolume).length >= 2;
}

const NOT_UNDERSTOOD: Draft = {
  intent: 'chat',
  fields: {},
  problems: [{ code: 'not-understood', about: '' }],
  setAside: [],
  notes: [],
  marks: {},
  where: {},
};

const carriesFacts = ({ draft }: LineRead): boolean =>
  Object.keys(draft.fields).length > 0 || Object.keys(draft.marks).length > 0;

/** Facts of the first line: what a reading does not say itself it takes from here. */
function withShared(draft: Draft, shared: Draft | undefined): Draft {
  if (!shared) return draft;
  return { ...draft, marks: { ...shared.marks, ...draft.marks } };
}

function assumePast(board: Board): Board {
  board.marks.pastLine = true;
  return board;
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
  const read = lines.map((terms) => readLine(terms, setBoard));
  if (!isRound(read)) return undefined;
  const byVessel = read.filter(({ vessel }) => vessel !== undefined).length >= 2;
  const opens = (line: LineRead): boolean => (byVessel ? line.vessel !== undefined : line.hasVolume);
  const [first] = read as [LineRead];
  const past = first.isPastWord && !opens(first);
  const shared =
    !opens(first) && !first.isPastWord && carriesFacts(first) && first.draft.problems.length === 0
      ? first.draft
      : undefined;
  const groups: (Term[] | undefined)[] = [];
  for (const line of read) {
    if (opens(line)) groups.push([...line.terms]);
    else if (line === first) continue;
    else if (line.draft.intent !== 'chat' && groups.at(-1))
      groups.at(-1)?.push({ ...termIn(line.terms, 0), kind: 'break', text: '\n', tags: [] }, ...line.terms);
    else if (line.leftover) groups.push(undefined);
  }
  const readings = groups.map((terms) => {
    if (!terms) return { ...NOT_UNDERSTOOD, assumed: {}, asks: [] };
    const board = setBoard(terms);
    const draft = withShared(readDraft(past ? assumePast(board) : board), shared);
    const dose =
      draft.intent === 'chat'
        ? { ...draft, intent: 'dose' as const, ...(board.findings.length > 0 ? {} : {}) }
        : draft;
    return finishReading(withIntent(dose, shared), settings, shared?.fields);
  });
  return { readings, shared: shared?.fields ?? {} };
}

/** A line that names only a vessel takes the wish of the first line. */
function withIntent(draft: Draft, shared: Draft | undefined): Draft {
  return shared && (shared.intent === 'reading' || shared.intent === 'added') && draft.intent === 'dose'
    ? { ...draft, intent: shared.intent }
    : draft;
}
