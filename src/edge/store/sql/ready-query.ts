import type { Compilable, CompiledQuery, Kysely, QueryResult } from 'kysely';
import type { Tables } from './tables.ts';

/** What a query is asked with. A value that is undefined, or a list of another length, makes another query of it. */
type Values = Readonly<Record<string, Value | readonly Value[] | undefined>>;
type Value = string | number | null;

/** Stands in a query for what it is asked with. */
class Blank {
  readonly name: string;
  readonly place: number | undefined;

  constructor(name: string, place?: number) {
    this.name = name;
    this.place = place;
  }
}

/**
 * A query that is built once in each shape, and then only asked: to build one costs ten times what it costs to ask.
 * `build` must not look at a value, save whether it is there.
 */
export function readyQuery<V extends object, R>(
  build: (db: Kysely<Tables>, values: V) => Compilable<R>,
): (db: Kysely<Tables>, values: V) => Promise<QueryResult<R>> {
  const built = new WeakMap<Kysely<Tables>, Map<string, CompiledQuery<R>>>();
  return (db, given) => {
    const values = given as Values;
    const shapes = built.get(db) ?? new Map<string, CompiledQuery<R>>();
    if (shapes.size === 0) built.set(db, shapes);
    const shape = shapeOf(values);
    const query = shapes.get(shape) ?? build(db, blanksFor(values) as V).compile();
    shapes.set(shape, query);
    return db.executeQuery({ ...query, parameters: query.parameters.map((one) => fill(one, values)) });
  };
}

function shapeOf(values: Values): string {
  let shape = '';
  for (const name in values) {
    const value = values[name];
    shape += value === undefined ? '- ' : isList(value) ? `${value.length} ` : '. ';
  }
  return shape;
}

/** Typed as what they stand for: Kysely hands on whatever it is given as a value. */
function blanksFor(values: Values): unknown {
  const blanks = Object.entries(values).map(([name, value]) => {
    if (value === undefined) return [name, undefined];
    return [name, isList(value) ? value.map((_, place) => new Blank(name, place)) : new Blank(name)];
  });
  return Object.fromEntries(blanks);
}

function fill(parameter: unknown, values: Values): unknown {
  if (!(parameter instanceof Blank)) return parameter;
  const value = values[parameter.name];
  return isList(value) ? value[parameter.place ?? 0] : value;
}

const isList = (value: unknown): value is readonly Value[] => Array.isArray(value);
