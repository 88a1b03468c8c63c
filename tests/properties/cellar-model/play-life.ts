import fc from 'fast-check';
import { Bot } from './bot.ts';
import { freshModel, type Model } from './model.ts';
import { Differs } from './saying.ts';

/** Plays a stretch of a cellar's life by the rules and by the program, in a file where one is named. */
export async function playLife(life: Iterable<fc.AsyncCommand<Model, Bot>>, file?: string): Promise<void> {
  const bot = new Bot(file);
  const model = freshModel(bot.now);
  try {
    await fc.asyncModelRun(() => ({ model, real: bot }), life);
    const differed = await bot.rebuild();
    if (differed.length > 0) throw new Differs(`a rebuild differs: ${differed.join(', ')}`);
  } catch (error) {
    if (error instanceof Error) error.message += `\n${model.story.join('\n')}`;
    throw error;
  } finally {
    await bot.end();
  }
}
