import { GrammyError, HttpError } from 'grammy';

/** How a call to the platform failed. */
export type Failure =
  /** The platform said no. */
  | {
      readonly kind: 'refused';
      readonly code: number;
      readonly reason: string;
      readonly retryAfter_s?: number;
      /** The name that a group has got since. */
      readonly movedTo?: number;
    }
  /** The platform was not reached, or its answer did not arrive. */
  | { readonly kind: 'unreached'; readonly reason: string }
  /** Our own fault. */
  | { readonly kind: 'fault'; readonly reason: string };

/** Sorts what a call threw. The reason is for the log: it holds no person's words, but it may hold a secret. */
export function failureOf(error: unknown): Failure {
  if (error instanceof GrammyError) {
    const { error_code: code, description: reason, parameters } = error;
    const { retry_after: retryAfter_s, migrate_to_chat_id: movedTo } = parameters;
    return {
      kind: 'refused',
      code,
      reason,
      ...(retryAfter_s !== undefined && { retryAfter_s }),
      ...(movedTo !== undefined && { movedTo }),
    };
  }
  if (error instanceof HttpError) return { kind: 'unreached', reason: reasonOf(error.error) };
  return { kind: 'fault', reason: reasonOf(error) };
}

/** Whether the platform refused to be polled because a webhook is set. */
export const isAboutWebhook = (failure: Failure): boolean =>
  failure.kind === 'refused' && failure.code === 409 && /webhook/i.test(failure.reason);

const reasonOf = (error: unknown): string => {
  if (!(error instanceof Error)) return String(error);
  const { code } = error as NodeJS.ErrnoException;
  const words = error.message === '' ? error.name : error.message;
  return code === undefined || words.includes(code) ? words : `${code}: ${words}`;
};
