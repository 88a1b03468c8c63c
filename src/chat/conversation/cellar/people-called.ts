import type { Person } from '../../../core/cellar/cellar-store.ts';
import { fold } from './fold-name.ts';

/**
 * The people that a name can mean: by their whole name, else by its first word, or by their number.
 */
export function peopleCalled(who: string, people: readonly Person[]): readonly Person[] {
  const said = fold(who);
  const [, number] = /^person (\d{1,6})$/.exec(said) ?? [];
  if (number !== undefined) return people.filter((one) => one.number === Number(number));
  const whole = people.filter(({ name }) => name !== undefined && fold(name) === said);
  if (whole.length > 0) return whole;
  return people.filter(({ name }) => name !== undefined && fold(name).split(' ')[0] === said);
}
