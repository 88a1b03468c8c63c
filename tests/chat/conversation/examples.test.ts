import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { localeMessages } from '../../../.ci/locale-messages.ts';
import type { Handled } from '../../../src/chat/conversation/ports.ts';
import { startTalk, textOf, type Talk } from './talk.ts';

/** What stands before an example in a sentence. */
const BEFORE = /(?:\blike:|\bwrite(?: it whole| one of them)?:|with its unit:|I can do:|powder only:)\s+/i;

/** Sentences of other texts that hold what looks like an example, and why it is none to send. */
const NONE: Readonly<Record<string, string>> = {
  'terminal-start': 'its example stands in the line below',
  'demo-start-reading': 'the demo is tried by itself',
  'undo-late': 'it takes a quarter of an hour: a dialogue has it',
  'undo-not-yours': 'it takes two people: a dialogue has it',
  'last-keeper': 'it takes two people: a dialogue has it',
  'person-which': 'it takes two people: a dialogue has it',
  'joined-how': 'it takes two people: a dialogue has it',
  'import-problem': 'it takes a file: the tests of files have it',
};

/** Each sentence with examples, and the messages after which a person reads it. */
const SCENES: readonly (readonly [key: string, ...messages: string[]])[] = [
  ['ask-vessel', 'added 20 g kmbs'],
  ['ask-volume_L', 'T4 pH 3.5 free 20'],
  ['ask-ph', 'T4 40 hl free 20'],
  ['ask-free_mg_L', 'T4 40 hl pH 3.5'],
  ['ask-target', 'port 20 hl pH 3.6 free 12'],
  ['ask-target', 'T4 40 hl white, ML done, pH 3.4 free 15', 'press t:1.1'],
  ['ask-target-stage', 'T5 40 hl must'],
  ['ask-target-stage', 'B1-B3 must 225 L'],
  ['ask-target-stage', 'T9 base wine 1450 gal'],
  ['ask-target-stage', 'T5 40 hl must add 40 ppm', 'press t:1.1'],
  ['ask-strength_percent', 'kmbs solution 40 hl add 25 ppm'],
  ['ask-strength_percent', 'SO2 water 40 hl add 25 ppm'],
  ['ask-strength_percent', 'khso3 40 hl add 25 ppm'],
  ['ask-strength_percent', 'ammonium bisulfite 40 hl must add 25 ppm'],
  ['no-dose-all-the-same', 'T4 1450 gal in ML free 5'],
  ['no-dose-all-the-same', 'tank 4 40 hl still fermenting'],
  ['no-dose-all-the-same', 'T1-T3 40 hl each in ML free 5'],
  ['figure-alone', 'T5 40 hl must', '40'],
  ['figure-alone', 'T4 1450 gal in ML free 5', 'add 30 ppm'],
  ['ask-fruit', '2 t grapes add 40'],
  ['ask-solution-volume', 'holding solution'],
  ['ask-solution-volume', 'rinse T4'],
  ['solution-from-powder', 'make 2 L of 5% so2'],
  ['problem-ph-out-of-range', 'T4 40 hl ph 36 free 22'],
  ['problem-total-below-free', '60/18 3.55 1600 gal'],
  ['problem-volume-not-positive', 'T4 0 gal pH 3.5 free 20'],
  ['problem-each-or-total', 'T1-T4 900 L pH 3.5 free 20'],
  ['problem-strength-out-of-range', '40% kmbs solution 40 hl add 30 ppm'],
  ['problem-strength-out-of-range', 'T4 40 hl add 25 ppm, 30% kmbs'],
  ['problem-ambiguous-number', 'T4 40 hl pH 3.5 80 ppm'],
  ['problem-ambiguous-number', '3 g/hl SO2 T4 40 hl pH 3.5'],
  ['problem-ambiguous-number', '3 g/hl kmbs in T4 40 hl'],
  ['problem-ambiguous-number', '50 ppm smbs in T4 40 hl'],
  ['problem-ambiguous-number', 'T4 20 hl 18 to 21 pH 3.5'],
  ['problem-ambiguous-number', '18-20 free 40 hl pH 3.5'],
  ['problem-ambiguous-number', '25/28 ppm 40 hl pH 3.5'],
  ['problem-ambiguous-number', 'needs 25 ppm 40 hl pH 3.5'],
  ['problem-ambiguous-number', '1.250 kg kmbs in 40 hl'],
  ['problem-ambiguous-number', 'T4 1.200 L pH 3.4 free 20'],
  ['problem-ambiguous-number', 'T4 1.200 gal pH 3.4 free 20'],
  ['problem-ambiguous-number', 'khso3 40 hl add 25 ppm', '30'],
  ['problem-ambiguous-number', 'ammonium bisulfite 40 hl must add 25 ppm', '50'],
  ['problem-ambiguous-number', 'SO2 water 40 hl add 25 ppm', '15'],
  ['problem-not-understood', 'asdf qwer zxcv'],
  ['chat-greeting', 'hi'],
  ['chat-other', 'who left the pump on'],
  ['vessel-unknown', 'T9?'],
  ['ask-zone', 'added 20 g kmbs T4'],
  ['designation-asked', 'law EU', 'T4 40 hl white RS 60 pH 3.4 free 15 total 240 ML done'],
  ['order-how', 'order T4'],
  ['strike-why', 'added 20 g kmbs T4', 'strike 1'],
  ['history-empty', 'history'],
  ['vessels-none', 'vessels'],
  ['setting-wrong', 'target 5 for reds'],
  ['setting-wrong', 'quiet 25 to 6'],
  ['setting-wrong', 'time zone Moonbase'],
  ['setting-wrong', 'allowance 200%'],
  ['setting-wrong', 'our usual is kmbs 12%'],
  ['setting-wrong', 'daily list at 27:00'],
  ['invite-how', 'invite'],
  ['stock-lacks', 'received kmbs'],
  ['stock-lacks', 'stock kmbs 3.2'],
  ['stock-lacks', 'discarded kmbs'],
  ['stock-lacks', 'received 10 L so2 solution'],
  ['stock-lacks', 'received 10 kg 6% so2'],
  ['stock-lacks', 'received 50 tablets'],
  ['stock-lacks', 'received 25 kg sulfite powder'],
  ['added-it-none', 'added it'],
  ['picture-none', 'picture'],
  ['range-nothing', 'range'],
  ['lab-lacks', 'T4 free 20', 'molecular T4'],
  ['lab-lacks', 'T4 pH 3.5', 'T5 pH 3.4 free 20', 'blend T4 T5'],
  ['volume-differs', 'T4 40 hl pH 3.5 free 20', 'T4 now 500 L free 25'],
];

