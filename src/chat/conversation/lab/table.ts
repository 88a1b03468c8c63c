import { COMPARED_ALCOHOL_PERCENT, pKOf } from '../../../core/chemistry/dissociation.ts';
import { freeTable } from '../../../core/laboratory/free-table.ts';
import type { Command } from '../../reader/command.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText } from '../../replies/quantity-text.ts';
import type { Here } from '../here.ts';
import { line } from '../lines/line.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';

/** pH from and to where none is said (own choice). */
const USUAL_PH = { from: 3, to: 4 } as const;

/** °C at which the table of the OIV begins: a table for no wine is made there. */
const COMPARED_C = 20;

/** `table 0.5 0.8 pH 3.2-3.8`: the free SO2 that molecular targets need over the pH, with the basis. */
export function tellTable(command: Extract<Command, { name: 'table' }>, here: Here): Handled {
  const { settings, memory } = here;
  const { red, white, sweet } = settings.targets;
  const mark = memory.decimalMark ?? '.';
  const unit = memory.concentrationUnit === 'ppm' ? 'ppm' : 'mg/L';
  const asked = command.molecular_mg_L.length > 0 ? command.molecular_mg_L : [red, white, sweet];
  const molecular_mg_L = [...new Set(asked)].toSorted((a, b) => a - b);
  const { pK, basis } = pKOf(settings.basis, COMPARED_ALCOHOL_PERCENT, COMPARED_C);
  const { ph_from = USUAL_PH.from, ph_to = Math.max(ph_from, USUAL_PH.to) } = command;
  const rows = freeTable({ molecular_mg_L, ph_from, ph_to, pK });
  const said = replying(here, {
    lines: [
      line('first', 'table-head', {
        targets: molecular_mg_L.map((one) => numberText(one, 2, mark)).join(' · '),
        unit,
        basis,
        pK: numberText(pK, 3, mark),
      }),
      ...rows.map(({ ph, free_mg_L }) =>
        line('first', 'table-row', {
          ph: numberText(ph, 2, mark, 1),
          free: free_mg_L.map((one) => concentrationText(one, mark)).join(' · '),
        }),
      ),
      line('effect', 'table-care'),
    ],
  });
  return { ...said, answers: [{ table: rows, steps: [] }] };
}
