import type { ProblemCode } from '../../../core/problem.ts';
import type { Board, Finding } from '../board.ts';
import { findingOf, placeOf } from '../board.ts';
import type { FieldName } from '../understood.ts';

const drop = (board: Board, fields: readonly FieldName[]): void => {
  const kept = board.findings.filter(({ field }) => !fields.includes(field));
  board.findings.splice(0, board.findings.length, ...kept);
};

const key = (finding: Finding): string => JSON.stringify(finding.value);

/** The same field twice with different values: named both times it is a conflict, bare it is unclear. */
function settleTwice(board: Board): void {
  const byField = new Map<FieldName, Finding[]>();
  for (const finding of board.findings) {
    const same = byField.get(finding.field);
    if (same) same.push(finding);
    else byField.set(finding.field, [finding]);
  }
  for (const [field, findings] of byField) {
    if (findings.length < 2 || new Set(findings.map(key)).size === 1 || field === 'stage') continue;
    const code: ProblemCode = findings.some(({ said }) => said === 'bare')
      ? 'ambiguous-number'
      : 'conflicting-values';
    board.problems.push({
      code,
      about: findings.map(({ from, to }) => placeOf(board, from, to).text).join(' / '),
    });
    drop(board, [field]);
  }
}

/** A total below the free SO2 cannot be. */
function settleTotal(board: Board): void {
  const [free, total] = [findingOf(board, 'free_mg_L'), findingOf(board, 'total_mg_L')];
  if (!free || !total || total.value >= free.value) return;
  board.problems.push({
    code: 'total-below-free',
    about: `${placeOf(board, free.from, free.to).text} / ${placeOf(board, total.from, total.to).text}`,
  });
  drop(board, ['free_mg_L', 'total_mg_L']);
}

/** Two vessels in one message are no one reading. */
function settleVessels(board: Board): void {
  const [one, many] = [findingOf(board, 'vessel'), findingOf(board, 'vessels')];
  if (!one || !many) return;
  const [from, to] = [Math.min(one.from, many.from), Math.max(one.to, many.to)];
  board.problems.push({ code: 'conflicting-values', about: placeOf(board, from, to).text });
  drop(board, ['vessel', 'vessels']);
}

/** An allowance and a share that binds are two ways to say one thing: which of them holds? */
function settleBinding(board: Board): void {
  const [allowance, share] = [
    findingOf(board, 'binding_allowance_percent'),
    findingOf(board, 'binding_share'),
  ];
  if (!allowance || !share) return;
  board.problems.push({
    code: 'conflicting-values',
    about: `${placeOf(board, allowance.from, allowance.to).text} / ${placeOf(board, share.from, share.to).text}`,
  });
  drop(board, ['binding_allowance_percent', 'binding_share']);
}

/** Settles findings that contradict each other: as problems, never by choosing. */
export function settleConflicts(board: Board): void {
  settleTwice(board);
  settleTotal(board);
  settleVessels(board);
  settleBinding(board);
}
