import { describe, expect, test } from 'vitest';
import type { Write } from '../../../src/core/cellar/cellar-store.ts';
import type { Happening } from '../../../src/core/cellar/entry.ts';
import { keptLines, type KeptPart } from '../../../src/edge/ask/kept-lines.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';

/** 9:30 in Madrid in winter; each thing is noted a minute after the one before. */
const AT = Date.parse('2026-11-12T08:30:00Z');

const store = createMemoryCellars({ now: () => AT });

async function write(cellar: string, writes: readonly Write[]): Promise<void> {
  await store.turn(cellar, async () => ({ writes, result: undefined }));
}

async function lines(part: KeptPart): Promise<object[]> {
  const all: object[] = [];
  for await (const line of keptLines(store, part)) all.push(JSON.parse(JSON.stringify(line)) as object);
  return all;
}

let noted = 0;

function note(happening: Happening, at: number, by: number): Write {
  noted += 1;
  const noted_at = AT + noted * 60_000;
  return { kind: 'entry', entry: { ...happening, key: `key ${noted}`, at, noted_at, by } };
}

const HOUR_ms = 3_600_000;
const ADDED: Happening = { kind: 'addition', vessels: ['tank 4'], mass_g: 256, remark: 'stirred' };

await write('cellar', [
  { kind: 'keep', key: 'settings', text: JSON.stringify({ zone: 'Europe/Madrid' }) },
  { kind: 'person', id: 'a', number: 1, name: 'Ana' },
  { kind: 'person', id: 'b', number: 2 },
  note({ kind: 'reading', vessels: ['tank 4'], free_mg_L: 21, ph: 3.58 }, AT, 1),
  note(ADDED, AT - HOUR_ms, 2),
  note({ kind: 'vessel', event: 'later', vessels: ['tank 4', 'tank 5'], until: AT + HOUR_ms }, AT, 1),
  note({ kind: 'correction', vessels: ['tank 4'], corrects: 2, reason: 'typo' }, AT, 1),
]);

describe('the log of a file', () => {
  test('is told in the order in which it was noted, by the clock of the cellar', async () => {
    expect(await lines('log')).toEqual([
      {
        entry: 1,
        kind: 'reading',
        vessel: 'tank 4',
        free_mg_L: 21,
        ph: 3.58,
        at: '2026-11-12T09:30:00+01:00',
        noted_at: '2026-11-12T09:31:00+01:00',
        by: 'Ana',
      },
      {
        entry: 2,
        kind: 'addition',
        vessel: 'tank 4',
        mass_g: 256,
        remark: 'stirred',
        at: '2026-11-12T08:30:00+01:00',
        noted_at: '2026-11-12T09:32:00+01:00',
        by: 'person 2',
        struck_by: 4,
      },
      {
        entry: 3,
        kind: 'vessel',
        event: 'later',
        vessels: ['tank 4', 'tank 5'],
        until: '2026-11-12T10:30:00+01:00',
        at: '2026-11-12T09:30:00+01:00',
        noted_at: '2026-11-12T09:33:00+01:00',
        by: 'Ana',
      },
      {
        entry: 4,
        kind: 'correction',
        vessel: 'tank 4',
        corrects: 2,
        reason: 'typo',
        at: '2026-11-12T09:30:00+01:00',
        noted_at: '2026-11-12T09:34:00+01:00',
        by: 'Ana',
      },
    ]);
  });

  test('begins each line with the number of the entry and its kind', async () => {
    for (const line of await lines('log')) expect(Object.keys(line).slice(0, 2)).toEqual(['entry', 'kind']);
  });
});

test('the vessels of a file are told with moments and names, however deep they stand', async () => {
  const [first, second, third] = await lines('vessels');
  expect(first).toMatchObject({
    vessel: 'tank 4',
    free_mg_L: { value: 21, at: '2026-11-12T09:30:00+01:00', entry: 1 },
    later: '2026-11-12T10:30:00+01:00',
    additions: [],
  });
  expect(second).toMatchObject({ vessel: 'tank 5', since: '2026-11-12T09:30:00+01:00' });
  expect(third).toBeUndefined();
});

test('where there are several cellars each line names its own, and one without a zone is told in UTC', async () => {
  await write('telegram:7', [
    { kind: 'person', id: 'a', number: 1, name: 'Rosa' },
    note({ kind: 'addition', vessels: ['tank 1'], mass_g: 5 }, AT, 1),
  ]);
  expect((await lines('log')).slice(-2)).toEqual([
    expect.objectContaining({ cellar: 'cellar', entry: 4 }),
    expect.objectContaining({ cellar: 'telegram:7', entry: 1, at: '2026-11-12T08:30:00+00:00', by: 'Rosa' }),
  ]);
  expect((await lines('vessels')).at(-1)).toMatchObject({
    cellar: 'telegram:7',
    additions: [{ entry: 1, by: 'Rosa', at: '2026-11-12T08:30:00+00:00' }],
  });
});
