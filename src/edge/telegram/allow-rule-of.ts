import type { AllowRule } from '../cellars/allow-rule.ts';
import { personNameOf } from './who-of.ts';

/** Who may use the bot, by the numbers that the platform has for people; absent: everybody. */
export function allowRuleOf(allow: readonly number[] | undefined): AllowRule {
  return allow === undefined ? { is: 'open' } : { is: 'invited', ids: allow.map(personNameOf) };
}
