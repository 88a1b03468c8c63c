import { rmSync } from 'node:fs';
import { handle } from '../../../src/chat/conversation/conversation.ts';
import type { Content, IncomingMessage } from '../../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import type { Said } from '../../../src/chat/replies/say.ts';
import type { CellarStore, CellarView } from '../../../src/core/cellar/cellar-store.ts';
import { makeServe, type Serve } from '../../../src/edge/serve-message.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { openSqliteStore } from '../../../src/edge/store/sqlite/open-sqlite-store.ts';
import { say } from '../../fuzz/say.ts';

/** Who writes, and where. */
export interface Place {
  readonly person: string;
  readonly chat: string;
}

const CELLAR = 'cellar';
const settings = { ...DEFAULT_SETTINGS, zone: 'UTC' };

/** The program without a platform: all that a person can reach it by, and a store that outlives it. */
export class Bot {
  readonly #file: string | undefined;
  #store: CellarStore | undefined;
  #serve: Serve | undefined;
  #count = 0;
  /** Its clock, in milliseconds since 1970. */
  now = Date.UTC(2026, 9, 5, 6, 0, 13);
  readonly faults: unknown[] = [];

  /** @param file where the cellar is kept; in memory where there is none */
  constructor(file?: string) {
    this.#file = file;
  }

  async store(): Promise<CellarStore> {
    const now = (): number => this.now;
    const report = (damage: Error): void => void this.faults.push(damage);
    this.#store ??=
      this.#file === undefined
        ? createMemoryCellars({ now })
        : await openSqliteStore(this.#file, { now, report });
    return this.#store;
  }

  /** Ends the program and begins it anew: only what is in the store is left. */
  async restart(): Promise<void> {
    this.#serve = undefined;
    if (this.#file === undefined) return;
    await this.#store?.close();
    this.#store = undefined;
  }

  /** Sends something, under an id of its own. */
  async send(
    { person, chat }: Place,
    content: Content,
  ): Promise<{ message: IncomingMessage; said: readonly Said[] }> {
    this.#count += 1;
    const who = { cellar: CELLAR, chat, person, name: person, trusted: true } as const;
    const message: IncomingMessage = {
      ...who,
      id: String(this.#count),
      at: this.now,
      language: 'en',
      content,
    };
    return { message, said: await this.deliver(message) };
  }

  /** Delivers a message, perhaps not for the first time. */
  async deliver(message: IncomingMessage): Promise<readonly Said[]> {
    const report = (fault: unknown): void => void this.faults.push(fault);
    this.#serve ??= makeServe({ handle, say, store: await this.store(), settings, report });
    return (await this.#serve(message)).said;
  }

  async look<T>(work: (view: CellarView) => Promise<T>): Promise<T> {
    return (await this.store()).look(CELLAR, work);
  }

  async rebuild(): Promise<readonly string[]> {
    return (await (await this.store()).rebuild(CELLAR)).differed;
  }

  async end(): Promise<void> {
    await (await this.store()).close();
    if (this.#file === undefined) return;
    for (const ending of ['', '-wal', '-shm']) rmSync(`${this.#file}${ending}`, { force: true });
  }
}

/** The text of what was said, its buttons left out. */
export function textOf(said: readonly Said[]): string {
  return said
    .map(({ text }) => text)
    .join('\n')
    .replaceAll('\u202f', ' ');
}

/** The keys of all buttons under what was said. */
export function keysOf(said: readonly Said[]): string[] {
  return said.flatMap(({ buttons }) => buttons.map(({ key }) => key));
}
