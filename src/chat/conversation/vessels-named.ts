import type { Fields, Understood } from '../reader/understood.ts';

/** The vessels that fields name, one or several. */
export function vesselsIn({ vessel, vessels }: Fields): readonly string[] {
  return vessels ?? (vessel === undefined ? [] : [vessel]);
}

/** All vessels that a message names, also the one that wine goes into. */
export function vesselsNamed({ readings, shared }: Pick<Understood, 'readings' | 'shared'>): string[] {
  const own = readings.flatMap(({ fields, command }) => [
    ...vesselsIn(fields),
    ...(command && 'to' in command ? [command.to] : []),
    ...(command?.name === 'blend' && command.other !== undefined ? [command.other] : []),
  ]);
  return [...vesselsIn(shared), ...own];
}
