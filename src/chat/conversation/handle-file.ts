import type { CellarView, Write } from '../../core/cellar/cellar-store.ts';
import type { Button } from '../replies/reply.ts';
import { fitImport, type FittedImport } from '../attachments/fit-import.ts';
import { importLines, importProblemLines } from '../attachments/import-lines.ts';
import type { ImportRead } from '../attachments/import-read.ts';
import { buttonsFor } from './buttons.ts';
import type { Here } from './here.ts';
import { fileRoundKey, importKey } from './keys.ts';
import { line } from './lines/line.ts';
import { refAt } from './next-memory.ts';
import type { Handled } from './ports.ts';
import { replying } from './replying.ts';
import { answerRoundOfFile } from './take-round-of-file.ts';

/** So long a file that was shown can still be taken, in milliseconds. */
const SHOWN_ms = 3_600_000;

/**
 * A file that was read. A round that asks for doses is answered with its sheet; for all else what was understood of it and
 * what not is shown first, and nothing is taken yet.
 */
export async function handleFile(read: ImportRead, here: Here, view: CellarView): Promise<Handled> {
  const { round } = read;
  if (round?.means === 'dose') return answerRoundOfFile(round, 'dose', here, view);
  const isList = read.kind !== 'round' && (round === undefined || here.role === 'keeper');
  const { problems } = isList ? await fitted(read, here, view) : { problems: [] };
  if (problems.length > 0) return replying(here, { lines: importProblemLines(problems) });
  const ref = refAt(here);
  const next: Here = { ...here, memory: { ...here.memory, nextNumber: here.memory.nextNumber + 1 } };
  const { writes, ...said } = replying(next, {
    lines:
      round === undefined
        ? [...importLines(read), line('question', 'import-ask')]
        : [
            line('first', 'file-round', { count: String(round.count) }),
            ...(round.left.length === 0
              ? []
              : [line('first', 'file-round-left', { lines: round.left.slice(0, MOST_NAMED).join(', ') })]),
            line('question', 'file-round-ask'),
          ],
    buttons: buttonsOf(ref, { isRound: round !== undefined, isList }),
  });
  const { chat, at } = here.message;
  const until = at + SHOWN_ms;
  return {
    ...said,
    writes: [
      ...(isList
        ? [{ kind: 'keep', key: importKey(chat, ref), text: JSON.stringify(read), until } as const]
        : []),
      ...(round
        ? [{ kind: 'keep', key: fileRoundKey(chat, ref), text: JSON.stringify(round), until } as const]
        : []),
      ...writes,
    ],
  };
}

/** So many lines that were not understood are named. */
const MOST_NAMED = 20;

/** What may be done with a file: dose its round, note its readings, take its vessels. */
function buttonsOf(
  ref: string,
  { isRound, isList }: { readonly isRound: boolean; readonly isList: boolean },
): Button[] {
  if (!isRound) return buttonsFor(ref, ['i']);
  const all = [
    { key: `fd:${ref}`, label: 'button-file-dose', values: {} },
    { key: `fn:${ref}`, label: 'button-file-note', values: {} },
    ...(isList ? [{ key: `i:${ref}`, label: 'button-file-vessels', values: {} }] : []),
  ];
  return all.map((one, at) => ({ ...one, mark: String(at + 1) }));
}

/** "Take it": all that was shown is noted, or nothing. */
export async function takeImport(ref: string, here: Here, view: CellarView): Promise<Handled> {
  const text = await view.kept(importKey(here.message.chat, ref));
  if (text === undefined) return replying(here, { lines: [line('first', 'old-button')] });
  const { entries, people, problems } = await fitted(JSON.parse(text) as ImportRead, here, view);
  if (problems.length > 0) return replying(here, { lines: importProblemLines(problems) });
  const { writes, ...said } = replying(here, {
    lines: [line('first', 'import-taken', { entries: String(entries.length) })],
  });
  return {
    ...said,
    writes: [
      ...people.map(({ number, name }): Write => {
        // Nobody on this platform: a name to an entry.
        const id = `imported ${number}`;
        return { kind: 'person', id, number, ...(name !== undefined && { name }) };
      }),
      ...entries.map((entry): Write => ({ kind: 'entry', entry })),
      { kind: 'drop', key: importKey(here.message.chat, ref) },
      ...writes,
    ],
  };
}

/** The file as this cellar can take it now. */
async function fitted(read: ImportRead, here: Here, view: CellarView): Promise<FittedImport> {
  const known = new Set<string>();
  for (const { key } of read.entries) if ((await view.entryOfKey(key)) !== undefined) known.add(key);
  const people = await view.people();
  const me = { number: here.me, name: here.message.name };
  // A list of vessels is noted by whoever takes it.
  const own =
    read.kind === 'vessels'
      ? { ...read, entries: read.entries.map((one) => ({ ...one, by: here.me })) }
      : read;
  return fitImport(own, {
    nextEntry: here.nextEntry,
    people:
      here.isNewPerson && !people.some(({ number }) => number === me.number)
        ? [...people, asPerson(me)]
        : people,
    hasKey: (key) => known.has(key),
  });
}

function asPerson({ number, name }: { number: number; name: string | undefined }) {
  return { number, ...(name !== undefined && { name }) };
}
