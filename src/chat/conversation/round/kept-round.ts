import type { CellarView, Write } from '../../../core/cellar/cellar-store.ts';
import type { RoundSheet } from '../../attachments/round/round-sheet.ts';
import type { Here } from '../here.ts';
import { lastRoundKey, roundKey } from '../keys.ts';
import { BUTTONS_ms } from '../plan.ts';

/** The writes that keep a round, for its buttons and for whoever asks for its sheet. */
export function keepingRound(sheet: RoundSheet, { message }: Here): Write[] {
  const until = message.at + BUTTONS_ms;
  return [
    { kind: 'keep', key: roundKey(message.chat, sheet.ref), text: JSON.stringify(sheet), until },
    { kind: 'keep', key: lastRoundKey(message.chat), text: sheet.ref, until },
  ];
}

/** A round of this chat that was kept; without a name the last one. */
export async function keptRound(
  { message: { chat } }: Here,
  view: CellarView,
  ref?: string,
): Promise<RoundSheet | undefined> {
  const name = ref ?? (await view.kept(lastRoundKey(chat)));
  const text = name === undefined ? undefined : await view.kept(roundKey(chat, name));
  return text === undefined ? undefined : (JSON.parse(text) as RoundSheet);
}
