import { roundTotals } from '../attachments/round/round-totals.ts';
import type { AdditiveAtHand } from '../../core/additives/additive-id.ts';
import type { Reading, Understood } from '../reader/understood.ts';
import type { Button, Line, Reply } from '../replies/reply.ts';
import { answerReading } from './answer-reading.ts';
import { buttonsFor, keepButtons } from './buttons.ts';
import type { RoundSheet } from '../attachments/round/round-sheet.ts';
import { roundBody, roundFootShown } from './lines/round-body.ts';
import { roundFoot, type SaidInRound } from './lines/round-foot.ts';
import { shortLines } from './lines/stock.ts';
import { roundHead } from './lines/round-head.ts';
import { roundName } from './lines/round-names.ts';
import { vesselText } from './lines/vessel.ts';
import { mannerOf } from './manner.ts';
import type { Here } from './here.ts';
import { cautionedToday, keeping, nextMemory, refAt, remembering, type Said } from './next-memory.ts';
import { noting } from './note.ts';
import { notesOfReading } from './notes-of-reading.ts';
import type { Turn } from './outcome.ts';
import type { Handled } from './ports.ts';
import { asNoted, prepare } from './prepare.ts';
import { keepingRound } from './round/kept-round.ts';
import { roundButtons } from './round/round-buttons.ts';
import { roundData } from './round/round-data.ts';
import { rowOf } from './round/row-of.ts';
import { additiveOf } from './to-requests.ts';
import { withShared } from './with-shared.ts';

/** Vessels in one message; the others follow in a second one. */
const VESSELS_A_MESSAGE = 25;

/** So many results of titrations have a button each. */
const RESULTS_A_MESSAGE = 8;

/** A round of vessels: a line each; the stage, what was assumed and the cautions once. Nothing waits for an answer. */
export function answerRound(understood: Understood, here: Here): Handled {
  const { message, memory, settings } = here;
  const cautioned = cautionedToday(memory, message.at);
  const text = message.content.kind === 'text' ? message.content.text : '';
  const { decimalMark, shared } = understood;
  const readings = understood.readings.map((own) => prepare(withShared(own, shared), here));
  const additive = oneAdditive(readings);
  let nextEntry = here.nextEntry;
  const said: SaidInRound[] = readings.map((reading, place) => {
    const own = understood.readings[place] ?? reading;
    const manner = mannerOf(reading, decimalMark, here);
    const name = roundName(text, own);
    const round = { own: withoutVolumeIn(own, name), isOneAdditive: additive !== undefined };
    const ref = refAt(here, place);
    const turn: Turn = { settings, manner, ref, cautioned, here: { ...here, nextEntry }, round };
    const outcome = answerReading(named(reading, name), understood.language, turn);
    const notes = [...notesOfReading(reading, here), ...(outcome.notes ?? [])];
    nextEntry += notes.length;
    return { reading: asNoted(reading, here), outcome, ref, notes, name: name ?? vesselText(reading) };
  });
  const [first] = said;
  const head = first ? roundHead(additive, shared, mannerOf(first.reading, decimalMark, here)) : [];
  const foot = roundFoot(said, cautioned, decimalMark, here);
  const sheet = sheetOf(said, { head, foot, mark: decimalMark }, here);
  const buttons = [
    ...(sheet === undefined ? [] : roundButtons(sheet, here)),
    ...safetyButton(said, cautioned),
    ...keepButtons(said.flatMap(resultOf).slice(0, RESULTS_A_MESSAGE)),
  ].map((button, at) => ({ ...button, mark: String(at + 1) }));
  const { language } = settings;
  const replies: Reply[] =
    sheet === undefined
      ? chunks(said, VESSELS_A_MESSAGE).map((chunk, at): Reply => {
          const lines: Line[] = [...head, ...chunk.flatMap(({ outcome }) => warningsLast(outcome.inRound))];
          return {
            language,
            lines: at === 0 ? [...lines, ...foot] : lines,
            buttons: at === 0 ? buttons : [],
          };
        })
      : [
          {
            language,
            lines: [
              ...roundBody(sheet, isCautioning(said)),
              ...roundTotals(sheet.rows).flatMap((total) => shortLines(total, here)),
              ...otherLines(said),
              ...roundFootShown(sheet),
            ],
            buttons,
          },
        ];
  const next = nextMemory(here, understood, said, { buttons });
  return {
    writes: [
      ...noting(
        here,
        said.flatMap(({ notes }) => notes),
      ),
      ...said.flatMap(({ outcome }) => outcome.keeps ?? []),
      ...(sheet === undefined ? [] : keepingRound(sheet, here)),
      ...remembering(here, said),
      ...keeping(here, next),
    ],
    replies,
    understood: {
      ...understood,
      readings: said.map(({ reading, outcome }) =>
        outcome.isLanding ? { ...reading, intent: 'reading' } : reading,
      ),
    },
    answers: said.map(({ outcome }) => outcome.answer),
    ...(sheet !== undefined && { round: roundData(sheet) }),
  };
}

