import { expect, test } from 'vitest';

import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { CONFLICT, SERVER_ERROR, SLOW_DOWN } from './fault.ts';
import { realConversation } from './real-conversation.ts';
import { openScene } from './scene.ts';
import { hastyClock } from './served-bot.ts';

test('a private chat on a bad day: every message is answered, and twice only where the receipt was lost', async () => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  // The store outlives the bot here, as a file would.
  const whole = { ...realConversation, store: createMemoryCellars({ now: hastyClock.now }) };

  api.fail('getMe', { error_code: 401, description: 'Unauthorized' });
  await expect(serve(whole).ended).rejects.toThrow('does not accept BOT_TOKEN (401)');

  api.fail('getMe', 'reset');
  api.fail('getUpdates', CONFLICT, SERVER_ERROR);
  const bot = serve(whole);
  rosa.sends('/start');
  expect(await rosa.reads(1)).toContain('T4 1450 gal pH 3.58 free 21');

  api.fail('sendMessage', SLOW_DOWN);
  rosa.sends('pH 3.58 free 21');
  expect(await rosa.reads(2)).toContain('volume?');

  api.fail('sendMessage', SERVER_ERROR, 'reset', 'gateway page');
  rosa.sends('1450 gal', { twice: true });
  expect(await rosa.reads(3)).toContain('256 g potassium metabisulfite');

  api.fail('sendMessage', 'receipt lost');
  rosa.taps('Working');
  expect(await rosa.reads(4)).toContain('147.7 g ÷ 0.57629 = 256.3 g');
  expect(await rosa.reads(5)).toBe(rosa.texts[3]);

  api.fail('answerCallbackQuery', { error_code: 400, description: 'Bad Request: query is too old' });
  rosa.taps('Red');
  expect(await rosa.reads(6)).toContain('142 g');

  rosa.sends({ sticker: { file_id: 'f' } });
  expect(await rosa.reads(7)).toContain('I only read text');
  rosa.edits('T4 1540 gal pH 3.58 free 21');
  await api.until(() => rosa.got[6]?.isEdited === true);
  expect(rosa.texts[6]).toMatch(/^Corrected\.\nT4: weigh/);

  api.fail('sendMessage', SERVER_ERROR);
  const before = api.callsOf('sendMessage').length;
  rosa.sends('T5 pH 3.4 free 18');
  rosa.sends('20 hl');
  await api.until(() => api.callsOf('sendMessage').length > before);
  await bot.stop();
  serve(whole);
  expect(await rosa.reads(8)).toContain('T5: what volume?');
  expect(await rosa.reads(9)).toContain('T5: weigh');
  expect(rosa.texts).toHaveLength(9);
  expect(api.callsOf('answerCallbackQuery')).toHaveLength(2);
});
