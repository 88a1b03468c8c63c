/** What a button of a round does, or of several equal vessels, or of a file that may be a round. */
export type DoesToRound = 'ra' | 'rl' | 'rt' | 'rp' | 'rx' | 'ru' | 'bu' | 'fd' | 'fn';

/** A button's key taken apart: what it does, to which round or reading, and at which place. */
export interface PressedRound {
  readonly does: DoesToRound;
  readonly ref: string;
  readonly place: number; // a position
}

/** Takes the key of such a button apart; undefined for any other. */
export function parseRoundKey(key: string): PressedRound | undefined {
  const match = /^(ra|rl|rt|rp|rx|ru|bu|fd|fn):(\d{1,9}\.\d{1,9})(?::(\d{1,3}))?$/.exec(key);
  if (!match) return undefined;
  return { does: match[1] as DoesToRound, ref: match[2] ?? '', place: Number(match[3] ?? 0) };
}
