import { expect, test } from 'vitest';
import { readMessage } from '../../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';
import { withoutMentions } from '../../../src/chat/reader/without-mentions.ts';

test.each(['@cellar2_bot T4?', 'T4? @luis_99', 'hi @luis99, @brimnote_bot: T4'])(
  'a figure in a name is none, and all else stays where it was: %s',
  (text) => {
    expect(withoutMentions(text)).toHaveLength(text.length);
    expect(withoutMentions(text)).not.toMatch(/2_bot|99|brimnote/);
    expect(readMessage(text, READER_DEFAULTS).readings[0]?.fields.free_mg_L).toBeUndefined();
  },
);

test.each(['/today@brimnote_bot', 'T4 40 hl @ pH 3.4', '@T4 free 20', 'ana@example.org', 'free 20 @pH 3.4'])(
  'what calls nobody stays: %s',
  (text) => {
    expect(withoutMentions(text)).toBe(text);
  },
);
