import type { CellarView } from '../../core/cellar/cellar-store.ts';
import type { Reading } from '../reader/understood.ts';
import type { Here } from './here.ts';
import { redToldKey } from './keys.ts';

/** Whether it was told of a vessel that acidified methods read high in reds: it is told once. */
export async function withRedTold(here: Here, { fields }: Reading, view: CellarView): Promise<Here> {
  if (fields.vessel === undefined) return here;
  return { ...here, isRedTold: (await view.kept(redToldKey(fields.vessel))) !== undefined };
}
