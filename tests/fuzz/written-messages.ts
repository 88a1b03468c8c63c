import { existsSync, readFileSync, readdirSync } from 'node:fs';

/** The texts of `tests/messages`, as people write them. */
export function writtenMessages(): string[] {
  const folder = new URL('../messages/', import.meta.url);
  const files = existsSync(folder) ? readdirSync(folder, { recursive: true }).map(String) : [];
  const rows = files
    .filter((name) => name.endsWith('.jsonl'))
    .flatMap((name) => readFileSync(new URL(name, folder), 'utf8').split('\n'))
    .filter((line) => line.trim() !== '');
  const texts = rows.map((line) => (JSON.parse(line) as { readonly text?: string }).text ?? '');
  return ['T4 1450 gal pH 3.58 free 21', ...texts];
}
