import type { CellarView } from '../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../core/cellar/entry.ts';
import { MINUTE_ms } from '../../core/time/durations.ts';
import { readMessage } from '../reader/read-message.ts';
import type { Understood } from '../reader/understood.ts';
import type { SentenceKey } from '../replies/sentence-keys.ts';
import { vesselNames } from '../replies/vessel-name.ts';
import { tellsOfDanger } from './cellar/tells-of-danger.ts';
import type { Here } from './here.ts';
import { eventKey } from './keys.ts';
import { line } from './lines/line.ts';
import { noting } from './note.ts';
import type { Content, Handled } from './ports.ts';
import { handleText } from './text.ts';
import { vesselsNamed } from './vessels-named.ts';

/** So long an edit corrects the answer to its message, in milliseconds. */
const CORRECTS_ms = 15 * MINUTE_ms;

/** So many of a vessel’s last entries are looked through for one that came after the message. */
const LOOKED_AT = 50;

/** Why an edit changes nothing, and the entry that stands in its way. */
interface Refusal {
  readonly key: SentenceKey;
  readonly entry?: LoggedEntry;
}

/**
 * A message with another text. A reading corrects its answer: what it noted is struck, then the text is read as if it had
 * come so. Nothing is changed where something has gone into the wine by now, or after a quarter of an hour.
 */
export async function handleEdited(
  { text, original, original_at }: Extract<Content, { kind: 'edited' }>,
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const { message, memory, settings } = here;
  const asText = { ...here, message: { ...message, content: { kind: 'text', text } as const } };
  if (tellsOfDanger(message)) return handleText(text, asText, view);
  const origin = eventKey({ chat: message.chat, id: original });
  const event = `${origin}edited ${message.id} `;
  const before = await view.entriesOfKeys(origin);
  const isBegun = before.some(({ key, struck }) => key.startsWith(event) || struck?.reason === 'edited');
  const understood = readMessage(text, settings);
  const refusal =
    refusalByText(understood, before, here) ??
    (isBegun ? undefined : await refusalByTime(original_at, understood, before, here, view));
  if (refusal) return refuse(refusal, here);
  const standing = before.some(({ key }) => key.startsWith(event))
    ? []
    : before.filter(({ struck }) => struck === undefined);
  // What is struck must be gone before the text is read: it fills in what is known of the vessel.
  if (standing.length > 0)
    return {
      writes: noting(
        here,
        standing.map((one) => strikeOf(one, here)),
      ),
      replies: [],
      again: true,
    };
  const { waiting: _waiting, askedTarget: _asked, ...others } = memory;
  const done = new Set(before.map(({ key }) => key));
  // The cautions of the answer that goes away go with it: they are said in full again.
  const fresh = { ...asText, event, done, memory: { ...others, lastButtons: [], cautionedOn: {} } };
  const handled = await handleText(text, fresh, view);
  return { ...sampledThen(handled, original_at, here), replies: replacing(handled, original) };
}

function strikeOf({ vessels, entry }: LoggedEntry, { message }: Here): Parameters<typeof noting>[1][number] {
  return {
    happening: { kind: 'correction', vessels, corrects: entry, reason: 'edited' },
    at: message.at,
    key: `strike ${entry}`,
  };
}

/** What the new text wants must be no more than a reading; what the message has noted, neither. */
function refusalByText(
  { readings }: Understood,
  before: readonly LoggedEntry[],
  { me }: Here,
): Refusal | undefined {
  const entry = before.find((one) => !isReading(one) && one.struck === undefined);
  if (entry) return { key: 'edited-noted', entry };
  const isAct = readings.some(({ intent }) => intent === 'command' || intent === 'added');
  return isAct || before.some(({ by }) => by !== me) ? { key: 'edited-anew' } : undefined;
}

async function refusalByTime(
  original_at: number,
  understood: Understood,
  before: readonly LoggedEntry[],
  { message }: Here,
  view: CellarView,
): Promise<Refusal | undefined> {
  const vessels = new Set([...vesselsNamed(understood), ...before.flatMap((one) => one.vessels)]);
  for (const vessel of vessels) {
    const last = await view.entries({ vessel, last: LOOKED_AT });
    const entry = last.find(
      ({ kind, struck, noted_at }) => kind === 'addition' && struck === undefined && noted_at >= original_at,
    );
    if (entry) return { key: 'edited-added', entry };
  }
  return message.at - original_at > CORRECTS_ms ? { key: 'edited-late' } : undefined;
}

function isReading(entry: LoggedEntry): boolean {
  return entry.kind === 'reading' || (entry.kind === 'vessel' && entry.event === 'told');
}

function refuse({ key, entry }: Refusal, { settings }: Here): Handled {
  const values =
    entry === undefined ? {} : { entry: String(entry.entry), vessel: vesselNames(entry.vessels) };
  const lines = [line('first', key, values)];
  return { writes: [], replies: [{ language: settings.language, lines, buttons: [] }] };
}

/** The sample is as old as the message was. */
function sampledThen(handled: Handled, original_at: number, { message }: Here): Handled {
  const writes = handled.writes.map((write) =>
    write.kind === 'entry' && write.entry.at === message.at
      ? { ...write, entry: { ...write.entry, at: original_at } }
      : write,
  );
  return { ...handled, writes };
}

function replacing({ replies }: Handled, original: string): Handled['replies'] {
  const [first, ...others] = replies;
  if (first === undefined) return [];
  return [{ ...first, lines: [line('first', 'corrected'), ...first.lines], replaces: original }, ...others];
}
