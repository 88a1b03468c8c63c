import type { Command, Setting } from '../../command.ts';
import { MOST_BARE_MOLECULAR_mg_L } from '../../finders/aim.ts';
import { readDecimal } from '../../numbers.ts';
import { concentrationAt } from '../../units.ts';
import type { OwnWordId } from '../../words/words.ts';
import type { Talk } from '../talk.ts';
import { says, saysOnly } from '../talk.ts';
import { set, setWrong } from './set.ts';

type TargetStyle = (Setting & { of: 'target' })['style'];

const STYLES: readonly (readonly [TargetStyle, OwnWordId, OwnWordId])[] = [
  ['red', 'reds', 'red'],
  ['white', 'whites', 'white'],
  ['sweet', 'sweets', 'sweet'],
];

/** The kind of wine that is meant in general: `reds`, `for red`, `our target red`; one wine is none. */
function styleOf(talk: Talk): TargetStyle | undefined {
  const named = STYLES.filter(([, many, one]) => says(talk, many, one));
  const [only] = named;
  if (only === undefined || named.length > 1) return undefined;
  const isGeneral =
    says(talk, only[1], 'for') || (says(talk, 'usual-bare', 'default') && says(talk, 'target'));
  return isGeneral ? only[0] : undefined;
}

/** Reads `target 0.6 for reds`, `reds 0.6`, `whites to 0.8 molecular`; beside anything of a wine it is none. */
export function readTargetSetting(talk: Talk): Command | undefined {
  const style = styleOf(talk);
  const figures = talk.said.filter(({ kind }) => kind === 'number');
  const [figure] = figures;
  if (style === undefined || figure === undefined || figures.length > 1) return undefined;
  const unit = concentrationAt(talk.board, figure.to + 1);
  const read = new Set(
    talk.said.filter(({ from }) => from >= figure.from && from <= (unit?.to ?? figure.to)),
  );
  const allowed = ['target', 'target-kind', 'for', 'to', 'is', 'at', 'usual-bare', 'default', 'reds', 'red', 'whites', 'white', 'sweets', 'sweet'] as const; // prettier-ignore
  if (!saysOnly(talk, allowed, read)) return undefined;
  const molecular_mg_L = /^\d+([.,]\d+)?$/.test(figure.text) ? readDecimal(figure.text) : Number.NaN;
  if (molecular_mg_L > 0 && molecular_mg_L <= MOST_BARE_MOLECULAR_mg_L)
    return set({ of: 'target', style, molecular_mg_L });
  const isSet = says(talk, 'target', 'target-kind', 'to', 'is');
  return isSet ? setWrong(talk, 'target', [figure]) : undefined;
}
