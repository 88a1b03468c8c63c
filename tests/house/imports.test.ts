import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { cycles } from './import-cycles.ts';
import { parse, sourceFiles } from './source-file.ts';
import type { SourceFile } from './source-file.ts';

/** Inside `src/core` a room uses only rooms above it, so that a figure is never computed from what needs it. */
const CORE_ROOMS = [
  '',
  'units',
  'time',
  'chemistry',
  'additives',
  'binding',
  'limits',
  'dose',
  'laboratory',
  'blend',
  'forecast',
  'cellar',
];
/** Reading knows nothing of answering, and wording nothing of what decides. */
const CHAT_ROOMS = ['reader', 'replies', 'attachments', 'conversation'];
/** Programs: they start things, so nobody imports them. */
const PROGRAMS = ['src/main.ts', 'src/ask.ts'];
const STOREYS = ['core', 'chat', 'edge', 'program'];

/** Where a package may be used; one that stands nowhere here is used nowhere. */
const PACKAGES: readonly { readonly name: RegExp; readonly in: RegExp; readonly why: string }[] = [
  {
    name: /^mathjs(\/|$)/,
    in: /^src\/core\/units\//,
    why: 'one door to mathjs: no word of a user reaches it',
  },
  {
    name: /^@date-fns\/tz(\/|$)/,
    in: /^src\/core\/time\/offset-at\.ts$/,
    why: 'one door to what a zone does: everything else is arithmetic',
  },
  {
    name: /^node:/,
    in: /^src\/(edge\/|main\.ts|ask\.ts)/,
    why: 'core and chat are the same on every machine',
  },
  {
    name: /^(grammy|@grammyjs\/.*)$/,
    in: /^src\/edge\/telegram\//,
    why: 'a second platform must need no change elsewhere',
  },
  { name: /^kysely$/, in: /^src\/edge\/store\//, why: 'queries are written in one room' },
  { name: /^prom-client$/, in: /^src\/edge\/http\//, why: 'what is counted is told in one room' },
  { name: /^@fluent\//, in: /^src\/(chat\/replies|edge)\//, why: 'sentences are made in one room' },
  {
    name: /^(csv-(parse|stringify)(\/.*)?|(read|write)-excel-file\/.*|fflate)$/,
    in: /^src\/edge\/files\//,
    why: 'bytes of tables are written and read in one room',
  },
  {
    name: /^d3-(scale|shape)$/,
    in: /^src\/chat\/attachments\/chart\//,
    why: 'pictures are drawn in one room',
  },
  {
    name: /^@resvg\//,
    in: /^src\/edge\/pictures\//,
    why: 'pictures become bytes in one room',
  },
  { name: /^zod$/, in: /^src\/(edge\/|main\.ts|ask\.ts)/, why: 'what comes in is checked at the rim' },
  { name: /^pino$/, in: /^src\/(edge\/|main\.ts|ask\.ts)/, why: 'core and chat say nothing to a log' },
];

function storey(path: string): number {
  return PROGRAMS.includes(path) ? STOREYS.indexOf('program') : STOREYS.indexOf(path.split('/')[1] ?? '');
}

function room(path: string): string {
  const parts = path.split('/');
  return parts.length > 3 ? (parts[2] ?? '') : '';
}

function wrongImports(file: SourceFile): string[] {
  return file.imports.flatMap((imported) => {
    const found = imported.startsWith('src/')
      ? wrongWay(file.path, imported)
      : wrongPackage(file.path, imported);
    return found === undefined ? [] : [`${file.path} → ${imported}: ${found}`];
  });
}

function wrongWay(from: string, to: string): string | undefined {
  if (PROGRAMS.includes(to)) return 'a program is started, not imported';
  if (storey(to) > storey(from)) return 'edge knows chat, chat knows core, core knows nobody';
  if (storey(to) !== storey(from)) return undefined;
  const order = from.startsWith('src/core/') ? CORE_ROOMS : from.startsWith('src/chat/') ? CHAT_ROOMS : [];
  if (order.length === 0) return undefined;
  if (!order.includes(room(from))) return `the room ${room(from)} has no place in the order of rooms`;
  if (order.indexOf(room(to)) > order.indexOf(room(from))) return `${room(from)} stands above ${room(to)}`;
  return undefined;
}

function wrongPackage(from: string, name: string): string | undefined {
  const rule = PACKAGES.find((one) => one.name.test(name));
  if (rule === undefined) return 'no storey is named for this package';
  return rule.in.test(from) ? undefined : rule.why;
}

const files = sourceFiles('src');

test('imports go one way: edge, chat, core, and inside core and chat from a later room to an earlier one', () => {
  expect(files.flatMap(wrongImports)).toEqual([]);
});

test('no file imports itself by a detour, because such files can only be understood all at once', () => {
  expect(cycles(files)).toEqual([]);
});

test('what runs is installed: packages used in src are dependencies, at one exact version each', () => {
  const { dependencies, devDependencies, optionalDependencies } = JSON.parse(
    readFileSync('package.json', 'utf8'),
  ) as Record<string, Record<string, string>>;
  const used = files.flatMap((file) => file.imports.filter((name) => !/^(src\/|node:)/.test(name)));
  const packages = used.map((name) =>
    name
      .split('/')
      .slice(0, name.startsWith('@') ? 2 : 1)
      .join('/'),
  );
  expect(Object.keys(dependencies ?? {})).toEqual(expect.arrayContaining(packages));
  const versions = Object.values({ ...dependencies, ...devDependencies, ...optionalDependencies });
  expect(versions.filter((version) => !/^\d+\.\d+\.\d+$/.test(version))).toEqual([]);
});

test.each([
  ['src/core/dose/dose.ts', '../../chat/reader/understood.ts'],
  ['src/chat/reader/lines.ts', '../../edge/config.ts'],
  ['src/core/units/volume.ts', '../dose/dose.ts'],
  ['src/core/problem.ts', './units/volume.ts'],
  ['src/core/brewing/beer.ts', '../problem.ts'],
  ['src/chat/reader/lines.ts', '../conversation/memory.ts'],
  ['src/core/dose/dose.ts', 'mathjs'],
  ['src/chat/replies/say.ts', 'node:fs'],
  ['src/edge/terminal/terminal.ts', 'grammy'],
  ['src/edge/config.ts', 'left-pad'],
  ['src/edge/config.ts', '../main.ts'],
])('the rule finds %s importing %s', (path, imported) => {
  expect(wrongImports(parse(path, `import { x } from '${imported}';\nexport const y = x;\n`))).toHaveLength(
    1,
  );
  expect(wrongImports(parse(path, `export const y = import('${imported}');\n`))).toHaveLength(1);
});

test('the rule finds a ring of three files', () => {
  const ring = ['a', 'b', 'c'].map((name, at, all) =>
    parse(`src/core/${name}.ts`, `export * from './${all[(at + 1) % 3]}.ts';`),
  );
  expect(cycles(ring)).toEqual(['src/core/a.ts → src/core/b.ts → src/core/c.ts → src/core/a.ts']);
});
