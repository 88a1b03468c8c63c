import { describe, expect, test } from 'vitest';
import { handle } from '../../../src/chat/conversation/conversation.ts';
import type { IncomingMessage } from '../../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import type { CellarStore } from '../../../src/core/cellar/cellar-store.ts';
import { DAY_ms } from '../../../src/core/time/durations.ts';
import { openDemo } from '../../../src/edge/demo/open-demo.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { makeServe, type Served } from '../../../src/edge/serve-message.ts';
import { AT_TERMINAL } from '../../../src/edge/terminal/chat.ts';

const say = makeSay(loadLocales());

/** In its first minute a day has no sheet yet. */
const MIDNIGHT = ['Europe/Madrid', '2026-12-01T23:00:00Z'] as const;

/** Hours at which somebody may start it: of a day, of a night, and on the days on which clocks are changed. */
const STARTS = [
  ['Europe/Madrid', '2026-12-01T15:20:00Z'],
  MIDNIGHT,
  ['Europe/Madrid', '2027-01-14T05:31:00Z'],
  ['Europe/Madrid', '2026-10-25T00:30:00Z'],
  ['America/Los_Angeles', '2027-03-14T10:15:00Z'],
  ['Pacific/Auckland', '2027-06-21T12:05:00Z'],
  ['UTC', '2028-02-29T12:00:00Z'],
] as const;

const fail = (fault: unknown): never => {
  throw fault;
};

interface Demo {
  readonly store: CellarStore;
  /** What its people wrote, with the answers. */
  readonly told: readonly { readonly message: IncomingMessage; readonly served: Served }[];
  /** What somebody at the keyboard is answered. */
  readonly answerTo: (text: string) => Promise<string>;
}

async function open(zone: string, moment: string): Promise<Demo> {
  const at = Date.parse(moment);
  const settings = { ...DEFAULT_SETTINGS, zone };
  const told: { message: IncomingMessage; served: Served }[] = [];
  const each = (message: IncomingMessage, served: Served): void => void told.push({ message, served });
  const store = await openDemo({ say, settings, now: () => at, each });
  const serve = makeServe({ handle, say, store, settings, report: fail });
  const answerTo = async (text: string): Promise<string> => {
    const content = { kind: 'text', text } as const;
    const { said } = await serve({ ...AT_TERMINAL, id: text, at, language: 'en', content });
    return said.map((one) => one.text).join('\n');
  };
  return { store, told, answerTo };
}

/** The entries of a sheet, by the numbers in front of them. */
const numbered = (sheet: string): string[] => sheet.split('\n').filter((line) => /^\d+ · /.test(line));

describe.each(STARTS)('the demo in %s at %s', (zone, moment) => {
  test('each message is understood, and notes one thing or sets one', async () => {
    const { store, told } = await open(zone, moment);
    const wrong = told.flatMap(({ message, served: { understood, said } }) => {
      const { readings = [] } = understood ?? {};
      const isRight = readings.every(
        ({ intent, problems, asks }) =>
          intent !== 'chat' && asks.length === 0 && problems.every(({ code }) => code === 'unknown-additive'),
      );
      return isRight && readings.length === 1 ? [] : [[message.content, said.map(({ text }) => text)]];
    });
    expect(wrong).toEqual([]);
    // What is no sulphite is noted as it was written.
    const entries = await store.look(AT_TERMINAL.cellar, (view) => view.entries({}));
    const sets = told.filter(({ served }) => served.understood?.readings[0]?.command?.name === 'set');
    expect(entries.map(({ noted_at }) => noted_at)).toEqual(
      told.filter((one) => !sets.includes(one)).map(({ message }) => message.at),
    );
  });

  test('the messages are in order, and none is of the future', async () => {
    const { told } = await open(zone, moment);
    const times = told.map(({ message }) => message.at);
    expect(times).toEqual(times.toSorted((one, other) => one - other));
    expect(Math.max(...times)).toBeLessThan(Date.parse(moment));
  });

  test('what the greeting names is there: a history, a list of what is due, and a dose for a reading', async () => {
    const { answerTo } = await open(zone, moment);
    expect(numbered(await answerTo('T4 history')).length).toBeGreaterThan(8);
    expect((await answerTo('due')).split('\n').length).toBeGreaterThan(4);
    expect(await answerTo('T6 free 21')).toMatch(/^T6: weigh \d+ g potassium metabisulfite\n/);
  });

  test('there is a sheet of the day before, with an entry struck', async () => {
    const { answerTo } = await open(zone, moment);
    const sheet = await answerTo('yesterday');
    expect(numbered(sheet).length).toBeGreaterThan(5);
    expect(sheet).toContain('STRUCK');
  });

  test('a lot of every wine is told, and what moved with it', async () => {
    const { store } = await open(zone, moment);
    const vessels = await store.look(AT_TERMINAL.cellar, (view) => view.vessels());
    const lots = Object.fromEntries(vessels.map(({ vessel, lot }) => [vessel, lot?.value]));
    expect(lots).toEqual({
      'tank 1': 'Blanca',
      'tank 2': undefined,
      'tank 3': 'Brasa',
      'tank 4': 'Rosada',
      'tank 5': 'Tardia',
      'tank 6': 'Marea',
      B1: 'Brasa',
      B2: 'Brasa',
      B3: 'Brasa',
      B4: 'Brasa',
    });
  });

  test('nothing that falls due for its people is for the one at the keyboard', async () => {
    const { store } = await open(zone, moment);
    const due = await store.takeDue(Date.parse(moment) + 365 * DAY_ms, { lease_ms: 1, most: 1000 });
    expect(due.map(({ chat }) => chat)).not.toContain(AT_TERMINAL.chat);
  });
});

test.each(STARTS.filter((start) => start !== MIDNIGHT))(
  'the sheet of the day has entries in %s at %s',
  async (zone, moment) => {
    const { answerTo } = await open(zone, moment);
    expect(numbered(await answerTo('today')).length).toBeGreaterThan(1);
  },
);
