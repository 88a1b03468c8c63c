import type { Command } from '../command.ts';
import type { Talk } from './talk.ts';
import { says } from './talk.ts';

/** Shorter than this a name of a language needs the word that says so: `es`, `it`. */
const SHORTEST_ALONE = 4;

/** Reads `language es`, `answer in German`, and the name of a language alone: `español`. */
export function readLanguage(talk: Talk): Command | undefined {
  const { board, said, isQuestion, isSlashed } = talk;
  if (board.findings.length > 0 || (isQuestion && !says(talk, 'request'))) return undefined;
  const rest = said.filter(
    ({ ids, text }) =>
      board.lexicon.languages.has(text) ||
      !ids.some((id) => id === 'filler' || id === 'language' || id === 'work-in' || id === 'in'),
  );
  const [name] = rest;
  const language = name === undefined ? undefined : board.lexicon.languages.get(name.text);
  if (language === undefined || rest.length !== 1) return undefined;
  const isSaid = says(talk, 'language', 'work-in');
  const isAlone = said.length === 1 && (name?.text.length ?? 0) >= SHORTEST_ALONE;
  return isSaid || isAlone || isSlashed ? { name: 'language', language } : undefined;
}
