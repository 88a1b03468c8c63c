import type { Command } from '../command.ts';
import { readAllowance } from './settings/allowance.ts';
import { readBasis } from './settings/basis.ts';
import { readDays } from './settings/days.ts';
import { readLaw } from './settings/law.ts';
import { readReplies } from './settings/replies.ts';
import { readTargetSetting } from './settings/target.ts';
import { readTimes } from './settings/times.ts';
import { readUnits } from './settings/units.ts';
import { readUsualAdditive } from './settings/usual-additive.ts';
import { readYield } from './settings/yield.ts';
import { readZone } from './settings/zone.ts';
import type { Talk } from './talk.ts';

const READERS = [
  readUnits,
  readUsualAdditive,
  readTargetSetting,
  readTimes,
  readZone,
  readAllowance,
  readBasis,
  readLaw,
  readReplies,
  readYield,
  readDays,
];

/** Reads something that is set for the cellar in plain words; a vessel or a question beside it, and nothing is set. */
export function readSetting(talk: Talk): Command | undefined {
  if (talk.isQuestion || talk.board.findings.length > 0) return undefined;
  for (const read of READERS) {
    const command = read(talk);
    if (command) return command;
  }
  return undefined;
}
