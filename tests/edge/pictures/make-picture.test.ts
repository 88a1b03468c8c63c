import { expect, test } from 'vitest';
import { chartWords } from '../../../src/chat/attachments/chart/chart-words.ts';
import { drawGiven } from '../../../src/edge/pictures/draw-given.ts';
import type { GivenPicture } from '../../../src/edge/pictures/draw-given.ts';
import { makeDrawPicture } from '../../../src/edge/pictures/draw-picture.ts';
import { makePicture } from '../../../src/edge/pictures/make-picture.ts';
import { PictureFault } from '../../../src/edge/pictures/picture-fault.ts';
import { CASES, entriesOf, reading } from '../../chat/attachments/chart/chart-cases.ts';
import { givenOf, pointsOf, say } from './picture-of.ts';

const PNG = [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a];
const given = givenOf(CASES['usual'] ?? { entries: [] });
const words = chartWords(given.data, given.manner, ({ key }) => key);

test('a picture is a PNG whose name says the vessel, the same each time', async () => {
  const [first, second] = await Promise.all([makePicture(given, say), makePicture(given, say)]);
  expect(first.name).toBe('tank-4.png');
  expect([...first.bytes.subarray(0, 8)]).toEqual(PNG);
  expect(Buffer.from(first.bytes).equals(second.bytes)).toBe(true);
});

test('what is drawn in the thread is what would be drawn here', async () => {
  const bytes = await makeDrawPicture()({ data: given.data, words });
  expect(Buffer.from(bytes).equals(drawGiven({ data: given.data, words }))).toBe(true);
});

test('a picture that cannot be drawn is a fault with its cause, and the next one is drawn all the same', async () => {
  const draw = makeDrawPicture();
  const broken = { data: { ...given.data, readings: undefined }, words } as unknown as GivenPicture;
  const [fault, bytes] = await Promise.all([
    draw(broken).catch((error: unknown) => error),
    draw({ data: given.data, words }),
  ]);
  expect(fault).toBeInstanceOf(PictureFault);
  expect(fault).toMatchObject({ cause: expect.any(TypeError) });
  expect([...bytes.subarray(0, 8)]).toEqual(PNG);
});

test('a thread that nobody needs ends, and another one begins when it is needed', async () => {
  const draw = makeDrawPicture(0);
  const first = await draw({ data: given.data, words });
  await new Promise((resolve) => void setTimeout(resolve, 50));
  const second = await draw({ data: given.data, words });
  expect(Buffer.from(first).equals(second)).toBe(true);
});

test.each([
  '<script>alert(1)</script>',
  '"/><image href="file:///etc/passwd"/>',
  '&bogus; &#0; ]]>',
  '\u0000\u0007\u001b[2J\ud800\uffff',
  '=1+1 *bold* _x_',
  '酒罐 🍷 خزان',
  'W'.repeat(4096),
])('a name that means harm is drawn as a name: %j', async (vessel) => {
  const entries = entriesOf([{ ...reading(0, 21, 58, 3.5), vessels: [vessel] }]);
  const { bytes } = await makePicture(givenOf({ entries, options: { vessel } }), say);
  const { width, height, colourAt } = pointsOf(bytes);
  expect(width).toBe(800);
  // What stands right of the room for the name is as it is for any name.
  expect(colourAt(width - 1, 40)).toEqual([255, 255, 255]);
  expect(height).toBeGreaterThan(600);
});
