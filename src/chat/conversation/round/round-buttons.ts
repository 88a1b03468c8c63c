import type { RoundRow, RoundSheet } from '../../attachments/round/round-sheet.ts';
import { measureText } from '../../replies/quantity-text.ts';
import type { DecimalMark } from '../../replies/number-text.ts';
import type { Button } from '../../replies/reply.ts';
import type { Here } from '../here.ts';

/** So few amounts have a button each under their round; of more there is a list, some at a time. */
const FEW = 4;

/** Two amounts need no sheet. */
const WORTH_A_SHEET = 3;

/** What somebody may do with a round: note all of it, note it line by line, take the sheet. */
export function roundButtons({ ref, rows, mark }: RoundSheet, { role }: Here): Omit<Button, 'mark'>[] {
  const amounts = rows.filter(({ is }) => is === 'amount');
  const noted = role === 'guest' ? [] : amounts.filter(({ mayBeNoted }) => mayBeNoted);
  const [only, another] = noted;
  const all = another === undefined ? [] : [plain(`ra:${ref}`, 'button-round-all')];
  const each =
    noted.length <= FEW
      ? noted.map((row) => rowButton(row, mark))
      : [plain(`rl:${ref}:0`, 'button-round-lines')];
  const sheet =
    amounts.length < WORTH_A_SHEET
      ? []
      : [plain(`rp:${ref}`, 'button-round-picture'), plain(`rx:${ref}`, 'button-round-file')];
  return only === undefined ? sheet : [...all, ...each, ...sheet];
}

const plain = (key: string, label: Button['label']): Omit<Button, 'mark'> => ({ key, label, values: {} });

/** The button that notes one line: its vessel and what is measured for it. */
export function rowButton({ ref, name, weighed }: RoundRow, mark: DecimalMark): Omit<Button, 'mark'> {
  const [first] = weighed;
  const amount = first === undefined ? '' : measureText(first.measure, mark);
  const unit =
    first?.measure.unit === 'tablets' ? (first.measure.value <= 1 ? 'tablet' : 'tablets') : 'other';
  const count = (first?.count ?? 1) > 1 ? 'several' : 'one';
  return { key: `rt:${ref}`, label: 'button-round-line', values: { vessel: name, amount, unit, count } };
}
