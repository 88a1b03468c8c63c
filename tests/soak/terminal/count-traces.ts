import { traceOf, type LogLine } from './stream.ts';
import { runProgram } from './typing.ts';

/** All that is in a file, as another program reads it. */
export async function readLog(file: string): Promise<readonly LogLine[]> {
  const lines = await runProgram('ask.ts', ['--data', file, '--log']);
  return lines.split('\n').flatMap((line) => (line === '' ? [] : [JSON.parse(line) as LogLine]));
}

/** How often each trace is in a log. */
export function countTraces(log: readonly LogLine[]): ReadonlyMap<string, number> {
  const byEntry = new Map(log.map((line) => [line.entry, line]));
  const counts = new Map<string, number>();
  for (const line of log) {
    const trace = traceOf(line, byEntry);
    counts.set(trace, (counts.get(trace) ?? 0) + 1);
  }
  return counts;
}
