import { answerInline } from '../../chat/conversation/answer-inline.ts';
import type { Settings } from '../../chat/conversation/settings.ts';
import type { Say } from '../../chat/replies/say.ts';
import { mayUse, type AllowRule } from '../cellars/allow-rule.ts';
import { createRateLimit } from '../cellars/rate-limit.ts';
import type { Registry } from '../cellars/registry.ts';
import type { TypedWork } from './answer-typed.ts';

/** What it is made of. */
export interface TypedParts {
  readonly say: Say;
  readonly settings: Settings;
  readonly rule: AllowRule;
  readonly registry: Pick<Registry, 'cellarsOfChat'>;
  readonly now: () => number;
}

/** What is typed is asked for at every halt of a finger. */
const A_MINUTE = 60;

/** Makes what answers what is typed in any chat, for those who may use the bot: a person's own chat tells that. */
export function makeTypedWork({ say, settings, rule, registry, now }: TypedParts): TypedWork {
  const paceOf = createRateLimit(A_MINUTE);
  return {
    answer: (text, language) => {
      const reply = answerInline(text, language, settings);
      return reply && say(reply);
    },
    mayAsk: async (person, id) => {
      // A private chat has the number of its person.
      const asking = { person, chat: person, cellar: person, language: 'en', at: now(), id } as const;
      const content = { kind: 'unreadable', what: 'other' } as const;
      if (paceOf({ ...asking, content }) !== 'fine') return false;
      return mayUse(rule, asking, await registry.cellarsOfChat(person));
    },
  };
}
