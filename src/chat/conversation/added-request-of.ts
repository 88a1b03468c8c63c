import { traitsOf } from '../../core/cellar/traits-of.ts';
import type { AddedRequest } from '../../core/dose/request.ts';
import type { Reading } from '../reader/understood.ts';
import type { Here } from './here.ts';
import { toAddedRequest } from './to-requests.ts';
import { totalOfVessel } from './total-of-vessel.ts';

/** The addition that was made with what is known of its vessel before it, so that it is held against the law. */
export function addedRequestOf(reading: Reading, here: Pick<Here, 'vessels' | 'settings'>): AddedRequest {
  const { vessel: name } = reading.fields;
  const vessel = name === undefined ? undefined : here.vessels.get(name);
  const request = toAddedRequest(reading);
  if (vessel === undefined) return request;
  const total = totalOfVessel(vessel);
  return {
    ...traitsOf(vessel),
    ...request,
    region: here.settings.region,
    ...(total && {
      total_mg_L: total.total_mg_L,
      total_from: total.since_mg_L === 0 ? ('measured' as const) : ('running-sum' as const),
    }),
  };
}
