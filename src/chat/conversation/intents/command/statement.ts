import type { VesselChange, VesselEvent, WineTraits } from '../../../../core/cellar/entry.ts';
import { TRAIT_NAMES } from '../../../../core/cellar/trait-names.ts';
import type { Vessel } from '../../../../core/cellar/vessel.ts';
import { holdsWine } from '../../../../core/cellar/pour.ts';
import { DAY_ms } from '../../../../core/time/durations.ts';
import type { Command } from '../../../reader/command.ts';
import type { Fields, Reading } from '../../../reader/understood.ts';
import { dayText, momentText } from '../../../replies/moment-text.ts';
import type { Line } from '../../../replies/reply.ts';
import { vesselName, vesselNames } from '../../../replies/vessel-name.ts';
import { volumeText } from '../../../replies/volume-text.ts';
import { entryButtons } from '../../buttons.ts';
import type { Here } from '../../here.ts';
import { entryPart } from '../../lines/entry-part.ts';
import { line } from '../../lines/line.ts';
import type { Note } from '../../note.ts';
import type { Outcome, Turn } from '../../outcome.ts';
import { whenIsUnclear } from '../when-unclear.ts';
import { tellingOf } from '../../telling.ts';
import { vesselsIn } from '../../vessels-named.ts';
import { whenOf } from '../../when.ts';

/** The commands that state something about a vessel, and the event that the log keeps of each. */
const EVENTS: Readonly<Partial<Record<Command['name'], VesselEvent>>> = {
  told: 'told',
  capacity: 'told',
  racked: 'racked',
  topped: 'topped',
  acid: 'acid',
  moved: 'moved',
  blended: 'blended',
  emptied: 'emptied',
  lot: 'lot',
  later: 'later',
  unwatch: 'unwatched',
  watch: 'watched',
  forget: 'forgotten',
};

/** Something stated about a vessel: noted at once as the fact that it is, with what is odd about it and undo beside it. */
export function answerStatement(reading: Reading, turn: Turn): Outcome | undefined {
  const { command, fields } = reading;
  const vessels = vesselsIn(fields);
  const event = command && EVENTS[command.name];
  if (command === undefined || event === undefined || vessels.length === 0) return undefined;
  const { here } = turn;
  const unsaid = whenIsUnclear(reading, turn);
  if (unsaid) return unsaid;
  const when = whenOf(reading, here);
  if (event === 'forgotten' && !here.vessels.has(vessels[0] ?? '')) return unknown(vessels);
  const happening = changeOf(reading, command, event, here);
  const note: Note = { happening, at: when.at };
  const entry = {
    ...happening,
    entry: here.nextEntry,
    key: '',
    at: when.at,
    noted_at: here.message.at,
    by: here.me,
  };
  const first = {
    ...line('first', 'noted-vessel', { entry: String(here.nextEntry), ...effectOf(happening, here) }),
    list: [entryPart(entry, here)],
  };
  return {
    answer: null,
    notes: [note],
    inRound: [first],
    lines: [first, ...oddOf(happening, turn), ...(when.is === 'noon' ? [line('assumed', 'when-noon')] : [])],
    buttons: entryButtons(here.nextEntry, ['u']),
  };
}

function changeOf(reading: Reading, command: Command, event: VesselEvent, here: Here): VesselChange {
  const { fields, remark } = reading;
  const vessels = vesselsIn(fields);
  const volume_L = fields.volume_L === undefined ? undefined : fields.volume_L / vessels.length;
  const from = command.name === 'topped' ? command.from : undefined;
  const said = remark ?? (from === undefined ? undefined : vesselName(from));
  return {
    kind: 'vessel',
    event,
    vessels,
    ...('to' in command && { to: command.to }),
    ...(command.name === 'lot' && { lot: command.lot }),
    ...(command.name === 'later' && { until: here.message.at + command.days * DAY_ms }),
    ...(volume_L !== undefined && (command.name === 'capacity' ? { capacity_L: volume_L } : { volume_L })),
    ...traitsOf(fields),
    ...(said !== undefined && { remark: said }),
  };
}

/** What is told of the wine, by the names that an entry has for it. */
function traitsOf(fields: Fields): WineTraits {
  return Object.fromEntries(
    TRAIT_NAMES.flatMap((name) => (fields[name] === undefined ? [] : [[name, fields[name]]])),
  );
}

/** What the statement makes void, or leads to, as values of the sentence. */
function effectOf(change: VesselChange, here: Here): Record<string, string> {
  const [name] = change.vessels;
  const vessel = name === undefined ? undefined : here.vessels.get(name);
  const isVolume = change.event === 'racked' ? change.volume_L === undefined : change.event === 'topped';
  const voids =
    vessel?.ph !== undefined && (change.event === 'acid' || isMalolactic(change, vessel))
      ? 'ph'
      : vessel?.volume_L !== undefined && isVolume
        ? 'volume'
        : intoWine(change, here)
          ? 'blend'
          : 'none';
  const day = change.until === undefined ? '' : dayText(change.until, tellingOf(here));
  return { voids, day };
}

function isMalolactic({ stage }: VesselChange, { traits }: Vessel): boolean {
  const before = traits.stage?.value;
  return stage !== undefined && stage !== before && (stage === 'malolactic' || before === 'malolactic');
}

/** Whether wine is brought into other wine, whatever the words were. */
function intoWine({ event, to }: VesselChange, here: Here): boolean {
  if (event !== 'moved' && event !== 'blended') return false;
  const vessel = to === undefined ? undefined : here.vessels.get(to);
  return event === 'blended' || (vessel !== undefined && holdsWine(vessel));
}

/** What does not fit what is known: it is noted all the same, and asked to be looked at. */
function oddOf(change: VesselChange, { here, manner }: Turn): Line[] {
  const [name = ''] = change.vessels;
  const vessel = here.vessels.get(name);
  const target = change.to === undefined ? vessel : here.vessels.get(change.to);
  const capacity_L = change.capacity_L ?? target?.capacity_L?.value;
  const volume_L = change.volume_L ?? (change.capacity_L === undefined ? undefined : vessel?.volume_L?.value);
  const lines: Line[] = [];
  if (change.to !== undefined && vessel?.empty !== undefined)
    lines.push(
      line('first', 'odd-from-empty', {
        vessel: vesselName(name),
        when: momentText(vessel.empty, tellingOf(here)),
      }),
    );
  if (capacity_L !== undefined && volume_L !== undefined && volume_L > capacity_L * 1.01)
    lines.push(
      line('first', 'odd-over-capacity', {
        vessel: vesselName(change.to ?? name),
        volume: volumeText(volume_L, manner.volumeUnit, manner.mark),
        capacity: volumeText(capacity_L, manner.volumeUnit, manner.mark),
      }),
    );
  return lines;
}

function unknown(vessels: readonly string[]): Outcome {
  const first = line('first', 'vessel-unknown', { vessel: vesselNames(vessels) });
  return { answer: null, inRound: [first], lines: [first], buttons: [] };
}
