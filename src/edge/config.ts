import { z } from 'zod';

import type { Environment } from './environment.ts';
import { LOG_LEVELS, type LogLevel } from './logging.ts';
import { OperatorError } from './operator-error.ts';

/** What the program is told from outside. */
export interface Config {
  /** Absent: the terminal chat. */
  readonly botToken?: string;
  /** Where the Bot API is, without a slash at the end. */
  readonly botApiRoot: string;
  readonly logLevel: LogLevel;
  /** Variables that are set and right, but that this version does nothing with. */
  readonly notServedYet: readonly string[];
}

const NOT_SERVED_YET = ['DATA_FILE', 'WEBHOOK_URL', 'WEBHOOK_SECRET', 'PORT'] as const;

const url = (protocols: RegExp, sentence: string): z.ZodString =>
  z.string().refine((text) => URL.canParse(text) && protocols.test(new URL(text).protocol), sentence);

/** One sentence a variable; it never repeats the value, which may be a secret that went into the wrong line. */
const VARIABLES = z.object({
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
  ).default('https://api.telegram.org'),
  LOG_LEVEL: z
    .enum(LOG_LEVELS, `LOG_LEVEL is not a level: it must be one of ${LOG_LEVELS.join(', ')}, or be left out.`)
    .default('info'),
  DATA_FILE: z.string().optional(),
  WEBHOOK_URL: url(/^https:$/, 'WEBHOOK_URL is not an address: it must begin with https://.').optional(),
  WEBHOOK_SECRET: z
    .string()
    .regex(/^[\w-]{1,256}$/, 'WEBHOOK_SECRET must be 1 to 256 letters, digits, _ or -.')
    .optional(),
  PORT: z
    .string()
    .refine(
      (text) => /^\d{1,5}$/.test(text) && Number(text) <= 65_535,
      'PORT must be a number from 0 to 65535.',
    )
    .optional(),
});

/**
 * Reads the configuration from the environment. Blanks around a value are dropped, and an
 * empty one counts as not set.
 *
 * @throws OperatorError with one sentence for each variable that is wrong.
 */
export function readConfig(environment: Environment): Config {
  const trimmed = Object.entries(environment).map(([name, value]) => [name, value?.trim()] as const);
  const filled = Object.fromEntries(trimmed.filter(([, value]) => value));
  const read = VARIABLES.safeParse(filled);
  if (!read.success) throw new OperatorError(read.error.issues.map((issue) => issue.message).join('\n'));
  const { BOT_TOKEN, BOT_API_ROOT, LOG_LEVEL } = read.data;
  return {
    ...(BOT_TOKEN === undefined ? {} : { botToken: BOT_TOKEN }),
    botApiRoot: BOT_API_ROOT.replace(/\/+$/, ''),
    logLevel: LOG_LEVEL,
    notServedYet: NOT_SERVED_YET.filter((name) => read.data[name] !== undefined),
  };
}
