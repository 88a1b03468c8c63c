import { z } from 'zod';
import { LANGUAGES } from '../../chat/reader/words/languages.ts';

/** Names become part of an entry's key, which has a bound; control letters count as they are written there. */
const LONGEST_NAME = 80;

const NAME = z
  .union([z.string(), z.number()])
  .refine((name) => JSON.stringify(String(name)).length <= LONGEST_NAME, 'longer than a name may be');

const INPUT = z
  .object({
    id: NAME.nullish(),
    language: z.enum(LANGUAGES).optional(),
    text: z.string().optional(),
    press: z.string().optional(),
    tick: z.literal(true).optional(),
    chat: NAME.optional(),
    person: NAME.optional(),
    at: z.iso.datetime({ offset: true, local: true }).optional(),
  })
  .refine(
    ({ text, press, tick }) => [text, press, tick].filter((one) => one !== undefined).length === 1,
    'one of text, press and tick must be there',
  )
  .refine(({ tick, at }) => tick === undefined || at !== undefined, 'tick needs at');

/** One line of `--jsonl`. */
export type InputLine = z.infer<typeof INPUT>;

/** A line as the object it should be, or what is wrong with it in a few words. */
export function readInputLine(line: string): InputLine | { readonly error: string } {
  let value: unknown;
  try {
    value = JSON.parse(line);
  } catch {
    return { error: 'not a line of JSON' };
  }
  const read = INPUT.safeParse(value);
  if (read.success) return read.data;
  const [issue] = read.error.issues;
  const where = issue?.path.join('.');
  return { error: `${where ? `${where}: ` : ''}${issue?.message ?? 'not a message'}` };
}