/** Doubts that only the whole line settles: each way to write the figure, in a whole line. */
const WHOLE_LINES: readonly (readonly [message: string, ...whole: string[]])[] = [
  ['12° 40 hl pH 3.5 free 18', '12% vol 40 hl pH 3.5 free 18', '12 C 40 hl pH 3.5 free 18'],
  [
    '12% kmbs T4 40 hl add 30 ppm',
    '12% vol kmbs T4 40 hl add 30 ppm',
    'kmbs solution 12% T4 40 hl add 30 ppm',
  ],
  ['10% SO2 40 hl add 25 ppm', 'SO2 water 10% 40 hl add 25 ppm', '10% kmbs solution 40 hl add 25 ppm'],
];

function examplesIn(text: string): string[] {
  return text.split('\n').flatMap((line) => {
    const [, ...rest] = line.split(BEFORE);
    return rest.flatMap((part) =>
      part
        .replace(/\. (\?|No dose|Send).*$/, '')
        .split(/,? or: |, (?=\d+ gal)|, (?=0\.6 mol|add 25|SO2 water)/)
        .map((one) => one.replace(/[.?]$/, '').trim()),
    );
  });
}

/** Plays messages, and then each example in a talk of its own. */
async function sendEach(
  messages: readonly string[],
): Promise<{ readonly example: string; readonly handled: Handled }[]> {
  const talkAfter = async (): Promise<{ talk: Talk; said: string }> => {
    const talk = startTalk();
    let said = '';
    for (const one of messages)
      said = textOf(one.startsWith('press ') ? await talk.press(one.slice(6)) : await talk.write(one));
    return { talk, said };
  };
  const sent: { example: string; handled: Handled }[] = [];
  for (const example of examplesIn((await talkAfter()).said)) {
    // Where the figure is the person's own to say, they say one.
    const { talk } = await talkAfter();
    const text = example.replace('add …', 'add 30').replace('… L', '900 L');
    sent.push({ example, handled: await talk.write(text) });
  }
  return sent;
}

describe('every example that a reply suggests works when it is sent as it stands', () => {
  test.each(SCENES.map(([key, ...messages]) => ({ key, messages })))(
    '$key: $messages',
    async ({ messages }) => {
      const sent = await sendEach(messages);
      expect(sent.length).toBeGreaterThan(0);
      for (const { example, handled } of sent) {
        const { understood, answers } = handled;
        const [reading] = understood?.readings ?? [];
        expect([example, reading?.problems]).toEqual([example, []]);
        const isUsed =
          (answers?.[0] ?? undefined) !== undefined ||
          reading?.intent === 'added' ||
          (reading?.asks.length ?? 9) < 3;
        expect([example, isUsed, reading?.intent !== 'chat']).toEqual([example, true, true]);
      }
    },
  );

  test('no sentence with an example is missing here', () => {
    const english = readFileSync('locales/en.ftl', 'utf8');
    const holders = [...localeMessages(english).keys()].filter((key) => {
      const from = english.indexOf(`\n${key} =`) + 1;
      const entry = english.slice(from).split(/\n(?=[a-zA-Z#])/)[0] ?? '';
      return BEFORE.test(`${entry} `) && NONE[key] === undefined;
    });
    const shown = new Set(SCENES.map(([key]) => key));
    expect(holders.filter((key) => !shown.has(key))).toEqual([]);
    expect(holders.length).toBeGreaterThan(10);
  });
});

test.each(WHOLE_LINES)('%s: the figure written plainly in the whole line', async (message, ...whole) => {
  const talk = startTalk();
  expect(textOf(await talk.write(message))).toContain('Send the whole line again.');
  for (const one of whole) {
    const { understood } = await startTalk().write(one);
    expect([one, understood?.readings[0]?.problems]).toEqual([one, []]);
  }
});
