import type { CellarView, Write } from '../../core/cellar/cellar-store.ts';
import { fitImport, type FittedImport } from '../attachments/fit-import.ts';
import { importLines, importProblemLines } from '../attachments/import-lines.ts';
import type { ImportRead } from '../attachments/import-read.ts';
import { buttonsFor } from './buttons.ts';
import type { Here } from './here.ts';
import { importKey } from './keys.ts';
import { line } from './lines/line.ts';
import { refAt } from './next-memory.ts';
import type { Handled } from './ports.ts';
import { replying } from './replying.ts';

/** So long a file that was shown can still be taken, in milliseconds. */
const SHOWN_ms = 3_600_000;

/** A file that was read: what was understood of it and what not is shown first; nothing is taken yet. */
export async function handleFile(read: ImportRead, here: Here, view: CellarView): Promise<Handled> {
  const { problems } = await fitted(read, here, view);
  if (problems.length > 0) return replying(here, { lines: importProblemLines(problems) });
  const ref = refAt(here);
  const next: Here = { ...here, memory: { ...here.memory, nextNumber: here.memory.nextNumber + 1 } };
  const { writes, ...said } = replying(next, {
    lines: [...importLines(read), line('question', 'import-ask')],
    buttons: buttonsFor(ref, ['i']),
  });
  const until = here.message.at + SHOWN_ms;
  return {
    ...said,
    writes: [
      { kind: 'keep', key: importKey(here.message.chat, ref), text: JSON.stringify(read), until },
      ...writes,
    ],
  };
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
