import type { CellarView } from '../../core/cellar/cellar-store.ts';
import type { Understood } from '../reader/understood.ts';
import type { Here } from './here.ts';

/** The same with what stands in the chemical store. */
export async function withShelves(here: Here, view: CellarView): Promise<Here> {
  return { ...here, shelves: await view.shelves() };
}

/** The same with the chemical store, where something of the message goes into wine or is to be weighed for it. */
export async function withShelvesFor({ readings }: Understood, here: Here, view: CellarView): Promise<Here> {
  return readings.some(({ intent }) => intent === 'added' || intent === 'dose')
    ? withShelves(here, view)
    : here;
}
