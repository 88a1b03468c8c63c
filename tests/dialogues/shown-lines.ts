import type { Said } from '../../src/chat/replies/say.ts';

/** Something that is said unasked, and in which chat. */
export interface SaidUnasked {
  readonly chat: string;
  readonly said: Said;
}

/** What is said unasked, line by line. */
export function unaskedLines(sent: readonly SaidUnasked[], present: string): string[] {
  let chat = present;
  return sent.flatMap((one) => {
    const head = one.chat === chat ? [] : [`(${one.chat})`];
    ({ chat } = one);
    return [...head, ...linesOf(one.said)];
  });
}

/** The codes of a scene: the cellar, and the place of the message in the scene. */
export const CODE = /\w+-\d{24}/;

/** An answer as a scene has it, line by line. */
export function linesOf({ text: said, buttons, replaces }: Said): string[] {
  const text = said.replace(CODE, '(code)');
  const row = buttons.map(({ mark, label }) => `${mark} ${label}`).join(' | ');
  // Thin spaces cannot be told from others in a scene's file.
  return [
    ...(replaces === undefined ? [] : ['(in place)']),
    ...text.replaceAll('\u202f', ' ').split('\n'),
    ...(row === '' ? [] : [`[${row}]`]),
  ];
}

/** Whether an answer is as the scene has it, `…` standing for any lines. */
export function fits(expected: readonly string[], actual: readonly string[]): boolean {
  const [first, ...rest] = expected;
  if (first === undefined) return actual.length === 0;
  if (first !== '…') return actual[0] === first && fits(rest, actual.slice(1));
  return actual.some((_, skipped) => fits(rest, actual.slice(skipped))) || fits(rest, []);
}
