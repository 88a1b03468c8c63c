import { z } from 'zod';

import { LOG_LEVELS } from './log-level.ts';

const url = (protocols: RegExp, sentence: string): z.ZodString =>
  z.string().refine((text) => URL.canParse(text) && protocols.test(new URL(text).protocol), sentence);

/**
 * The variables of the environment, with one sentence for each that is wrong. The sentence never repeats the value,
 * which may be a secret that went into the wrong line.
 */
export const VARIABLES = z.object({
  BOT_TOKEN: z
    .string()
    .regex(
      /^[\w:-]+$/,
      'BOT_TOKEN is not a bot token: copy it whole, digits, a colon, then letters and digits.',
    )
    .optional(),
  BOT_API_ROOT: url(
    /^https?:$/,
    'BOT_API_ROOT is not an address: it must begin with https:// or http://, or be left out.',
  ).optional(),
  LOG_LEVEL: z
    .enum(LOG_LEVELS, `LOG_LEVEL is not a level: it must be one of ${LOG_LEVELS.join(', ')}, or be left out.`)
    .optional(),
  DATA_FILE: z
    .string()
    .regex(/[^/\\]$/, 'DATA_FILE is not a file: it must not end in a slash, or be left out.')
    .optional(),
  WEBHOOK_URL: url(/^https:$/, 'WEBHOOK_URL is not an address: it must begin with https://, or be left out.')
    .refine(
      (text) => !URL.canParse(text) || new URL(text).pathname !== '/',
      'WEBHOOK_URL needs a path of its own: put a word that nobody guesses behind the host.',
    )
    .optional(),
  WEBHOOK_SECRET: z
    .string()
    .regex(/^[\w-]{1,256}$/, 'WEBHOOK_SECRET must be 1 to 256 letters, digits, _ or -, or be left out.')
    .optional(),
  ALLOW: z
    .string()
    .regex(
      /^(open|invited|\s*\d{1,15}\s*(,\s*\d{1,15}\s*)*)$/,
      'ALLOW must be open, invited, or Telegram user ids with commas between, or be left out.',
    )
    .optional(),
  PORT: z
    .string()
    .refine(
      (text) => /^\d{1,5}$/.test(text) && Number(text) <= 65_535,
      'PORT must be a whole number from 0 to 65535, or be left out.',
    )
    .optional(),
});
