import { readFileSync } from 'node:fs';
import type { Outcome, Part } from './part.ts';

/** How many checks of a part held and how many did not. */
export interface Count {
  readonly passed: number;
  readonly failed: number;
}

/** A file of vitest's JSON report, as far as it is read here. */
interface Report {
  readonly numPassedTests: number;
  readonly numFailedTests: number;
}

/**
 * Counts a part. A run of vitest counts its tests; any other part is one check.
 * A run that ends badly without naming a failed test (a file that does not load, no report) has one failure.
 */
export function count(part: Part, outcome: Outcome): Count {
  const good = outcome.status === 0;
  if (part.countsFile === undefined) return good ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
  const report = readReport(part.countsFile);
  const passed = report?.numPassedTests ?? 0;
  const failed = report?.numFailedTests ?? 0;
  // Not one test is a failure too: a gate that looks at nothing must not pass.
  return { passed, failed: failed === 0 && (!good || passed === 0) ? 1 : failed };
}

function readReport(file: string): Report | undefined {
  try {
    return JSON.parse(readFileSync(file, 'utf8')) as Report;
  } catch {
    return undefined;
  }
}
