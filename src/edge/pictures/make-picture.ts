import type { ChartData } from '../../chat/attachments/chart/chart-data.ts';
import type { ChartManner } from '../../chat/attachments/chart/chart-manner.ts';
import { chartWords } from '../../chat/attachments/chart/chart-words.ts';
import { pictureName } from '../../chat/attachments/chart/picture-name.ts';
import type { Say } from '../../chat/replies/say.ts';
import { makeDrawPicture } from './draw-picture.ts';

/** An image to hand over. */
export interface PictureFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}

/** What is drawn, and how its days and figures are told. */
export interface PictureRequest {
  readonly data: ChartData;
  readonly manner: ChartManner;
}

/** What draws all pictures of this process, one at a time. */
export const drawPicture = makeDrawPicture();

/** Makes the picture of a vessel as PNG. Throws a `PictureFault` when the machine cannot. */
export async function makePicture({ data, manner }: PictureRequest, say: Say): Promise<PictureFile> {
  const { language } = manner.telling;
  const words = chartWords(data, manner, (line) => say({ language, lines: [line], buttons: [] }).text);
  return { name: pictureName(data.vessel), bytes: await drawPicture({ data, words }) };
}
