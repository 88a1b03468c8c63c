import type { Environment } from './environment.ts';

const SECRETS = ['BOT_TOKEN', 'WEBHOOK_SECRET'] as const;

/**
 * Takes the secrets out of the environment of the process, and gives back the whole: what Node writes when it crashes, or
 * when it is asked for a report, shows the environment, and a process that is started inherits it.
 */
export function withdrawSecrets(): Environment {
  const environment = { ...process.env };
  for (const name of SECRETS) delete process.env[name];
  process.report.excludeEnv = true;
  return environment;
}
