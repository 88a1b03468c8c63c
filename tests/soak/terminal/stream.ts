/** A line of `ask --log`, as far as it is looked at here. */
export interface LogLine {
  readonly entry: number;
  readonly kind: string;
  readonly vessel: string;
  readonly mass_g?: number;
  readonly free_mg_L?: number;
  readonly corrects?: number;
  readonly reason?: string;
}

/** A message as somebody types it, how its answer tells that it is noted, and what it leaves in the log. */
export interface Typed {
  readonly text: string;
  readonly acknowledged: RegExp;
  /** As `traceOf` tells it of a line. No other message leaves the same. */
  readonly trace: string;
}

/** The messages of a round. */
export const ROUND_LENGTH = 8;
/** Vessels that several additions go into; those of readings with a dose are new each time. */
const SHARED_VESSELS = 40;
const FIRST_DOSED = 100;
const FIRST_MASS_g = 200;

/** The mass of an addition in words: no other has the same, and all are told in grams. */
const massOf = (round: number, nth: number): number => (FIRST_MASS_g * 10 + round * 3 + nth) / 10;

/**
 * A round of messages that can be told apart in the log: a reading with a dose and the tap on its first button, additions
 * in words, of which one is undone and one struck, and a reading to keep. The number of an entry to strike stands as the
 * mass of it in curly brackets.
 */
export function roundOf(round: number): readonly Typed[] {
  const dosed = FIRST_DOSED + round;
  const shared = 1 + (round % SHARED_VESSELS);
  const [first, second, third] = [massOf(round, 0), massOf(round, 1), massOf(round, 2)];
  const adds = (mass_g: number): Typed => ({
    text: `added ${mass_g} g kmbs T${shared}`,
    acknowledged: new RegExp(`^Noted \\d+: T${shared} ${mass_g} g`, 'm'),
    trace: `addition tank ${shared} ${mass_g}`,
  });
  const takesBack = (text: string, mass_g: number, reason: string): Typed => ({
    text,
    acknowledged: new RegExp(`^Struck \\d+ \\(T${shared} ${mass_g} g`, 'm'),
    trace: `${reason}: addition tank ${shared} ${mass_g}`,
  });
  return [
    {
      text: `T${dosed} 4000 L white pH 3.4 free 15 ML done`,
      acknowledged: new RegExp(`^T${dosed}: weigh 117 g`, 'm'),
      trace: `reading tank ${dosed} 15`,
    },
    {
      text: '1',
      acknowledged: new RegExp(`^Noted \\d+: T${dosed} 117 g`, 'm'),
      trace: `addition tank ${dosed} 117`,
    },
    adds(first),
    adds(second),
    takesBack('undo', second, 'undo'),
    adds(third),
    {
      text: `T${dosed} now free 21 pH 3.41`,
      acknowledged: new RegExp(`^T${dosed}: .*kept`, 'm'),
      trace: `reading tank ${dosed} 21`,
    },
    takesBack(`strike {${third}} bag was short`, third, 'bag was short'),
  ];
}

/** What a line of the log was left by; of a correction, with what it takes back. */
export function traceOf(line: LogLine, log: ReadonlyMap<number, LogLine>): string {
  const { kind, vessel, mass_g, free_mg_L, corrects = 0, reason } = line;
  const struck = log.get(corrects);
  if (kind === 'correction') return `${reason}: ${struck ? traceOf(struck, log) : 'nothing'}`;
  return `${kind} ${vessel} ${mass_g ?? free_mg_L}`;
}

/** What is typed, with the number of the entry that it names by its mass; undefined while that is not known. */
export function asTyped({ text }: Typed, entries: ReadonlyMap<number, number>): string | undefined {
  const [named, mass_g] = /\{([\d.]+)\}/.exec(text) ?? [];
  if (named === undefined) return text;
  const entry = entries.get(Number(mass_g));
  return entry === undefined ? undefined : text.replace(named, String(entry));
}
