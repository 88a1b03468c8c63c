/** The levels of `LOG_LEVEL`, from talkative to silent. */
export const LOG_LEVELS = ['trace', 'debug', 'info', 'warn', 'error', 'fatal', 'silent'] as const;
/** One of them. */
export type LogLevel = (typeof LOG_LEVELS)[number];
