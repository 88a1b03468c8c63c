import { textOf, type Place } from './bot.ts';
import { picked } from './buttons.ts';
import { note } from './model.ts';
import { DAY_ms, MINUTE_ms, VESSELS, type Move } from './move.ts';
import { holding, mayBeStruck, openOrders, strikes, undoable } from './rules.ts';
import { firstLine, must, presses, writes } from './saying.ts';

/** `undo`: one's own last entry, within a quarter of an hour. */
export function undoes(place: Place): Move {
  return {
    name: `undoes as ${place.person}`,
    play: async (model, bot) => {
      const last = undoable(model.log, place.person, model.now);
      const said = await writes('undo', place, model, bot);
      if (last === undefined) must(!firstLine(said).startsWith('Struck'), `struck: ${textOf(said)}`);
      else note(model, { is: 'correction', vessel: last.vessel, corrects: last.entry }, place);
    },
  };
}

/** `strike 17 typo`, also of what was struck, what is a correction, and what is none. */
export function strikesOut(pick: number, place: Place): Move {
  return {
    name: `strikes entry ${pick}`,
    can: ({ log }) => log.length > 0,
    play: async (model, bot) => {
      const entry = 1 + (pick % (model.log.length + 1));
      const may = mayBeStruck(model.log, entry);
      const said = await writes(`strike ${entry} typo`, place, model, bot);
      must(firstLine(said).startsWith('Struck') === may, `struck or not: ${textOf(said)}`);
      const vessel = model.log[entry - 1]?.vessel ?? '';
      if (may) note(model, { is: 'correction', vessel, corrects: entry }, place);
    },
  };
}

/** "Undo 17" beside an entry. */
export function pressesUndo(pick: number, place: Place): Move {
  return {
    name: `${place.person} presses undo`,
    can: (model) => picked('u', undefined, pick, model) !== undefined,
    play: async (model, bot) => {
      const { key } = picked('u', undefined, pick, model)!;
      const noted = model.log[Number(key.slice(2)) - 1]!;
      const is_late = model.now - noted.noted_at > 15 * MINUTE_ms;
      const may = noted.by === place.person && !is_late && !strikes(model.log).has(noted.entry);
      const said = await presses(key, place, model, bot);
      must(firstLine(said).startsWith('Struck') === may, `struck or not: ${textOf(said)}`);
      if (may) note(model, { is: 'correction', vessel: noted.vessel, corrects: noted.entry }, place);
    },
  };
}

/** `open` and `today` say what the rules have. */
export function looks(place: Place): Move {
  return {
    name: 'looks at open orders and the day',
    play: async (model, bot) => {
      const open = textOf(await writes('open', place, model, bot));
      const listed = [...open.matchAll(/^(\d+) · /gm)].map(([, entry]) => Number(entry));
      const wanted = VESSELS.flatMap((vessel) => openOrders(model.log, vessel));
      const sorted = (numbers: readonly number[]): string => numbers.toSorted((a, b) => a - b).join(' ');
      must(sorted(listed) === sorted(wanted), `open: ${sorted(wanted)} by the rules, but ${open}`);
      const sheet = textOf(await writes('today', place, model, bot));
      const day = Math.floor(model.now / DAY_ms);
      const today = model.log.filter(({ at }) => Math.floor(at / DAY_ms) === day);
      const struck = strikes(model.log);
      for (const { entry } of today) {
        const line = sheet.split('\n').find((one) => one.startsWith(`${entry} · `)) ?? '';
        must(line !== '', `entry ${entry} is not in the sheet: ${sheet}`);
        must(/STRUCK/.test(line) === struck.has(entry), `struck or not: ${line}`);
      }
      must(
        holding(model.log).length + struck.size * 2 === model.log.length,
        'the rules contradict themselves',
      );
    },
  };
}