/** A titration of a vessel that may be kept as its reading. */
function resultOf({
  outcome,
  ref,
  reading,
}: SaidInRound): { ref: string; vessel: string; of: 'free' | 'total' }[] {
  const { vessel } = reading.fields;
  const mayBeKept = outcome.buttons.some(({ key }) => key === `k:${ref}`);
  return mayBeKept && vessel !== undefined ? [{ ref, vessel, of: reading.titration?.of ?? 'free' }] : [];
}

/** Whether the cautions of an additive are said in full. */
function isCautioning(said: readonly SaidInRound[]): boolean {
  return said.some(({ outcome }) => outcome.cautioned !== undefined);
}

/** What was said of lines that ask for no dose. */
function otherLines(said: readonly SaidInRound[]): Line[] {
  return said
    .filter((one) => rowOf(one) === undefined)
    .flatMap(({ outcome }) => warningsLast(outcome.inRound));
}

/** The weigh-out sheet of a round; undefined where no line of it asks for a dose. */
function sheetOf(
  said: readonly SaidInRound[],
  shared: Pick<RoundSheet, 'head' | 'foot' | 'mark'>,
  { message }: Here,
): RoundSheet | undefined {
  const rows = said.flatMap((one) => rowOf(one) ?? []);
  const [first] = said;
  if (first === undefined || rows.every(({ is }) => is === 'open')) return undefined;
  const unit = said.some(({ reading }) => reading.concentrationUnit === 'ppm') ? 'ppm' : 'mg/L';
  return { ref: first.ref, at: message.at, rows, unit, ...shared };
}

/** What a warning is about stands above it. */
function warningsLast(lines: readonly Line[]): Line[] {
  const isWarning = ({ key }: Line): boolean => key.startsWith('warning-');
  return [...lines.filter((one) => !isWarning(one)), ...lines.filter(isWarning)];
}

/** The one additive that all doses of a round take, named once above them; undefined where there are several. */
function oneAdditive(readings: readonly Reading[]): AdditiveAtHand | undefined {
  const doses = readings.filter(({ intent, problems }) => intent === 'dose' && problems.length === 0);
  const additives = doses.map(additiveOf).filter((one) => one !== undefined);
  const [first] = additives;
  const isOne = new Set(additives.map((one) => JSON.stringify(one))).size === 1;
  return isOne && doses.some(({ asks }) => asks.length === 0) ? first : undefined;
}

/** A wine without a vessel goes by the words of its line. */
function named(reading: Reading, name: string | undefined): Reading {
  if (name === undefined) return reading;
  return { ...reading, fields: { ...reading.fields, vessel: name } };
}

/** Words that hold the volume need not be followed by it. */
function withoutVolumeIn(own: Reading, name: string | undefined): Reading {
  const written = own.where.volume_L?.text;
  if (name === undefined || written === undefined || !name.endsWith(written)) return own;
  const { volume_L: _named, ...fields } = own.fields;
  return { ...own, fields };
}

/** The cautions in full, where they stand in one line as they were said before. */
function safetyButton(said: readonly Said[], cautioned: ReadonlySet<string>): Button[] {
  const found = said.find(({ reading, outcome }) => {
    const additive = outcome.answer === null ? undefined : additiveOf(reading);
    return additive !== undefined && cautioned.has(additive.id);
  });
  return found === undefined ? [] : buttonsFor(found.ref, ['s']);
}

function chunks<T>(all: readonly T[], size: number): T[][] {
  const starts = Array.from({ length: Math.ceil(all.length / size) }, (_, at) => at * size);
  return starts.map((start) => all.slice(start, start + size));
}
