import type { FieldName, Reading, Understood } from '../../reader/understood.ts';
import { readMessage } from '../../reader/read-message.ts';
import type { Here } from '../here.ts';

/** What a reading must have one of, with its label, to be one beyond doubt. */
const FIGURES: readonly FieldName[] = [
  'ph',
  'free_mg_L',
  'total_mg_L',
  'mass_g',
  'additive_volume_mL',
  'target',
];

/** How a figure was read without its label. */
const UNLABELLED: ReadonlySet<string> = new Set(['free-unlabelled', 'ph-unlabelled']);

/**
 * Whether a message is for the bot at all. In a group it speaks when spoken to; of what is said among others it takes an
 * emergency, and where a keeper said so a vessel with figures that leaves nothing in doubt.
 */
export function isForUs({
  message,
  settings,
  roster,
}: Pick<Here, 'message' | 'settings' | 'roster'>): boolean {
  const { addressed, content } = message;
  if (addressed !== 'overheard') return true;
  if (content.kind !== 'text' && content.kind !== 'edited') return false;
  const understood = readMessage(content.text, settings);
  if (understood.readings.some(({ intent }) => intent === 'emergency')) return true;
  return roster.readsAlong === true && isPlainly(understood);
}

function isPlainly({ readings }: Understood): boolean {
  return readings.length > 0 && readings.every(isPlainlyAReading);
}

function isPlainlyAReading({ intent, fields, problems, notes, marks }: Reading): boolean {
  if (intent !== 'dose' && intent !== 'reading' && intent !== 'added') return false;
  if (problems.length > 0 || marks.conditional || fields.vessel === undefined) return false;
  return FIGURES.some((name) => fields[name] !== undefined) && !notes.some(({ id }) => UNLABELLED.has(id));
}
