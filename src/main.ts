import { enableCompileCache } from 'node:module';

// What was compiled is kept between runs, which halves the time to the first answer. So nothing is imported before.
enableCompileCache();
const { resolveOwnFiles } = await import('./edge/resolve-own-files.ts');
resolveOwnFiles();

const { start } = await import('./edge/start.ts');
await start(process.argv.slice(2));
