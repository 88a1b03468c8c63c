import { randomUUID } from 'node:crypto';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { makeSay } from '../../chat/replies/say.ts';
import { systemClock } from '../clock.ts';
import type { Ground } from '../ground.ts';
import { loadLocales } from '../locales.ts';
import { startTerminal } from '../terminal/start-terminal.ts';
import { terminalSettings } from '../terminal/terminal-settings.ts';
import { openDemo } from './open-demo.ts';

const WELCOME = ['demo-start', 'demo-start-sheets', 'demo-start-reading', 'demo-start-end'] as const;

/**
 * Serves a chat in the terminal with the invented cellar. It is in memory alone, and what is exported goes into a folder
 * of its own that is made then: nothing of it comes near a real cellar.
 */
export async function startDemo(ground: Pick<Ground, 'environment' | 'operator' | 'signal'>): Promise<void> {
  const { now } = systemClock;
  const store = await openDemo({ say: makeSay(loadLocales()), settings: terminalSettings(), now });
  const dataFile = join(tmpdir(), `brimnote-demo-${randomUUID()}`, 'cellar.db');
  await startTerminal({ ...ground, store, dataFile, isFile: false, welcome: WELCOME });
}
