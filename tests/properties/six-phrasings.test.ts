import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Language } from '../../src/chat/reader/words/languages.ts';
import { LANGUAGES } from '../../src/chat/reader/words/languages.ts';
import { DEFAULT_SETTINGS } from '../../src/chat/conversation/settings.ts';
import { startTalk } from '../chat/conversation/talk.ts';

/** One reading as somebody might write it in each language, figures as that language writes them. */
interface Said {
  readonly tank: number;
  readonly hl: number;
  readonly ph: number;
  readonly free: number;
  readonly target: number;
}

const comma = (figure: number): string => String(figure).replace('.', ',');

const PHRASINGS: Readonly<Record<Language, (said: Said) => string>> = {
  en: ({ tank, hl, ph, free, target }) =>
    `tank ${tank} ${hl} hl pH ${ph} free ${free}, bring it up to ${target}`,
  es: ({ tank, hl, ph, free, target }) =>
    `depósito ${tank}, ${comma(hl)} hl, pH ${comma(ph)}, libre ${free}, subirlo a ${target}`,
  fr: ({ tank, hl, ph, free, target }) =>
    `la cuve ${tank} fait ${comma(hl)} hl, pH ${comma(ph)} et ${free} de libre, on monte à ${target}`,
  it: ({ tank, hl, ph, free, target }) =>
    `vasca ${tank} da ${comma(hl)} hl, pH ${comma(ph)}, libera ${free}, portare a ${target}`,
  de: ({ tank, hl, ph, free, target }) =>
    `Tank ${tank} mit ${comma(hl)} hl, pH ${comma(ph)}, frei ${free}, bitte auf ${target} erhöhen`,
  pt: ({ tank, hl, ph, free, target }) =>
    `cuba ${tank}, ${comma(hl)} hl, pH ${comma(ph)}, livre ${free}, subir para ${target}`,
};

const readings: fc.Arbitrary<Said> = fc.record({
  tank: fc.integer({ min: 1, max: 99 }),
  hl: fc.integer({ min: 5, max: 9000 }).map((tenths) => tenths / 10),
  ph: fc.integer({ min: 300, max: 400 }).map((hundredths) => hundredths / 100),
  free: fc.integer({ min: 5, max: 30 }),
  target: fc.integer({ min: 36, max: 60 }),
});

test('one reading in six languages is one dose', async () => {
  await fc.assert(
    fc.asyncProperty(readings, async (said) => {
      const doses = await Promise.all(
        LANGUAGES.map(async (language) => {
          const { answers } = await startTalk(DEFAULT_SETTINGS, language).write(PHRASINGS[language](said));
          const [answer] = answers ?? [];
          return answer && 'mass_g' in answer ? answer.mass_g : PHRASINGS[language](said);
        }),
      );
      expect(new Set(doses)).toEqual(new Set([doses[0]]));
      expect(typeof doses[0]).toBe('number');
    }),
    { numRuns: 100, seed: 1 },
  );
});
