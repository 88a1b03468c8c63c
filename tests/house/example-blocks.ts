/** The code of every `@example` of a doc comment: what stands between ```ts and ``` after it. */
export function exampleBlocks(doc: string): string[] {
  const found: string[] = [];
  for (const part of doc.split(/^@example\b/m).slice(1)) {
    const own = part.split(/^@\w+/m)[0] ?? '';
    for (const [, code] of own.matchAll(/^```(?:ts|typescript|js)?\n([\s\S]*?)^```/gm))
      found.push(code ?? '');
  }
  return found;
}
