/** A moment (milliseconds since 1970) as it stands in a file's name: sorted by name is sorted by time. UTC. */
export function momentInName(moment: number): string {
  return new Date(moment).toISOString().slice(0, 19).replaceAll(/[:T]/g, '-');
}
