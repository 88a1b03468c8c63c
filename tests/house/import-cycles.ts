import type { SourceFile } from './source-file.ts';

/** The rings of imports among some files, each once, from its first file in alphabetical order. */
export function cycles(files: readonly SourceFile[]): string[] {
  const imports = new Map(files.map((file) => [file.path, file.imports]));
  const finished = new Set<string>();
  const found = new Set<string>();
  const visit = (path: string, trail: readonly string[]): void => {
    const since = trail.indexOf(path);
    if (since >= 0) found.add(asText(trail.slice(since)));
    if (since >= 0 || finished.has(path)) return;
    for (const next of imports.get(path) ?? []) visit(next, [...trail, path]);
    finished.add(path);
  };
  for (const path of imports.keys()) visit(path, []);
  return [...found];
}

function asText(ring: readonly string[]): string {
  const first = ring.indexOf(ring.toSorted()[0] ?? '');
  const turned = [...ring.slice(first), ...ring.slice(0, first)];
  return [...turned, turned[0]].join(' → ');
}
