/** The middle one of some measurements; of an even number the higher of the two in the middle. */
export function median(values: readonly number[]): number {
  return values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;
}

/** Milliseconds that one call takes until it has ended: the median of several, after a few that only warm up. */
export async function timeOf(
  call: () => unknown,
  { times, warmUp }: { times: number; warmUp: number },
): Promise<number> {
  for (let i = 0; i < warmUp; i += 1) await call();
  const seen: number[] = [];
  for (let i = 0; i < times; i += 1) {
    const begun = performance.now();
    await call();
    seen.push(performance.now() - begun);
  }
  return median(seen);
}
