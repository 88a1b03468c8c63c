const DELIMITERS = [';', '\t', ',', '|'] as const;

/** What parts the cells of a text, told by its first line that is not empty: the sign that stands there most often. */
export function delimiterOf(text: string): string {
  const line = headingLine(text);
  const bare = line.replaceAll(/"(?:[^"]|"")*"/g, '');
  const times = DELIMITERS.map((sign) => bare.split(sign).length - 1);
  const most = Math.max(...times);
  return most === 0 ? ',' : (DELIMITERS[times.indexOf(most)] ?? ',');
}

/** The first line with anything in it, and no more of it than headings can be long. */
function headingLine(text: string): string {
  return /[^\r\n]+/.exec(text.slice(0, LONGEST_HEADINGS).trimStart())?.[0] ?? '';
}

/** Letters in the line of headings; own threshold. */
const LONGEST_HEADINGS = 16_384;
