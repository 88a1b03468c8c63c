import type { ExpressionBuilder, Kysely } from 'kysely';
import type { Entry } from '../../../core/cellar/entry.ts';
import { BEGINNING, type Point } from '../projection/point.ts';
import { toEntry } from './entry-rows.ts';
import { placed } from './placed.ts';
import type { Tables } from './tables.ts';

const COLUMNS = [
  'entry.entry',
  'entry.key',
  'entry.at',
  'entry.noted_at',
  'entry.person',
  'entry.content',
] as const;

/** What counts of a vessel from a point on, in order; `before` is not included. */
export async function readCountedOf(
  db: Kysely<Tables>,
  { cellar, vessel }: { readonly cellar: string; readonly vessel: string },
  { from, before }: { readonly from: Point; readonly before?: Point },
): Promise<readonly Entry[]> {
  const rows = await db
    .selectFrom('touched')
    .innerJoin('entry', (on) => on.on('entry.cellar', '=', cellar).onRef('entry.entry', '=', 'touched.entry'))
    .select(COLUMNS)
    .where('touched.cellar', '=', cellar)
    .where('touched.vessel', '=', vessel)
    .where(placed('touched', '>=', from))
    .$if(before !== undefined, (query) => query.where(placed('touched', '<', before ?? from)))
    .where('entry.kind', '<>', 'correction')
    .where(isNotTakenBack)
    .orderBy('touched.at')
    .orderBy('touched.entry')
    .execute();
  return rows.map(toEntry);
}

/** What counts in the cellar behind a point, in order. */
export async function readCounted(
  db: Kysely<Tables>,
  cellar: string,
  { after, most }: { readonly after: Point | undefined; readonly most: number },
): Promise<readonly Entry[]> {
  const rows = await db
    .selectFrom('entry')
    .select(COLUMNS)
    .where('entry.cellar', '=', cellar)
    .$if(after !== undefined, (query) => query.where(placed('entry', '>', after ?? BEGINNING)))
    .where('entry.kind', '<>', 'correction')
    .where(isNotTakenBack)
    .orderBy('entry.at')
    .orderBy('entry.entry')
    .limit(most)
    .execute();
  return rows.map(toEntry);
}

/** What counts of the stock of an additive, and of additions of it, from a point on, in order. */
export async function readMovesOf(
  db: Kysely<Tables>,
  { cellar, additive }: { readonly cellar: string; readonly additive: string },
  from: Point,
): Promise<readonly Entry[]> {
  const rows = await db
    .selectFrom('entry')
    .select(COLUMNS)
    .where('entry.cellar', '=', cellar)
    .where('entry.additive', '=', additive)
    .where(placed('entry', '>=', from))
    .where(isNotTakenBack)
    .orderBy('entry.at')
    .orderBy('entry.entry')
    .execute();
  return rows.map(toEntry);
}

const isNotTakenBack = (eb: ExpressionBuilder<Tables, 'entry'>) =>
  eb.not(
    eb.exists(
      eb
        .selectFrom('entry as struck')
        .select('struck.entry')
        .whereRef('struck.cellar', '=', 'entry.cellar')
        .whereRef('struck.corrects', '=', 'entry.entry'),
    ),
  );
