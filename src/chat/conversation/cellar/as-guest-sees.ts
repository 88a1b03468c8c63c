import type { Write } from '../../../core/cellar/cellar-store.ts';
import type { Reply } from '../../replies/reply.ts';
import { line } from '../lines/line.ts';
import type { Handled } from '../ports.ts';

/** A dose that was reckoned for a guest: the same, and nothing of it is noted or planned. */
export function asGuestSees(handled: Handled): Handled {
  const writes = handled.writes.filter(isOfTheirOwn);
  if (writes.length === handled.writes.length) return handled;
  const [first, ...others] = handled.replies;
  return { ...handled, writes, replies: first === undefined ? [] : [notKept(first), ...others] };
}

/** What a conversation needs to go on. */
function isOfTheirOwn(write: Write): boolean {
  return (
    write.kind !== 'entry' &&
    !((write.kind === 'keep' || write.kind === 'drop') && write.key.startsWith('plan '))
  );
}

/** What was read is not said to be kept. */
function notKept(reply: Reply): Reply {
  const lines = reply.lines.map((one) =>
    one.key === 'read-kept' ? { ...one, key: 'read', values: {} } : one,
  );
  return { ...reply, lines: [...lines, line('warning', 'guest-not-kept')] };
}
