import { systemClock } from '../clock.ts';
import type { Operator } from '../operator.ts';
import type { StartOptions } from '../start-options.ts';

/** Where the cellar is, and who is told of damage. */
export interface UpkeepGround {
  readonly dataFile: string;
  readonly operator: Operator;
}

/** Sees to the cellar's file, gives what to tell of it, and ends. */
export async function runUpkeep(
  options: Exclude<StartOptions, { does: 'serve' | 'demo' }>,
  { dataFile, operator }: UpkeepGround,
): Promise<string> {
  const { now } = systemClock;
  if (options.does === 'restore') {
    const { restoreData } = await import('./restore-data.ts');
    return restoreData({ copy: options.copy, dataFile, now: now() });
  }
  if (options.does === 'backup') {
    const { backupData } = await import('./backup-data.ts');
    return backupData(dataFile, now());
  }
  const { rebuildData } = await import('./rebuild-data.ts');
  return rebuildData(dataFile, { now, report: (damage) => operator.tell(damage.message) });
}
