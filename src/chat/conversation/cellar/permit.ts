import type { CellarView, Write } from '../../../core/cellar/cellar-store.ts';
import type { Command } from '../../reader/command.ts';
import type { Intent } from '../../reader/understood.ts';
import type { Here } from '../here.ts';
import { ROSTER_KEY, SETTINGS_KEY } from '../keys.ts';
import type { Handled } from '../ports.ts';
import { asGuestSees } from './as-guest-sees.ts';
import { refused } from './refused.ts';
import { ROLES, type Role } from './roster.ts';

/** The words that are a keeper's, whatever comes of them. */
const KEEPERS_WORDS: ReadonlySet<Command['name']> = new Set([
  'set',
  'set-wrong',
  'forget',
  'import',
  'backup',
  'invite',
  'remove-person',
  'make-person',
  'name-cellar',
  'read-along',
]);

/** What is kept under keys that begin so changes the cellar for everybody. */
const KEEPERS_KEYS = [SETTINGS_KEY, ROSTER_KEY, 'import '] as const;

/** What a guest may ask for, as nothing of it need be kept. */
const LOOKS: ReadonlySet<Intent> = new Set<Intent>(['dose', 'effect', 'solution', 'chat']);

/**
 * What was made of a message, as far as the person may do it: judged in this one place by the words, the writes and the
 * errand that came of it. A guest gets a dose reckoned, and nothing of it is kept; what a person may not do they are
 * told, and who may.
 */
export async function permit(handled: Handled, here: Here, view: CellarView): Promise<Handled> {
  const { role } = here;
  if (role === 'keeper' || isEmergency(handled)) return handled;
  const needed = roleNeeded(handled, here);
  if (role !== undefined && ROLES.indexOf(role) >= ROLES.indexOf(needed)) return handled;
  return role === 'guest' && isOnlyReckoned(handled) ? asGuestSees(handled) : refused(needed, here, view);
}

function isEmergency({ understood }: Handled): boolean {
  return understood?.readings.some(({ intent }) => intent === 'emergency') === true;
}

function roleNeeded(handled: Handled, here: Here): Role {
  const { writes, errand, place, understood } = handled;
  const name = understood?.readings[0]?.command?.name;
  if (name !== undefined && KEEPERS_WORDS.has(name)) return 'keeper';
  // Whoever wants to be forgotten is, and whoever wants to go goes.
  if (name === 'forget-me' || name === 'leave') return 'guest';
  if (errand?.kind === 'import' || errand?.kind === 'backup') return 'keeper';
  // In a group another cellar is another one for all who are there.
  const isGroup = (here.message.addressed ?? 'direct') !== 'direct';
  if (place?.does === 'switch' && isGroup) return 'keeper';
  const each = writes.map(roleForWrite);
  const asked: Role = name === 'people' ? 'hand' : 'guest';
  return each.reduce((one, other) => (ROLES.indexOf(one) > ROLES.indexOf(other) ? one : other), asked);
}

function roleForWrite(write: Write): Role {
  if (write.kind === 'due') return 'hand';
  if (write.kind === 'keep' || write.kind === 'drop') {
    if (KEEPERS_KEYS.some((key) => write.key.startsWith(key))) return 'keeper';
    return /^(claim|plan) /.test(write.key) ? 'hand' : 'guest';
  }
  if (write.kind !== 'entry') return 'guest';
  const { entry } = write;
  if (entry.kind === 'vessel' && entry.event === 'forgotten') return 'keeper';
  // Any hand may strike any entry with a reason: both stay, under the names of who noted and who struck.
  return 'hand';
}

/** Whether nothing was to be noted but what a dose was reckoned of. */
function isOnlyReckoned({ understood, writes, errand }: Handled): boolean {
  if (errand !== undefined || understood?.readings.some(({ intent }) => !LOOKS.has(intent))) return false;
  return writes.every((write) => {
    if (write.kind === 'due') return false;
    if (write.kind === 'keep' || write.kind === 'drop')
      return !KEEPERS_KEYS.some((key) => write.key.startsWith(key)) && !write.key.startsWith('claim ');
    if (write.kind !== 'entry') return true;
    const { entry } = write;
    return entry.kind === 'reading' || (entry.kind === 'vessel' && entry.event === 'told');
  });
}
