import { collectDefaultMetrics, Counter, Gauge, Histogram, Registry } from 'prom-client';

import type { Depth, Meter } from './meter.ts';

/** What the depths of the queues are asked for. */
export interface MeterOptions {
  readonly inbox: () => Depth;
  readonly outbox: () => Depth;
  readonly now: () => number;
}

const BUCKETS_S = [0.0005, 0.001, 0.0025, 0.005, 0.01, 0.025, 0.05, 0.1, 0.25, 0.5, 1, 2.5];

/**
 * Makes a meter, and the page of it in the text format of Prometheus; names by its conventions (base units, `_total`
 * for what only grows). No metric carries a person's or a chat's name.
 */
export function createMeter(): {
  readonly meter: Meter;
  /** Says where the depths are to be had, once there are queues. */
  readonly watch: (options: MeterOptions) => void;
  readonly page: () => Promise<{ readonly type: string; readonly body: string }>;
} {
  const registry = new Registry();
  const registers = [registry];
  collectDefaultMetrics({ register: registry });
  const counter = (name: string, help: string, labelNames: string[] = []): Counter =>
    new Counter({ name, help, labelNames, registers });
  const received = counter('brimnote_updates_received_total', 'Updates that arrived and were kept.');
  const handled = counter('brimnote_updates_handled_total', 'Updates handled, by what became of them.', [
    'outcome',
  ]);
  const sent = counter('brimnote_messages_sent_total', 'Messages that the platform confirmed.');
  const refused = counter(
    'brimnote_sends_refused_total',
    'Sendings that the platform did not take, by reason.',
    ['reason'],
  );
  const seconds = new Histogram({
    name: 'brimnote_handling_seconds',
    help: 'Time to handle an update, until what it wrote was durable.',
    buckets: BUCKETS_S,
    registers,
  });
  return {
    meter: {
      received: (updates) => received.inc(updates),
      handled: (outcome, took_s) => {
        handled.inc({ outcome });
        seconds.observe(took_s);
      },
      sent: () => sent.inc(),
      refused: (reason) => refused.inc({ reason: reason.replaceAll(' ', '_') }),
    },
    watch: ({ inbox, outbox, now }) => {
      const gauge = (name: string, help: string, read: () => number): void => {
        new Gauge({
          name,
          help,
          registers,
          collect() {
            this.set(read());
          },
        });
      };
      const age_s = ({ oldest_at }: Depth): number =>
        oldest_at === undefined ? 0 : Math.max(0, (now() - oldest_at) / 1000);
      gauge('brimnote_inbox_updates', 'Updates that wait to be handled.', () => inbox().count);
      gauge('brimnote_inbox_oldest_age_seconds', 'Age of the oldest of them.', () => age_s(inbox()));
      gauge('brimnote_outbox_messages', 'Messages that wait to be sent.', () => outbox().count);
      gauge('brimnote_outbox_oldest_age_seconds', 'Age of the oldest of them.', () => age_s(outbox()));
    },
    page: async () => ({ type: registry.contentType, body: await registry.metrics() }),
  };
}
