import { expect, test } from 'vitest';
import type { LoggedEntry } from '../../../src/core/cellar/entry.ts';
import { handle } from '../../../src/chat/conversation/conversation.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { makeServeTurn } from '../../../src/edge/serve-message.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { MORNING, say } from './talk.ts';

const MINUTE_ms = 60_000;

/** A cellar in which messages are written and edited. */
function startCellar() {
  const store = createMemoryCellars({ now: () => MORNING });
  const serve = makeServeTurn({ handle, say, store, settings: DEFAULT_SETTINGS });
  const who = { cellar: 'c', chat: 'c', person: 'Ana', name: 'Ana', language: 'en' } as const;
  return {
    write: (id: string, text: string) => serve({ ...who, id, at: MORNING, content: { kind: 'text', text } }),
    edit: (id: string, text: string, after_min = 1) => {
      const at = MORNING + after_min * MINUTE_ms;
      const content = { kind: 'edited', text, original: '1', original_at: MORNING } as const;
      return serve({ ...who, id, at, content });
    },
    log: (): Promise<string[]> => store.look('c', async (view) => (await view.entries({})).map(shown)),
    vessel: (name: string) => store.look('c', (view) => view.vessel(name)),
  };
}

const shown = (entry: LoggedEntry): string => {
  const what =
    entry.kind === 'correction' ? `strikes ${entry.corrects}` : 'free_mg_L' in entry ? entry.free_mg_L : '';
  return `${entry.entry} ${entry.kind} ${what}${entry.struck ? ' struck' : ''}`;
};

test('the same edit delivered twice does nothing twice', async () => {
  const { write, edit, log } = startCellar();
  await write('1', 'T4 5200 L red pH 3.6 free 20, ML done');
  const first = await edit('1 edited a', 'T4 5200 L red pH 3.6 free 25, ML done');
  const again = await edit('1 edited a', 'T4 5200 L red pH 3.6 free 25, ML done');
  expect(first.said[0]?.replaces).toBe('1');
  expect(again.said[0]?.text.split('\n').slice(0, 2)).toEqual(first.said[0]?.text.split('\n').slice(0, 2));
  expect(await log()).toEqual(['1 reading 20 struck', '3 reading 25', '2 correction strikes 1']);
});

test('an older edit that comes late strikes nothing of a newer one', async () => {
  const { write, edit, vessel } = startCellar();
  await write('1', 'T4 5200 L red pH 3.6 free 20, ML done');
  await edit('1 edited a', 'T4 5200 L red pH 3.6 free 25, ML done');
  await edit('1 edited b', 'T4 5200 L red pH 3.6 free 28, ML done', 2);
  await edit('1 edited a', 'T4 5200 L red pH 3.6 free 25, ML done');
  expect((await vessel('tank 4'))?.free_mg_L?.value).toBe(28);
});

test('what the first text said of the wine fills in nothing any more', async () => {
  const { write, edit } = startCellar();
  await write('1', 'T4 5200 L red pH 3.9 free 20, ML done');
  const { said } = await edit('1 edited a', 'T4 5200 L free 20, ML done');
  expect(said[0]?.text).toContain('what pH?');
  expect(said[0]?.text).not.toContain('3.9');
});

test('another vessel in the edit leaves nothing with the first', async () => {
  const { write, edit, vessel } = startCellar();
  await write('1', 'T4 5200 L red pH 3.6 free 20, ML done');
  await edit('1 edited a', 'T5 5200 L red pH 3.6 free 20, ML done');
  expect((await vessel('tank 4'))?.free_mg_L).toBeUndefined();
  expect((await vessel('tank 5'))?.free_mg_L?.value).toBe(20);
});

test('the sample stays as old as its message, and the cautions are said in full again', async () => {
  const { write, edit, vessel } = startCellar();
  const before = await write('1', 'T4 5200 L red pH 3.6 free 20, ML done');
  const { said } = await edit('1 edited a', 'T4 5200 L red pH 3.6 free 25, ML done', 10);
  expect((await vessel('tank 4'))?.free_mg_L?.at).toBe(MORNING);
  expect(said[0]?.text.split('\n').at(-1)).toBe(before.said[0]?.text.split('\n').at(-1));
});

test.each([
  [15, true],
  [15.1, false],
])('an edit after %d minutes corrects: %s', async (after_min, corrects) => {
  const { write, edit, log } = startCellar();
  await write('1', 'T4 5200 L red pH 3.6 free 20, ML done');
  const { said } = await edit('1 edited a', 'T4 5200 L red pH 3.6 free 25, ML done', after_min);
  expect(said[0]?.replaces === '1').toBe(corrects);
  expect((await log()).length).toBe(corrects ? 3 : 1);
});

test.each([
  '2',
  'a',
  'undo',
  'forget T4',
  'we work in gallons',
  'added 20 g kmbs T4',
  'join c-0123456789abcdef',
  'racked T4',
])('an edit to %j presses, sets, notes and joins nothing', async (text) => {
  const { write, edit, log } = startCellar();
  await write('1', 'T4 5200 L red pH 3.6 free 20, ML done');
  await edit('1 edited a', text);
  const log_now = await log();
  expect(log_now.filter((one) => !/reading|strikes 1/.test(one))).toEqual([]);
});
