import type { Environment } from './environment.ts';
import type { LogLevel } from './log-level.ts';
import { OperatorError } from './operator-error.ts';

/** What the program is told from outside. */
export interface Config {
  /** Absent: the terminal chat. */
  readonly botToken?: string;
  /** Where the Bot API is, without a slash at the end. */
  readonly botApiRoot: string;
  readonly logLevel: LogLevel;
  /** The cellar's file. */
  readonly dataFile: string;
  /** Variables that are set and right, but that this version does nothing with. */
  readonly notServedYet: readonly string[];
}

const SERVED = ['BOT_TOKEN', 'BOT_API_ROOT', 'LOG_LEVEL', 'DATA_FILE'] as const;
const NOT_SERVED_YET = ['WEBHOOK_URL', 'WEBHOOK_SECRET', 'PORT'] as const;

const USUAL: Config = {
  botApiRoot: 'https://api.telegram.org',
  logLevel: 'info',
  dataFile: 'data/cellar.db',
  notServedYet: [],
};

/**
 * Reads the configuration from the environment. Blanks around a value are dropped, and an empty one counts as not
 * set.
 *
 * @throws OperatorError with one sentence for each variable that is wrong.
 */
export async function readConfig(environment: Environment): Promise<Config> {
  const set = [...SERVED, ...NOT_SERVED_YET]
    .map((name) => [name, environment[name]?.trim() ?? ''] as const)
    .filter(([, value]) => value !== '');
  // Nobody who only wants the terminal chat waits for the checks to load.
  if (set.length === 0) return USUAL;
  const { VARIABLES } = await import('./variables.ts');
  const read = VARIABLES.safeParse(Object.fromEntries(set));
  if (!read.success) throw new OperatorError(read.error.issues.map((issue) => issue.message).join('\n'));
  const { BOT_TOKEN, BOT_API_ROOT = USUAL.botApiRoot } = read.data;
  const { LOG_LEVEL = USUAL.logLevel, DATA_FILE = USUAL.dataFile } = read.data;
  return {
    ...(BOT_TOKEN === undefined ? {} : { botToken: BOT_TOKEN }),
    botApiRoot: BOT_API_ROOT.replace(/\/+$/, ''),
    logLevel: LOG_LEVEL,
    dataFile: DATA_FILE,
    notServedYet: NOT_SERVED_YET.filter((name) => read.data[name] !== undefined),
  };
}
