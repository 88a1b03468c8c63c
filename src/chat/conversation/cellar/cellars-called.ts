import type { CellarPlace } from '../ports.ts';
import { fold } from './fold-name.ts';

/** The cellars that go by a name, or by that of their keeper. */
export function cellarsCalled(said: string, cellars: readonly CellarPlace[]): readonly CellarPlace[] {
  return cellars.filter(({ name, keeper }) =>
    [name, keeper].some((one) => one !== undefined && fold(one) === fold(said)),
  );
}
