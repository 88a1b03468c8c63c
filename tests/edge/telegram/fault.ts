import type { Fault } from './fake-bot-api.ts';

/** The platform failed by itself. */
export const SERVER_ERROR: Fault = { error_code: 500, description: 'Internal Server Error' };

/** Not before a second has passed. */
export const SLOW_DOWN: Fault = {
  error_code: 429,
  description: 'Too Many Requests: retry after 1',
  retry_after: 1,
};

/** Somebody else polls. */
export const CONFLICT: Fault = {
  error_code: 409,
  description:
    'Conflict: terminated by other getUpdates request; make sure that only one bot instance is running',
};
