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
  /** Where the server of health and figures listens, and of the webhook; absent: there is none. */
  readonly port?: number;
  /**
   * The people who may begin cellars, by the numbers that the platform has for them; others need an invitation. Absent:
   * everybody may, as a stranger's private chat is a cellar of its own and sees nothing of any other.
   */
  readonly allow?: readonly number[];
  /** Where the platform brings updates to; absent: they are polled. */
  readonly webhook?: { readonly url: string; readonly secret?: string };
}

const NAMES = [
  'BOT_TOKEN',
  'BOT_API_ROOT',
  'LOG_LEVEL',
  'DATA_FILE',
  'WEBHOOK_URL',
  'WEBHOOK_SECRET',
  'PORT',
  'ALLOW',
] as const;
/** Where a webhook is served unless it is said. */
const USUAL_PORT = 8080;

const USUAL: Config = {
  botApiRoot: 'https://api.telegram.org',
  logLevel: 'info',
  dataFile: 'data/cellar.db',
};

/**
 * Reads the configuration from the environment. Blanks around a value are dropped, and an empty one counts as not
 * set.
 *
 * @throws OperatorError with one sentence for each variable that is wrong.
 */
export async function readConfig(environment: Environment): Promise<Config> {
  const set = NAMES.map((name) => [name, environment[name]?.trim() ?? ''] as const).filter(
    ([, value]) => value !== '',
  );
  // Nobody who only wants the terminal chat waits for the checks to load.
  if (set.length === 0) return USUAL;
  const { VARIABLES } = await import('./variables.ts');
  const read = VARIABLES.safeParse(Object.fromEntries(set));
  if (!read.success) throw new OperatorError(read.error.issues.map((issue) => issue.message).join('\n'));
  const { BOT_TOKEN, BOT_API_ROOT = USUAL.botApiRoot, WEBHOOK_URL, WEBHOOK_SECRET, ALLOW } = read.data;
  const { LOG_LEVEL = USUAL.logLevel, DATA_FILE = USUAL.dataFile } = read.data;
  const port = read.data.PORT ?? (WEBHOOK_URL === undefined ? undefined : USUAL_PORT);
  return {
    ...(BOT_TOKEN !== undefined && { botToken: BOT_TOKEN }),
    botApiRoot: BOT_API_ROOT.replace(/\/+$/, ''),
    logLevel: LOG_LEVEL,
    dataFile: DATA_FILE,
    ...(port !== undefined && { port: Number(port) }),
    ...(ALLOW !== undefined && ALLOW !== 'open' && { allow: ALLOW === 'invited' ? [] : idsIn(ALLOW) }),
    ...(WEBHOOK_URL !== undefined && {
      webhook: { url: WEBHOOK_URL, ...(WEBHOOK_SECRET !== undefined && { secret: WEBHOOK_SECRET }) },
    }),
  };
}

const idsIn = (text: string): number[] => text.split(',').map(Number);
