import type { Button, Line } from '../replies/reply.ts';
import type { Here } from './here.ts';
import { keeping } from './next-memory.ts';
import type { Handled } from './ports.ts';

/** What is said, and the buttons under it. */
export interface Saying {
  readonly lines: readonly Line[];
  readonly buttons?: readonly Button[];
  /** Whether the numbers still press the buttons of the reply before, where this one has none. */
  readonly keepsButtons?: boolean;
}

/** A reply that is no reading's: its buttons are those that a number presses from now on. */
export function replying(here: Here, { lines, buttons = [], keepsButtons = false }: Saying): Handled {
  const { memory, settings } = here;
  const lastButtons = buttons.filter(({ mark }) => /^\d+$/.test(mark)).map(({ key }) => key);
  const next = keepsButtons && buttons.length === 0 ? memory : { ...memory, lastButtons };
  return {
    writes: next === memory ? [] : keeping(here, next),
    replies: [{ language: settings.language, lines, buttons }],
  };
}
