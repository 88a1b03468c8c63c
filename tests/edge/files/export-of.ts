import { makeSay } from '../../../src/chat/replies/say.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { makeExport } from '../../../src/edge/files/make-export.ts';
import type { ExportFile, ExportRequest } from '../../../src/edge/files/make-export.ts';
import { PEOPLE } from '../../chat/attachments/any-log.ts';

const say = makeSay(loadLocales());

/** An export of some entries, with the usual of everything that is not said. */
export function exportOf(
  entries: ExportRequest['entries'],
  more: Partial<ExportRequest> = {},
): Promise<ExportFile> {
  return makeExport(
    {
      entries,
      people: PEOPLE,
      span: {},
      format: 'csv',
      zone: 'Europe/Madrid',
      decimalMark: '.',
      language: 'en',
      ...more,
    },
    say,
  );
}
