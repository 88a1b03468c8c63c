import type { HttpHandler } from './serve-http.ts';

/** What the pages for whoever runs the program are made of. */
export interface HealthOptions {
  /** What is not as it should be, by name; none where all is well. */
  readonly troubles: () => Promise<readonly string[]>;
  readonly metrics: () => Promise<{ readonly type: string; readonly body: string }>;
}

/** Whether the program is alive, whether it can do its work, and its figures. */
export function healthRoutes({ troubles, metrics }: HealthOptions): Readonly<Record<string, HttpHandler>> {
  return {
    'GET /healthz': async () => ({ status: 200, body: 'alive\n' }),
    'GET /readyz': async () => {
      const found = await troubles();
      if (found.length === 0) return { status: 200, body: 'ready\n' };
      return { status: 503, body: `not ready: ${found.join(', ')}\n` };
    },
    'GET /metrics': async () => ({ status: 200, ...(await metrics()) }),
  };
}
