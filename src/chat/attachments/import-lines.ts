import type { Line } from '../replies/reply.ts';
import type { ImportProblem, ImportRead } from './import-read.ts';

/** So many lines of a file, and words of it, are named; the other lines are counted. */
const MOST_NAMED = 20;

/**
 * What a file holds, as lines of a reply: how much, what was not understood or is not taken, and in which unit volumes
 * were read. Where nothing can be taken, the reasons and that nothing was.
 */
export function importLines(read: ImportRead): Line[] {
  if (read.problems.length > 0) return importProblemLines(read.problems);
  const { kind, vessels, entries, people, notUnderstood, notTaken, assumedUnit } = read;
  const lines: Line[] = [];
  const add = (key: Line['key'], values: Line['values'], list?: Line['list']): void =>
    void lines.push({ room: 'first', key, values, ...(list && { list }) });
  if (kind === 'vessels') add('import-vessels', { vessels: String(vessels) });
  else {
    const [entered, noted] = [String(entries.length), String(people.length)];
    add('import-log', { entries: entered, vessels: String(vessels), people: noted });
  }
  if (notUnderstood.length > 0) {
    const count = notUnderstood.length === 1 ? 'one' : 'other';
    add('import-not-understood', { count, lines: named(notUnderstood) });
  }
  if (notTaken.length > 0) {
    const list = notTaken
      .slice(0, MOST_NAMED)
      .map((name) => ({ key: 'import-not-taken-name', values: { name } }));
    add('import-not-taken', {}, list);
  }
  if (assumedUnit !== undefined) add('import-unit', { unit: assumedUnit });
  return lines;
}

/** Why nothing of a file can be taken, and that nothing was. */
export function importProblemLines(problems: readonly ImportProblem[]): Line[] {
  return [
    ...problems.map(({ code, lines = [], about = '' }): Line => ({
      room: 'first',
      key: 'import-problem',
      values: { code, about, lines: named(lines) },
    })),
    { room: 'first', key: 'import-nothing-taken', values: {} },
  ];
}

/** `7, 9, 30`; of many the first ones, and how many more there are. */
function named(lines: readonly number[]): string {
  const more = lines.length - MOST_NAMED;
  return `${lines.slice(0, MOST_NAMED).join(', ')}${more > 0 ? ` … (+${more})` : ''}`;
}
