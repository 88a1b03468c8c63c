import type { Reading, ReaderSettings } from '../reader/understood.ts';
import { vesselIn } from './answer-of-names.ts';
import { line } from './lines/line.ts';
import type { Line } from '../replies/reply.ts';

/** More lines than a round has are looked at no further; own threshold. */
const MOST_LINES = 60;

/** The vessel, in the person's words, that two lines of a message name; undefined where all differ. */
function namedTwice(text: string, settings: ReaderSettings): string | undefined {
  const lines = text.split('\n').filter((one) => one.trim() !== '');
  if (lines.length < 2 || lines.length > MOST_LINES) return undefined;
  const seen = new Set<string>();
  for (const one of lines) {
    const named = vesselIn(one, settings);
    if (named === undefined) continue;
    if (seen.has(named.vessel)) return named.written;
    seen.add(named.vessel);
  }
  return undefined;
}

/**
 * What is wrong where a message is a muddle of vessels, in place of what is wrong with each figure: one vessel in two
 * lines, or two vessels in one. Undefined for any other problem.
 */
export function vesselsProblem(
  text: string,
  { problems }: Reading,
  settings: ReaderSettings,
): Line | undefined {
  if (problems.length === 0) return undefined;
  const vessel = namedTwice(text, settings);
  if (vessel !== undefined) return line('first', 'problem-vessel-twice', { vessel });
  const [about] = problems.flatMap((one) => (one.code === 'conflicting-values' ? [one.about] : []));
  const parts = about?.split(/\s+\/\s+|\s+/) ?? [];
  const vessels = new Set(parts.map((part) => vesselIn(part, settings)?.vessel));
  if (about === undefined || vessels.size < 2 || vessels.has(undefined)) return undefined;
  return line('first', 'problem-two-vessels', { about });
}
