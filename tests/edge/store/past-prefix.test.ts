import { expect, test } from 'vitest';
import { pastPrefix } from '../../../src/edge/store/past-prefix.ts';

test.each([
  ['a', 'b'],
  ['press:', 'press;'],
  ['a\u{10ffff}', 'b'],
  ['\ud7ff', '\ue000'],
  ['😀', '😁'],
  ['\u{10ffff}\u{10ffff}', undefined],
  ['', undefined],
])('behind all that begins with %j comes %j', (begin, past) => {
  expect(pastPrefix(begin)).toBe(past);
});
