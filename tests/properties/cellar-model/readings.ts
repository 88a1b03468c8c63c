import type { Said } from '../../../src/chat/replies/say.ts';
import { textOf, type Bot, type Place } from './bot.ts';
import { picked } from './buttons.ts';
import { note, type Model, type Shown } from './model.ts';
import { DAY_ms, MINUTE_ms, momentOf, WORDS, type Move, type VesselName } from './move.ts';
import { lastAddition, standings, strikes } from './rules.ts';
import { must, presses, shows, writes } from './saying.ts';

/** What somebody reads on a vessel. */
export interface Measured {
  readonly free_mg_L: number;
  readonly ph?: number;
  readonly volume_L?: number;
}

/** What says no time is of now, or goes on with what the same person has just told of a sample. */
async function untoldSample(vessel: string, place: Place, { log, now }: Model, bot: Bot): Promise<number> {
  const at = (await bot.look((view) => view.entry(log.length + 1)))?.at ?? now;
  const before = log.findLast(
    (one) => one.is === 'reading' && one.vessel === vessel && one.by === place.person,
  );
  const goesOn = before !== undefined && before.at === at && now - before.noted_at < 60 * MINUTE_ms;
  must(at === now || goesOn, `a reading of no sample that was told: ${new Date(at).toISOString()}`);
  return at;
}

/** A volume that was asked about is confirmed where the same person says it once more while the question waits. */
async function isConfirmed(
  vessel: string,
  { volume_L }: Measured,
  place: Place,
  { log, now, askedVolumes }: Model,
  bot: Bot,
): Promise<boolean> {
  if (volume_L === undefined) return false;
  const name = `${place.person} ${place.chat} ${vessel} ${volume_L}`;
  const asked_at = askedVolumes.get(name);
  askedVolumes.set(name, now);
  const entry = await bot.look((view) => view.entry(log.length + 1));
  const isKept = entry?.kind === 'reading' && entry.volume_L === volume_L;
  must(!isKept || (asked_at !== undefined && now - asked_at < 60 * MINUTE_ms), 'a volume that does not fit');
  return isKept;
}

/** A question for a dose with all that it takes, or with as little as people write; perhaps of an earlier sample. */
export function reads(vessel: VesselName, measured: Measured, place: Place, minutes?: number): Move {
  return {
    name: `reads ${JSON.stringify(measured)} on ${vessel}, ${minutes} min ago`,
    play: async (model, bot) => {
      const { free_mg_L, ph, volume_L } = measured;
      const moment = momentOf(model.now, minutes);
      const known = standings(model.log).get(vessel);
      const before = lastAddition(model.log, vessel);
      const isWhole = volume_L !== undefined && ph !== undefined;
      const text = [
        WORDS[vessel],
        ...(volume_L === undefined ? [] : [`${volume_L} L white`]),
        ...(ph === undefined ? [] : [`pH ${ph}`]),
        `free ${free_mg_L}`,
        ...(isWhole ? ['ML done'] : []),
        ...(moment ? [`sampled ${moment.text}`] : []),
      ].join(' ');
      const said = await writes(text, place, model, bot);
      const sampled_at = moment?.at ?? (await untoldSample(vessel, place, model, bot));
      const fits =
        volume_L !== undefined &&
        (typeof known?.volume_L !== 'number' || Math.abs(volume_L / known.volume_L - 1) <= 0.05);
      const isKept = fits || (await isConfirmed(vessel, measured, place, model, bot));
      const { entry } = note(
        model,
        {
          is: 'reading',
          vessel,
          free_mg_L,
          ...(ph !== undefined && { ph }),
          ...(isKept && volume_L !== undefined && { volume_L }),
          ...(isWhole && { stage: 'over' as const }),
        },
        place,
        sampled_at,
      );
      shows(said, place.chat, { vessel, reading: entry, sampled_at, said_at: model.now }, model);
      const isDosed = before !== undefined && (before.at > sampled_at || before.at > model.now - DAY_ms);
      const gives = said.some(({ buttons }) => buttons.some(({ key }) => key.startsWith('a:')));
      if (isDosed) {
        // Where a sample from after it tells where it landed, that comes first.
        const opening = textOf(said).split('\n').slice(0, 3).join('\n');
        must(/added/.test(opening), `opens otherwise: ${textOf(said)}`);
        must(!gives && !/weigh/.test(textOf(said)), `a dose after an addition: ${textOf(said)}`);
      } else if (isWhole && fits && before?.at !== model.now - DAY_ms)
        must(gives, `no dose: ${textOf(said)}`);
    },
  };
}

