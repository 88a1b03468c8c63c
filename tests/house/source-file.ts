import { readFileSync, readdirSync } from 'node:fs';
import { posix } from 'node:path';
import { parseSync } from 'vite';
import type { ParseResult } from 'vite';

/** A file of the project with its syntax tree; `path` is relative to the top and uses `/`. */
export interface SourceFile {
  readonly path: string;
  readonly text: string;
  readonly lines: number;
  readonly program: ParseResult['program'];
  readonly comments: ParseResult['comments'];
  /** What it imports or re-exports: paths from the top of the project, or names of packages. */
  readonly imports: readonly string[];
}

const NOT_OURS = ['node_modules', '.git', 'data'];

/** Every file under a folder, paths relative to the top of the project, in order. */
export function filesUnder(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true })
    .filter((entry) => !NOT_OURS.includes(entry.name))
    .flatMap((entry) => {
      const path = folder === '.' ? entry.name : posix.join(folder, entry.name);
      return entry.isDirectory() ? filesUnder(path) : [path];
    })
    .toSorted();
}

/** Parses a text as the TypeScript file it would be at `path`: also how a test plants a violation. */
export function parse(path: string, text: string): SourceFile {
  const { program, comments, module, errors } = parseSync(path, text);
  if (errors.length > 0) throw new SyntaxError(`Cannot parse ${path}: ${errors[0]?.message}`);
  const named = [
    ...module.staticImports.map((one) => one.moduleRequest.value),
    ...module.staticExports.flatMap((one) => one.entries.map((entry) => entry.moduleRequest?.value ?? '')),
    ...module.dynamicImports.map((one) =>
      text.slice(one.moduleRequest.start, one.moduleRequest.end).replaceAll(/['"`]/g, ''),
    ),
  ].filter((name) => name !== '');
  const imports = [...new Set(named)].map((name) =>
    name.startsWith('.') ? posix.join(posix.dirname(path), name) : name,
  );
  return { path, text, lines: text.trimEnd().split('\n').length, program, comments, imports };
}

/** The TypeScript files under a folder. */
export function sourceFiles(folder: string): SourceFile[] {
  return filesUnder(folder)
    .filter((path) => path.endsWith('.ts'))
    .map((path) => parse(path, readFileSync(path, 'utf8')));
}

/** `path:line` of a place in a file, for a message a person can follow. */
export function placeOf(file: SourceFile, offset: number): string {
  return `${file.path}:${file.text.slice(0, offset).split('\n').length}`;
}
