import { readFileSync, readdirSync } from 'node:fs';
import { expect, test } from 'vitest';
import { fits, play, readScene } from './scene.ts';

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
