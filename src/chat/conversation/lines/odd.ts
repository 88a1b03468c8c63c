import type { Addition } from '../../../core/cellar/entry.ts';
import { DAY_ms } from '../../../core/time/durations.ts';
import { momentText } from '../../replies/moment-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import { perLitre } from '../manner.ts';
import type { Note } from '../note.ts';
import type { Turn } from '../outcome.ts';
import { tellingOf } from '../telling.ts';
import { line } from './line.ts';

/** So many times the plan is is asked about: a slip of a digit (own threshold). */
const MUCH_MORE = 2;

/** A single addition above this is worth a word, mg/L of SO2 (own threshold). */
const LARGE_mg_L = 150;

/** What is odd about an addition that was told: it is noted all the same, for it is a fact. */
export function oddLines(
  { happening, at }: Note & { readonly happening: Addition },
  { here, manner }: Pick<Turn, 'here' | 'manner'>,
): Line[] {
  const { vessels, added_mg_L, planned_mg_L, mass_g } = happening;
  const [name] = vessels;
  const vessel = name === undefined ? undefined : here.vessels.get(name);
  const plan = name === undefined ? undefined : here.plans.get(name);
  const lines: Line[] = [];
  const shown = { vessel: name === undefined ? '' : vesselName(name) };
  const planned_g = plan?.additive === happening.additive ? plan?.mass_g : undefined;
  if (planned_g !== undefined && mass_g !== undefined && mass_g > MUCH_MORE * planned_g)
    lines.push(
      line('first', 'odd-more-than-planned', { ...shown, factor: String(Math.round(mass_g / planned_g)) }),
    );
  else if (planned_mg_L !== undefined && added_mg_L !== undefined && added_mg_L > MUCH_MORE * planned_mg_L)
    lines.push(
      line('first', 'odd-more-than-planned', {
        ...shown,
        factor: String(Math.round(added_mg_L / planned_mg_L)),
      }),
    );
  else if (added_mg_L !== undefined && added_mg_L > LARGE_mg_L)
    lines.push(line('first', 'odd-large', { ...shown, added: perLitre(added_mg_L, manner) }));
  const before = vessel?.additions.findLast((one) => Math.abs(at - one.at) < DAY_ms);
  if (before)
    lines.push(
      line('first', 'odd-second', {
        ...shown,
        when: momentText(before.at, tellingOf(here)),
        entry: String(before.entry),
      }),
    );
  if (vessel?.empty !== undefined)
    lines.push(line('first', 'odd-empty', { ...shown, when: momentText(vessel.empty, tellingOf(here)) }));
  return lines;
}
