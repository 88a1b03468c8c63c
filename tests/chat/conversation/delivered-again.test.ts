import { expect, test } from 'vitest';
import { handle } from '../../../src/chat/conversation/conversation.ts';
import type { Content } from '../../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { makeServeTurn } from '../../../src/edge/serve-message.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { MORNING, say } from './talk.ts';

/** A cellar to which anything can be delivered more than once; gives the first line of each answer. */
function startCellar() {
  const store = createMemoryCellars({ now: () => MORNING });
  const serve = makeServeTurn({ handle, say, store, settings: DEFAULT_SETTINGS });
  const who = { cellar: 'c', chat: 'c', person: 'Ana', name: 'Ana', language: 'en', at: MORNING } as const;
  const deliver = async (id: string, content: Content): Promise<string> => {
    const { said } = await serve({ ...who, id, content });
    return said[0]?.text.split('\n')[0] ?? '';
  };
  return {
    write: (id: string, text: string) => deliver(id, { kind: 'text', text }),
    press: (id: string, key: string) => deliver(id, { kind: 'press', key }),
    standing: (): Promise<number[]> =>
      store.look('c', async (view) =>
        (await view.entries({})).filter(({ struck }) => struck === undefined).map(({ entry }) => entry),
      ),
  };
}

const WHOLE = 'T4 4000 L white pH 3.4 free 15 ML done';

test('a tap whose entry was taken back since notes nothing when it comes again, and a new tap does', async () => {
  const { write, press, standing } = startCellar();
  await write('1', WHOLE);
  await press('2', 'a:1.1');
  await write('3', 'strike 2 typo');
  expect(await press('2', 'a:1.1')).toMatch(/^Already noted as 2 /);
  expect(await standing()).toEqual([1, 3]);
  expect(await press('4', 'a:1.1')).toMatch(/^Noted 4:/);
});

test('an undo that comes again takes nothing else back', async () => {
  const { write, standing } = startCellar();
  await write('1', 'added 100 g kmbs T4');
  await write('2', 'added 200 g kmbs T5');
  await write('3', 'undo');
  await write('3', 'undo');
  expect(await standing()).toEqual([1, 3]);
});

test('an order that words carried out after a tap was taken back is not carried out by the tap once more', async () => {
  const { write, press, standing } = startCellar();
  await write('1', 'order T4 90 g kmbs');
  await press('2', 'd:1');
  await write('3', 'undo');
  expect(await write('4', 'added 80 g kmbs T4')).toMatch(/Order 1 is done/);
  expect(await press('5', 'd:1')).not.toMatch(/^Noted/);
  expect(await standing()).toEqual([1, 3, 4]);
});
