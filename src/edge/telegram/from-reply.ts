import type { Said } from '../../chat/replies/say.ts';
import { splitText } from './split-text.ts';

/** One call of `sendMessage`, without its chat. */
export interface Sending {
  readonly text: string;
  readonly link_preview_options: { is_disabled: true };
  readonly reply_markup?: { inline_keyboard: { text: string; callback_data: string }[][] };
}

/** The longest key of a button that the platform carries, in bytes of UTF-8. */
export const LONGEST_KEY_BYTES = 64;

/** Two buttons stand side by side when both labels are at most this long; longer ones would be cut on a phone. */
const SHORT_LABEL = 20;

/**
 * Makes the calls that send a reply: the text as it is, without a parse mode, so that nothing a person
 * wrote becomes markup; split at a line where it is too long, with the buttons under the last piece. A button
 * whose key the platform would refuse is left out, as it would take the whole message with it.
 */
export function toSendings(reply: Said): Sending[] {
  const pieces = splitText(reply.text);
  const rows = keyboardRows(reply.buttons);
  return pieces.map((text, index) => ({
    text,
    link_preview_options: { is_disabled: true },
    ...(rows.length > 0 && index === pieces.length - 1 ? { reply_markup: { inline_keyboard: rows } } : {}),
  }));
}

const keyboardRows = (buttons: Said['buttons']): { text: string; callback_data: string }[][] => {
  const rows: { text: string; callback_data: string }[][] = [];
  for (const { key, label } of buttons) {
    if (key === '' || label.trim() === '' || Buffer.byteLength(key) > LONGEST_KEY_BYTES) continue;
    const last = rows.at(-1);
    const fits =
      last?.length === 1 && [last[0]?.text ?? '', label].every((text) => text.length <= SHORT_LABEL);
    if (fits) last.push({ text: label, callback_data: key });
    else rows.push([{ text: label, callback_data: key }]);
  }
  return rows;
};
