/** Numbers of entries that follow each other as people read them: `12`, `12–35`; others one by one. */
export function entryRange(entries: readonly number[]): string {
  const [first, ...others] = entries;
  if (first === undefined) return '';
  const last = others.at(-1) ?? first;
  if (last - first === others.length && others.length > 1) return `${first}–${last}`;
  return entries.join(', ');
}
