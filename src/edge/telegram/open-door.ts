import type { CellarStore } from '../../core/cellar/cellar-store.ts';
import type { Clock } from '../clock.ts';
import { NO_METER, type Meter } from '../http/meter.ts';
import type { Log } from '../logging.ts';
import { OperatorError } from '../operator-error.ts';
import type { BackOff } from './back-off.ts';
import type { Mail } from './join-mail.ts';
import { makeFindTroubles } from './find-troubles.ts';
import type { Platform } from './platform.ts';
import { createWebhook, type WebhookAddress } from './serve-webhook.ts';

/** Where others reach us. */
export interface DoorAddress {
  /** 0 takes any that is free. */
  readonly port: number;
  readonly webhook?: WebhookAddress;
  /** Told where it is once it is open. */
  readonly onOpen?: (port: number) => void;
}

/** What opening needs. */
export interface DoorOptions {
  readonly door?: DoorAddress;
  readonly platform: Platform;
  readonly store: Pick<CellarStore, 'nextDue'>;
  readonly clock: Clock;
  readonly log: Log;
}

/** A way in for whoever runs the program, and for the platform where it brings updates by itself. */
export interface Door {
  readonly meter: Meter;
  /** Says what comes in here, and what is counted. */
  readonly watch: (mail: Mail) => void;
  /** With a webhook: takes what the platform brings, until the signal is aborted. */
  readonly takeUpdates?: (options: {
    readonly backOff: BackOff;
    readonly signal: AbortSignal;
  }) => Promise<void>;
  readonly close: () => Promise<void>;
}

/** An update is some kilobytes; files come by another way. */
const LONGEST_BODY_BYTES = 1_000_000;

/** No door: nobody asks, and updates are polled. */
const WALL: Door = { meter: NO_METER, watch: () => undefined, close: async () => undefined };

/**
 * Opens the door.
 *
 * @throws OperatorError where the port cannot be had
 */
export async function openDoor({ door, platform, store, clock, log }: DoorOptions): Promise<Door> {
  if (door === undefined) return WALL;
  // Loaded only where somebody asks.
  const { createMeter } = await import('../http/create-meter.ts');
  const { healthRoutes } = await import('../http/health-routes.ts');
  const { serveHttp } = await import('../http/serve-http.ts');
  const { meter, watch, page } = createMeter();
  let mail: Mail | undefined;
  let taking = false;
  const isOpen = (): boolean => taking && mail?.isFull() === false;
  const receive: Mail['inbox']['receive'] = async (updates) => mail?.inbox.receive(updates);
  const webhook = door.webhook && createWebhook(door.webhook, { receive, isOpen, log });
  const troubles = makeFindTroubles({ store, platform, clock });
  const server = await serveHttp({
    port: door.port,
    routes: { ...webhook?.routes, ...healthRoutes({ troubles, metrics: page }) },
    longestBody_bytes: LONGEST_BODY_BYTES,
    log,
  }).catch((cause: NodeJS.ErrnoException) => {
    throw new OperatorError(`PORT ${door.port} cannot be had (${cause.code}): name another one.`, { cause });
  });
  door.onOpen?.(server.port);
  return {
    meter,
    watch: (watched) => {
      mail = watched;
      watch({ inbox: watched.inbox.depth, outbox: watched.outbox.depth, now: clock.now });
    },
    ...(webhook !== undefined && {
      takeUpdates: async ({ backOff, signal }) => {
        taking = true;
        await webhook.register(platform, { backOff, signal });
        await aborted(signal);
        taking = false;
      },
    }),
    close: server.close,
  };
}

const aborted = (signal: AbortSignal): Promise<void> =>
  new Promise((resolve) => {
    if (signal.aborted) resolve();
    else signal.addEventListener('abort', () => resolve(), { once: true });
  });
