import type { Command } from '../../command.ts';
import type { Talk } from '../talk.ts';
import { says, saysOnly } from '../talk.ts';
import { set } from './set.ts';

/** Reads `we work in gallons`, `units metric`, `imperial gallons`. */
export function readUnits(talk: Talk): Command | undefined {
  if (
    !saysOnly(talk, [
      'work-in',
      'units',
      'metric',
      'litres',
      'us',
      'imperial',
      'gallons',
      'is',
      'to',
      'default',
    ])
  )
    return undefined;
  const isMetric = says(talk, 'metric', 'litres');
  const isImperial = says(talk, 'imperial');
  const isUS = says(talk, 'us') || (says(talk, 'gallons') && !isImperial);
  if ([isMetric, isImperial, isUS].filter(Boolean).length !== 1) return undefined;
  // `gallons`, `litres` alone may be the rest of anything.
  const isNamed = says(talk, 'work-in', 'units', 'metric', 'us', 'imperial');
  if (!isNamed) return undefined;
  return set({ of: 'units', units: isMetric ? 'metric' : isUS ? 'us' : 'imperial' });
}
