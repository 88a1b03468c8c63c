import type { Reading } from '../../reader/understood.ts';
import { momentText } from '../../replies/moment-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import type { Here } from '../here.ts';
import { nameText } from '../people.ts';
import { tellingOf } from '../telling.ts';
import { vesselsIn } from '../vessels-named.ts';
import { line } from './line.ts';

/** Who else is about to dose one of these vessels, and since when. */
export function onItLines({ fields }: Reading, here: Here): Line[] {
  return vesselsIn(fields).flatMap((vessel) => {
    const claim = here.claims.get(vessel);
    if (claim === undefined || claim.by === here.me) return [];
    const values = {
      vessel: vesselName(vessel),
      who: nameText(claim.by, here),
      when: momentText(claim.at, tellingOf(here)),
    };
    return [line('first', 'on-it', values)];
  });
}
