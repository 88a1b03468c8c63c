/** A process that opens a cellar file for writing and holds it, or says on stdout why it cannot. */
import { writeSync } from 'node:fs';
import { open } from './open.ts';

const STDOUT = 1;
try {
  await open(process.argv[2] ?? '');
  writeSync(STDOUT, 'held\n');
  setInterval(() => undefined, 1000);
} catch (error) {
  writeSync(STDOUT, `${String(error)}\n`);
}
