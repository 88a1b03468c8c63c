import { vesselName } from '../../replies/vessel-name.ts';
import type { Here } from '../here.ts';
import { line } from '../lines/line.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';

/** What a wine's own ways cannot be told without. */
export type Lack = 'vessel' | 'ph' | 'free' | 'total' | 'target';

/** What is missing before anything can be told of a vessel, and the message that gives it. */
export function lacking(what: Lack, name: string | undefined, here: Here): Handled {
  const vessel = name === undefined ? 'none' : vesselName(name);
  const lines = [
    what === 'vessel'
      ? line('first', 'vessel-unknown', { vessel })
      : line('first', 'lab-lacks', { vessel, what }),
  ];
  return replying(here, { lines });
}

/** An addition went in that no reading has shown yet: what is on file is no more how the wine is. */
export function unlanded(name: string, here: Here): Handled {
  return replying(here, { lines: [line('first', 'forecast-unlanded', { vessel: vesselName(name) })] });
}
