/** R: the barest grammY bot with its runner, which echoes. `node bare-bot.ts ROOT`. */
import { run } from '@grammyjs/runner';
import { Bot } from 'grammy';

import { TOKEN } from '../../edge/telegram/token.ts';

const bot = new Bot(TOKEN, { client: { apiRoot: process.argv[2] ?? '' } });
bot.on('message:text', (ctx) => ctx.reply(ctx.message.text));
const runner = run(bot);
process.on('SIGTERM', () => void runner.stop().then(() => process.exit(0)));
