import { expect, test } from 'vitest';
import { startTalk } from './talk.ts';

/** The limits of the texts: OIV-MA-C1-01; Delegated Regulation (EU) 2019/934, Annex I Part B, both read. */
test.each([
  [['T4 40 hl red pH 3.5 free 20'], 150],
  [['law EU', 'T4 40 hl white pH 3.3 free 20', 'T4 RS 6'], 250],
  [['law Uruguay', 'T4 40 hl red pH 3.5 free 20'], undefined],
])('after %j a picture draws the limit %s', async (messages, limit_mg_L) => {
  const talk = startTalk();
  for (const one of messages) await talk.write(one);
  const { errand } = await talk.write('picture T4');
  expect(errand).toMatchObject({ kind: 'picture', vessel: 'tank 4' });
  expect(errand).toEqual({ ...errand, limit_mg_L });
});
