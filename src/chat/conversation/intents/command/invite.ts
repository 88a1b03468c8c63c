import type { CellarView } from '../../../../core/cellar/cellar-store.ts';
import { DAY_ms } from '../../../../core/time/durations.ts';
import type { SaidRole } from '../../../reader/command.ts';
import { dayText } from '../../../replies/moment-text.ts';
import { codeOf } from '../../cellar/code.ts';
import { keepingRoster } from '../../cellar/keeping-roster.ts';
import type { Invitation } from '../../cellar/invitation.ts';
import type { Here } from '../../here.ts';
import { inviteKey } from '../../keys.ts';
import { line } from '../../lines/line.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { tellingOf } from '../../telling.ts';

/** So long an invitation can be used, in milliseconds (a week; own choice). */
const INVITATION_ms = 7 * DAY_ms;

/** A code with which another person or chat joins once, with a role. */
export async function invite(role: SaidRole | undefined, here: Here, view: CellarView): Promise<Handled> {
  if (role === undefined) return replying(here, { lines: [line('first', 'invite-how')] });
  const { message, roster } = here;
  const { cellar, nonce: secret = '', title, at, linkBegin, isJoined } = message;
  const code = codeOf({ cellar, secret });
  if (code === undefined || (await view.kept(inviteKey(secret))) !== undefined)
    return replying(here, { lines: [line('first', 'invite-not-here')] });
  const until = at + INVITATION_ms;
  const values = {
    role,
    code,
    link: linkBegin === undefined ? 'none' : `${linkBegin}${code}`,
    day: dayText(until, tellingOf(here)),
  };
  const { writes, ...said } = replying(here, {
    lines: [line('first', 'invited', values), line('effect', 'invited-how', values)],
  });
  const invitation: Invitation = { role, until };
  // Those who join see the cellar under some name.
  const isUntitled = !isJoined && title !== undefined && roster.title !== title;
  return {
    ...said,
    writes: [
      { kind: 'keep', key: inviteKey(secret), text: JSON.stringify(invitation), until },
      ...(isUntitled ? [keepingRoster({ ...roster, title })] : []),
      ...writes,
    ],
  };
}
