/** The names of vessels in one cell: parted by commas, a comma or backslash of a name behind a backslash. */
export function joinNames(names: readonly string[]): string {
  return names.map((name) => name.replaceAll(/[\\,]/g, '\\$&')).join(', ');
}

/** The names that `joinNames` has joined; blanks around a name are dropped. */
export function splitNames(text: string): string[] {
  return [...text.matchAll(/(?:[^\\,]|\\.)+/gsu)]
    .map(([name]) => name.trim().replaceAll(/\\(.)/gsu, '$1'))
    .filter((name) => name !== '');
}
