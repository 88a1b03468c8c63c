import { additiveNames } from '../../chat/attachments/round/additive-names.ts';
import { roundName } from '../../chat/attachments/round/round-name.ts';
import { roundSvg } from '../../chat/attachments/round/round-svg.ts';
import { roundTotals } from '../../chat/attachments/round/round-totals.ts';
import { roundWords, type SayLine } from '../../chat/attachments/round/round-words.ts';
import { shownPages } from '../../chat/attachments/round/shown-pages.ts';
import { totalPart } from '../../chat/conversation/lines/round-body.ts';
import type { Errand } from '../../chat/conversation/ports.ts';
import type { Say } from '../../chat/replies/say.ts';
import type { BroughtFile } from '../brought.ts';
import { drawPicture } from './make-picture.ts';

/**
 * The sheet of a round as PNG, a picture for each page. Throws a `PictureFault` when the machine cannot.
 *
 * @param now in milliseconds since 1970
 */
export async function makeRoundPictures(
  { sheet, zone, language }: Extract<Errand, { kind: 'round-sheet' }>,
  now: number,
  say: Say,
): Promise<BroughtFile[]> {
  const sayLine: SayLine = (line) => say({ language, lines: [line], buttons: [] }).text;
  const totals = roundTotals(sheet.rows).map((total) =>
    sayLine({ room: 'first', key: 'sheet-fetch', values: {}, list: [totalPart(total, sheet.mark)] }),
  );
  const nameOf = additiveNames(sayLine, sheet.mark);
  const pages = shownPages(sheet, roundWords(sayLine), { telling: { zone, language, now }, totals, nameOf });
  const files: BroughtFile[] = [];
  for (const [i, page] of pages.entries()) {
    const bytes = await drawPicture({ svg: roundSvg(page) });
    const numbered = pages.length === 1 ? {} : { place: i + 1 };
    files.push({ name: roundName(sheet.at, zone, { ending: 'png', ...numbered }), bytes, isPicture: true });
  }
  return files;
}
