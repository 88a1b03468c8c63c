import { readFileSync, readdirSync } from 'node:fs';
import { expect, test } from 'vitest';
import { DEFAULT_SETTINGS, type Settings } from '../../src/chat/conversation/settings.ts';
import { play, readScene } from './scene.ts';
import { fits } from './shown-lines.ts';

const scenes = readdirSync(import.meta.dirname)
  .filter((name) => name.endsWith('.txt'))
  .map((name) => ({ name, ...readScene(readFileSync(new URL(name, import.meta.url), 'utf8')) }));

test.each(scenes)('$name: $title', async (scene) => {
  const answers = await play(scene);
  for (const [at, { us }] of scene.moves.entries()) {
    const actual = answers[at] ?? [];
    expect(fits(us, actual) ? us : actual).toEqual(us);
  }
});

test('a scene that says another figure than we do is found', () => {
  expect(fits(['Weigh 256 g', '…'], ['Weigh 257 g', 'x'])).toBe(false);
  expect(fits(['…', 'b', '…'], ['a', 'b', 'c'])).toBe(true);
  expect(fits(['a'], ['a', 'b'])).toBe(false);
});

test('lines of one message stand together, and a blank line ends it', () => {
  const { moves } = readScene('# t\nthem: a\nthem: b\n\nthem: c\nus: d\n');
  expect(moves.map(({ what }) => what)).toEqual(['a\nb', 'c']);
});

test.each([
  ['20', 20],
  ['3 h', 180],
  ['2 d', 2880],
])('later: %s is %i minutes', async (what, minutes) => {
  const { moves } = readScene(`# t\ntick:\nlater: ${what}\ntick:\n`);
  const at: number[] = [];
  await play({ title: 't', moves }, { tick: async (_, now) => (at.push(now), []) });
  expect(((at[1] ?? 0) - (at[0] ?? 0)) / 60_000).toBe(minutes);
});

test('a question waits for the person in the chat where it was asked, over a restart too', async () => {
  const scene =
    '# t\nthem: T4 pH 3.4 free 15\nchat: two\nthem: 40 hl\nchat: one\nperson: Luis\nthem: 40 hl\n';
  const end = 'person: Ana\nrestart:\nthem: 40 hl\n';
  const answers = await play(readScene(scene + end));
  const isDose = (lines: readonly string[] | undefined): boolean => /weigh/.test(lines?.join(' ') ?? '');
  expect([answers[2], answers[5], answers.at(-1)].map(isDose)).toEqual([false, false, true]);
});

test('what is said unasked stands under the chat that it goes to', async () => {
  const said = { text: 'T4 is due', buttons: [] };
  const tick = async () => [
    { chat: 'one', said },
    { chat: 'two', said },
  ];
  expect(await play(readScene('# t\ntick:\n'), { tick })).toEqual([['T4 is due', '(two)', 'T4 is due']]);
});

test('a fault of ours ends a scene', async () => {
  const settings: Settings = {
    ...DEFAULT_SETTINGS,
    get basis(): never {
      throw new TypeError('Cannot tell the basis');
    },
  };
  await expect(play(readScene('# t\nthem: T4 40 hl pH 3.4 free 15\n'), { settings })).rejects.toThrow(
    'Cannot tell the basis',
  );
});
