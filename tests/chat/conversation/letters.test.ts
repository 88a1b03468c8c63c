import { describe, expect, test } from 'vitest';
import { lastOf, startTalk, textOf } from './talk.ts';

const after = async (...texts: readonly string[]) => (await lastOf(texts)).understood?.readings[0]?.fields;

/** The usual sizes: common practice, no source. */
describe('a letter is the size it stands before', () => {
  test.each([
    ['a', 2],
    ['b', 5],
  ])('of an effervescent tablet %s is %d g SO2', async (letter, tablet_SO2_g) => {
    expect(await after('effervescent tablets T4 20 hl pH 3.5 free 12', letter)).toMatchObject({
      tablet_SO2_g,
    });
  });

  test.each([
    ['a', 0.44],
    ['b', 0.55],
  ])('of a small plain tablet %s is %d g of the salt', async (letter, tablet_salt_g) => {
    expect(await after('potassium campden 20 L pH 3.5 free 12', letter)).toMatchObject({ tablet_salt_g });
  });
});

test('a letter that no choice has is no choice', async () => {
  const talk = startTalk();
  await talk.write('potassium campden 20 L pH 3.5 free 12');
  expect(textOf(await talk.write('d'))).not.toContain('weigh');
  expect((await talk.memory()).waiting?.field).toBe('tablet_salt_g');
});
