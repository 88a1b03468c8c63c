/**
 * The bot as a process of its own, without the platform's limits unless LIMITS is set, so that a run is short:
 * `node bot-child.ts ROOT FILE [PORT]`. With a port it is brought its updates, else it polls. Its log goes to stdout.
 */
import { enableCompileCache } from 'node:module';

// As the program does.
enableCompileCache();
const { resolveOwnFiles } = await import('../../../src/edge/resolve-own-files.ts');
resolveOwnFiles();

await import('./serve-child.ts');
