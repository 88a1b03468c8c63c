/** A round of so many tanks, one line each, as short as people write them: 200 fit into one message. */
export function roundOf(vessels: number): string {
  const lines = Array.from({ length: vessels }, (_, at) => {
    const ph = (3.3 + (at % 40) / 100).toFixed(2);
    return `T${at + 1} ${8 + (at % 50)}hl ${ph} ${10 + (at % 20)}`;
  });
  return lines.join('\n');
}
