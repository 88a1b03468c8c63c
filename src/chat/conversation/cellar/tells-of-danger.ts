import { recogniseEmergency } from '../../reader/emergency.ts';
import { foldText } from '../../reader/fold-text.ts';
import { LONGEST_MESSAGE } from '../../reader/read-message.ts';
import type { IncomingMessage } from '../ports.ts';

/** Whether a message tells of somebody in danger: that is answered whoever writes it, and wherever. */
export function tellsOfDanger({ content, language }: Pick<IncomingMessage, 'content' | 'language'>): boolean {
  if (content.kind !== 'text' && content.kind !== 'edited') return false;
  return recogniseEmergency(foldText(content.text.slice(0, LONGEST_MESSAGE)).text, language) !== undefined;
}
