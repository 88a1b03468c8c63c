import type { Model } from './model.ts';
import type { Move } from './move.ts';
import { firstLine } from './saying.ts';

/** Something comes again, as it was: nothing is noted again. */
export function comesAgain(pick: number): Move {
  const which = ({ delivered }: Model): Model['delivered'][number] | undefined => {
    const noting = delivered.filter(({ hasNoted }) => hasNoted).slice(-8);
    return noting.at(-1 - (pick % Math.max(1, noting.length)));
  };
  return {
    name: 'is delivered again',
    can: (model) => which(model) !== undefined,
    play: async (model, bot) => {
      bot.now = model.now;
      const { message } = which(model)!;
      const said = await bot.deliver(message);
      model.story.push(`again: ${JSON.stringify(message.content)}\n    ${firstLine(said)}`);
    },
  };
}

/** The program ends and begins anew. */
export const RESTART: Move = {
  name: 'restart',
  play: async (_model, bot) => bot.restart(),
};
