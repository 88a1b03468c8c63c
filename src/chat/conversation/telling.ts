import type { Telling } from '../replies/moment-text.ts';
import type { Here } from './here.ts';
import { zoneOf } from './zone.ts';

/** How moments are told here and now. */
export function tellingOf({ settings, message }: Pick<Here, 'settings' | 'message'>): Telling {
  return { zone: zoneOf(settings), language: settings.language, now: message.at };
}
