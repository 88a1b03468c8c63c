import type { CellarView } from '../../core/cellar/cellar-store.ts';
import type { RoundInFile } from '../attachments/import-read.ts';
import type { RoundSheet } from '../attachments/round/round-sheet.ts';
import { finishReading } from '../reader/finish-reading.ts';
import { readSheetText } from '../reader/read-message.ts';
import type { Reading } from '../reader/understood.ts';
import { answerRound } from './answer-round.ts';
import { checkFields } from './check-fields.ts';
import { withVessels, type Here } from './here.ts';
import { fileRoundKey, roundKey } from './keys.ts';
import { line } from './lines/line.ts';
import type { Handled } from './ports.ts';
import { replying } from './replying.ts';
import { takeSheet } from './round/take-sheet.ts';
import { vesselsNamed } from './vessels-named.ts';
import { refAt } from './next-memory.ts';

/** A button under a file that may be a round: dose it, or note its readings. */
export async function takeRoundOfFile(
  ref: string,
  does: 'dose' | 'note',
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const key = fileRoundKey(here.message.chat, ref);
  const text = await view.kept(key);
  if (text === undefined) return replying(here, { lines: [line('first', 'old-button')] });
  // Named by the file and not by the tap: however often it is tapped, its readings are noted once.
  const event = `${key} `;
  const before = await view.entriesOfKeys(event);
  const own = { ...here, event, done: new Set(before.map((one) => one.key)) };
  return answerRoundOfFile(JSON.parse(text) as RoundInFile, does, own, view);
}

/** The round of a file as if its lines had been written here; a dose comes with its sheet, made as the file was. */
export async function answerRoundOfFile(
  round: RoundInFile,
  does: 'dose' | 'note',
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const { text, format } = round;
  const message = { ...here.message, content: { kind: 'text', text } as const };
  const understood = readSheetText(text, here.settings);
  const readings = understood.readings.map((one) =>
    checkFields(does === 'note' ? asReading(one, here) : one, understood.shared),
  );
  const near = await withVessels({ ...here, message }, view, vesselsNamed(understood));
  const handled = answerRound({ ...understood, readings }, near);
  const left =
    round.left.length === 0
      ? []
      : [line('question', 'file-round-left', { lines: round.left.slice(0, MOST_LEFT).join(', ') })];
  const [first, ...others] = handled.replies;
  const replies = first === undefined ? [] : [{ ...first, lines: [...first.lines, ...left] }, ...others];
  const sheet = sheetIn(handled, near);
  if (does === 'note' || sheet === undefined) return { ...handled, replies };
  const { errand } = takeSheet(sheet, format, here);
  return { ...handled, replies, ...(errand && { errand }) };
}

/** So many lines that were not understood are named. */
const MOST_LEFT = 20;

/** What was measured and nothing that is asked: no target, no additive. */
function asReading(reading: Reading, { settings }: Here): Reading {
  if (reading.intent !== 'dose' || reading.problems.length > 0) return reading;
  const { assumed: _assumed, asks: _asks, ...draft } = reading;
  return finishReading({ ...draft, intent: 'reading' }, settings);
}

/** The sheet that a round has kept. */
function sheetIn({ writes }: Handled, here: Here): RoundSheet | undefined {
  const key = roundKey(here.message.chat, refAt(here));
  const kept = writes.find((write) => write.kind === 'keep' && write.key === key);
  return kept?.kind === 'keep' ? (JSON.parse(kept.text) as RoundSheet) : undefined;
}
