import type { CellarView } from '../../../../core/cellar/cellar-store.ts';
import type { Reading } from '../../../reader/understood.ts';
import { withVessels, type Here } from '../../here.ts';
import { setLanguage } from '../../language.ts';
import { line } from '../../lines/line.ts';
import { vesselText } from '../../lines/vessel.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { join } from '../../cellar/join.ts';
import { goTo, nameCellar, readAlong } from './cellars.ts';
import { invite } from './invite.ts';
import { changeRole, listPeople } from './people.ts';
import { drawPicture } from './picture.ts';
import { daySheet, historySheet } from './sheets.ts';
import { forgetPerson } from './forget-person.ts';
import { leaveCellar } from './leave-cellar.ts';
import { limitSheet } from './limit-sheet.ts';
import { tellBlend } from '../../lab/blend.ts';
import { tellForecast } from '../../lab/forecast.ts';
import { tellMolecular } from '../../lab/molecular.ts';
import { tellRange } from '../../lab/range.ts';
import { tellTable } from '../../lab/table.ts';
import { tellTooMuch } from '../../lab/too-much.ts';
import { listVessels, listDue, listOrders } from './lists.ts';
import { lastSheet } from '../../round/take-sheet.ts';
import { setSetting, settingWrong, showSettings } from './settings.ts';
import { noteStock, showStock } from './stock.ts';
import { strikeEntry, undoEntry } from './undo.ts';
import { takeAway } from './take-away.ts';
import { vesselSheet } from './vessel-sheet.ts';

/** What a chat is told as a whole is in its own language, whoever asks. */
const inChatLanguage = (here: Here): Here => ({
  ...here,
  settings: { ...here.settings, language: here.chatLanguage },
});

/**
 * One of the bot's own words: it looks the answer up. Undefined for statements about vessels and for orders, which are
 * answered like any other reading.
 */
export async function answerCommand(
  reading: Reading,
  here: Here,
  view: CellarView,
): Promise<Handled | undefined> {
  const { command, fields } = reading;
  switch (command?.name) {
    case 'vessel':
      return vesselSheet(fields.vessel, here);
    case 'vessels':
      return listVessels(here, view);
    case 'due':
      return listDue(here, view);
    case 'open':
      return listOrders(here, view);
    case 'day':
      return daySheet(command.day, inChatLanguage(here), view);
    case 'language':
      return setLanguage(command.language, here, view);
    case 'history':
      return historySheet(fields.vessel, here, view);
    case 'undo':
      return undoEntry(await view.lastEntryBy(here.me), here);
    case 'strike': {
      const entry = await view.entry(command.entry);
      const near = entry ? await withVessels(here, view, entry.vessels) : here;
      return strikeEntry(entry, command.reason, near, String(command.entry));
    }
    case 'settings':
      return showSettings(here);
    case 'set':
      return setSetting(command.setting, here, view);
    case 'set-wrong':
      return settingWrong(command.of, command.about, here);
    case 'export':
    case 'import':
    case 'backup':
      return takeAway(command, fields.vessel, here);
    case 'forget-me':
      return forgetPerson(here, view);
    case 'round-sheet':
      return lastSheet(command.form, here, view);
    case 'limit':
      return limitSheet(reading, here);
    case 'full-dose':
      return replying(here, { lines: [line('first', 'full-dose-none')] });
    case 'picture':
      return drawPicture(fields.vessel, here);
    case 'stock':
      return showStock(fields.additive, here, view);
    case 'stock-note':
      return noteStock(reading, command, here, view);
    case 'range':
      return tellRange(fields.vessel, here, view);
    case 'table':
      return tellTable(command, here);
    case 'molecular':
      return tellMolecular(fields.vessel, here);
    case 'forecast':
      return tellForecast(fields.vessel, here);
    case 'blend':
      return tellBlend(command, here, view);
    case 'too-much':
      return tellTooMuch(fields.vessel, here);
    case 'added-it':
      return replying(here, { lines: [line('first', 'added-it-none', { vessel: vesselText(reading) })] });
    case 'invite':
      return invite(command.role, here, view);
    case 'join':
      return join(command.code, here, view);
    case 'people':
      return listPeople(here, view);
    case 'remove-person':
      return changeRole(command.who, 'none', here, view);
    case 'make-person':
      return changeRole(command.who, command.role, here, view);
    case 'at':
      return goTo(command.cellar, here, view);
    case 'leave':
      return leaveCellar(command.cellar, here, view);
    case 'name-cellar':
      return nameCellar(command.as, here);
    case 'read-along':
      return readAlong(command.on, here);
    case 'order':
    case 'later':
    case 'unwatch':
    case 'watch':
    case 'forget':
    case 'told':
    case 'capacity':
    case 'racked':
    case 'topped':
    case 'acid':
    case 'moved':
    case 'blended':
    case 'emptied':
    case 'lot':
      return undefined;
    case undefined:
      return replying(here, { lines: [line('first', 'send-alone')] });
  }
}
