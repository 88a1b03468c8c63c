import { expect, test } from 'vitest';
import type { Write } from '../../../../src/core/cellar/cellar-store.ts';
import { handle } from '../../../../src/chat/conversation/conversation.ts';
import { ROSTER_KEY, SETTINGS_KEY } from '../../../../src/chat/conversation/keys.ts';
import type { Content, Handled, IncomingMessage } from '../../../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../../../src/chat/conversation/settings.ts';
import { createMemoryCellars } from '../../../../src/edge/store/memory-cellars.ts';
import { labelledIn } from '../../../messages/judge.ts';
import { MORNING } from '../talk.ts';

/** A cellar with a keeper, a hand and a guest, in which a dose stands open. */
async function startCellar(): Promise<(person: string, content: Content) => Promise<Handled>> {
  const store = createMemoryCellars({ now: () => MORNING });
  let count = 0;
  const send = (person: string, content: Content): Promise<Handled> => {
    count += 1;
    const who = { cellar: 'c', chat: 'c', person, name: person, nonce: String(count).padStart(20, '0') };
    const message: IncomingMessage = { ...who, id: String(count), at: MORNING, language: 'en', content };
    return store.turn('c', async (view) => {
      const result = await handle(message, view, DEFAULT_SETTINGS);
      return { writes: result.writes, result };
    });
  };
  const write = (person: string, text: string): Promise<Handled> => send(person, { kind: 'text', text });
  await write('Ana', 'T4 5200 L red pH 3.6 free 20, ML done');
  await write('Ana', 'order T4 50 g');
  await write('Ben', 'hello');
  await write('Gus', 'hello');
  await write('Ana', 'Gus is a guest');
  return send;
}

const TEXTS = [
  ...['en-commands.jsonl', 'en.jsonl', 'en-marks.jsonl'].flatMap(labelledIn).map(({ text }) => text),
  'T4 free 22',
  'T4 pH 3.6 free 22 90 hl rosé',
  'T4 free 22\nadded 20 g kmbs T5',
];

const touchesAll = (write: Write): boolean =>
  (write.kind === 'keep' || write.kind === 'drop') && [SETTINGS_KEY, ROSTER_KEY].includes(write.key);

test('whatever a guest writes, nothing is noted, planned, claimed or set, and there is an answer', async () => {
  const send = await startCellar();
  for (const text of TEXTS) {
    const { writes, replies, errand } = await send('Gus', { kind: 'text', text });
    const kept = writes.filter((write) => {
      if (write.kind === 'person') return false;
      return !(
        (write.kind === 'keep' || write.kind === 'drop') &&
        /^(memory|reading|round|last round) /.test(write.key)
      );
    });
    expect({ text, kept }).toEqual({ text, kept: [] });
    expect([undefined, 'export', 'picture', 'round-sheet']).toContain(errand?.kind);
    expect({ text, says: replies.length > 0 || errand !== undefined }).toEqual({ text, says: true });
  }
});

test.each(['a:1.1', 'y:1.1', 'o:1.1', 'n:1.1', 'd:2', 'u:2', 'r:2', 'i:1.1', 'gb:1.1'])(
  'a guest who presses %s changes nothing',
  async (key) => {
    const send = await startCellar();
    const { writes } = await send('Gus', { kind: 'press', key });
    const others = writes.filter(
      (write) => !(write.kind === 'keep' && /^(memory|reading) /.test(write.key)) && write.kind !== 'person',
    );
    expect(others).toEqual([]);
  },
);

test('whatever a hand writes, settings and roles stay as they are', async () => {
  const send = await startCellar();
  for (const text of TEXTS) {
    const { writes, errand } = await send('Ben', { kind: 'text', text });
    // Whoever was forgotten comes again as somebody new.
    if (writes.some(({ kind }) => kind === 'forget-person')) continue;
    expect({ text, set: writes.filter(touchesAll) }).toEqual({ text, set: [] });
    expect(errand?.kind === 'import' || errand?.kind === 'backup').toBe(false);
  }
});

test('a hand doses, claims, orders and confirms', async () => {
  const send = await startCellar();
  for (const key of ['y:1.1', 'a:1.1', 'd:2', 'o:1.1'])
    expect((await send('Ben', { kind: 'press', key })).writes.some(({ kind }) => kind !== 'person')).toBe(
      true,
    );
});

test('the last keeper who is alone may be forgotten, and whoever comes next is keeper', async () => {
  const store = createMemoryCellars({ now: () => MORNING });
  const write = (person: string, text: string, id: string): Promise<string[]> =>
    store.turn('c', async (view) => {
      const content = { kind: 'text', text } as const;
      const message = {
        cellar: 'c',
        chat: 'c',
        person,
        name: person,
        id,
        at: MORNING,
        language: 'en',
        content,
      } as const;
      const { writes, replies } = await handle(message, view, DEFAULT_SETTINGS);
      return { writes, result: replies.flatMap(({ lines }) => lines.map(({ key }) => key)) };
    });
  await write('Ana', 'hello', '1');
  expect(await write('Ana', 'forget me', '2')).toEqual(['forgotten-person']);
  await write('Ben', 'hello', '3');
  expect(await write('Ben', 'cellar name Blanca', '4')).toEqual(['cellar-named']);
});
