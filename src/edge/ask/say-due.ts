import { makeServeDue, type ServingDue, type Unasked } from '../serve-due.ts';
import type { CellarStore } from '../../core/cellar/cellar-store.ts';

/** Each is handed out once within a tick. */
const LEASE_ms = 60_000;
const MOST = 50;

/** What falls due by a moment (milliseconds since 1970), the earliest first; what it wrote is durable. */
export async function sayDue(
  at: number,
  { store, ...serving }: ServingDue & { readonly store: CellarStore },
): Promise<readonly Unasked[]> {
  const serveDue = makeServeDue({ store, ...serving });
  const sends: Unasked[] = [];
  for (;;) {
    const taken = await store.takeDue(at, { lease_ms: LEASE_ms, most: MOST });
    if (taken.length === 0) return sends;
    for (const due of taken) {
      const one = await serveDue(due, at);
      if (one.said.length > 0) sends.push(one);
    }
  }
}