/** `T4 now free 38 pH 3.6`: kept, without a question for a dose. */
export function keeps(vessel: VesselName, { free_mg_L, ph }: Measured, place: Place): Move {
  return {
    name: `keeps free ${free_mg_L} pH ${ph} of ${vessel}`,
    play: async (model, bot) => {
      const text = `${WORDS[vessel]} now free ${free_mg_L}${ph === undefined ? '' : ` pH ${ph}`}`;
      const said = await writes(text, place, model, bot);
      note(model, { is: 'reading', vessel, free_mg_L, ...(ph !== undefined && { ph }) }, place);
      must(!/weigh/.test(textOf(said)), `a dose that nobody asked for: ${textOf(said)}`);
    },
  };
}

/** "Before" and "After", where it was asked which came first, and "A dose all the same". */
export function answersSampled(does: 'gb' | 'ga' | 'gd', pick: number, place: Place): Move {
  return {
    name: `answers ${does}`,
    can: (model) => picked(does, place.chat, pick, model) !== undefined,
    play: async (model, bot) => {
      const button = picked(does, place.chat, pick, model)!;
      const said = await presses(button.key, place, model, bot);
      const { key: _key, chat: _chat, shown_at: _shown, mass_g: _mass, ...about } = button;
      shows(said, place.chat, { ...about, isAnyway: about.isAnyway ?? does === 'gd' }, model);
      if (does !== 'gd')
        must(!hadAddition(model, button.vessel) || !/weigh/.test(textOf(said)), `a dose: ${textOf(said)}`);
      mustNotBeOld({ ...button, isAnyway: true }, said, model);
      if (does === 'gb') await movedBefore(button, place, model, bot);
    },
  };
}

function hadAddition({ log, now }: Model, vessel: string): boolean {
  const last = lastAddition(log, vessel);
  return last !== undefined && last.at > now - 1440 * MINUTE_ms;
}

/** No dose comes of a sample that something went in after, unless one was wanted all the same and nothing did since. */
function mustNotBeOld(button: Shown, said: readonly Said[], { log, now }: Model): void {
  const { vessel, sampled_at = 0, said_at = 0, isAnyway } = button;
  const { at = 0 } = lastAddition(log, vessel) ?? {};
  const since = isAnyway ? Math.max(sampled_at, said_at) : Math.min(sampled_at, now - DAY_ms);
  must(at <= since || !/weigh/.test(textOf(said)), `a dose of an old sample: ${textOf(said)}`);
}

/** "Another target" under a dose, however long ago, and a figure. */
export function wantsAnotherTarget(pick: number, place: Place): Move {
  return {
    name: 'wants another target',
    can: (model) => picked('a', place.chat, pick, model)?.said_at !== undefined,
    play: async (model, bot) => {
      const button = picked('a', place.chat, pick, model)!;
      await presses(`t${button.key.slice(1)}`, place, model, bot);
      mustNotBeOld(button, await writes('33', place, model, bot), model);
    },
  };
}

/** The reading is taken back and noted anew at a time before the addition; which time, the program chooses. */
async function movedBefore({ reading, vessel }: Shown, place: Place, model: Model, bot: Bot): Promise<void> {
  const last = lastAddition(model.log, vessel);
  const entry = model.log[(reading ?? 0) - 1];
  if (
    entry?.is !== 'reading' ||
    strikes(model.log).has(entry.entry) ||
    last === undefined ||
    entry.at < last.at
  )
    return;
  note(model, { is: 'correction', vessel, corrects: entry.entry }, place);
  const anew = await bot.look((view) => view.entry(model.log.length + 1));
  must(anew !== undefined && anew.at < last.at, 'the reading was not noted anew before the addition');
  const { entry: _entry, at: _at, noted_at: _noted, by: _by, ...same } = entry;
  note(model, same, place, anew?.at);
}
