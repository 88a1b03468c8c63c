import type { Board } from '../board.ts';
import { freshBoard, wordsOf } from '../board.ts';
import { draftOfBoard } from '../draft-of-board.ts';
import { findKind } from '../finders/kind.ts';
import { findLabelled } from '../finders/labels.ts';
import { findVessel } from '../finders/vessel.ts';
import { findWhen } from '../finders/when.ts';
import { isOwn } from '../own-pieces.ts';
import type { Draft } from '../understood.ts';
import type { OwnWordId } from '../words/words.ts';
import { claimFigure, figureWords, labFigures, type LabFigure } from './figures.ts';
import { labelFigures, type LabLabel } from './label-figures.ts';
import type { SaidTitration } from './said-titration.ts';

/** The words without one of which nothing is a titration. */
const OPENERS: readonly OwnWordId[] = [
  'lab-aeration',
  'lab-iodine',
  'lab-naoh',
  'lab-iodate',
  'lab-titration',
];

/** The methods: beside one of these a volume in millilitres is of a titration, also where nothing else is told. */
const METHODS: readonly OwnWordId[] = ['lab-aeration', 'lab-iodine', 'lab-naoh', 'lab-iodate'];

/** Samples that a pipette takes, mL (common practice, no source): an unlabelled volume of another size is none. */
const PIPETTES_mL: readonly number[] = [5, 10, 20, 25, 50, 100];

/** Strongest titrant that a bare figure is taken for, in N or M (own threshold). */
const STRENGTH_MOST = 0.5;

type Mutable = { -readonly [K in keyof SaidTitration]: SaidTitration[K] };

/**
 * Reads a titration: which method, the sample, what the burette gave, the titrant's strength. It takes the whole message;
 * undefined where the message is none.
 */
export function readTitration(board: Board): Draft | undefined {
  if (!board.pieces.some((_, k) => isOwn(board.pieces, k, ...OPENERS))) return undefined;
  const own = freshBoard(board);
  findWhen(own);
  findVessel(withoutLabWords(own));
  findKind(own);
  findLabelled(own, 'ph');
  const figures = labFigures(own);
  if (!isTitration(own, figures)) return undefined;
  const said: Mutable = { ...methodOf(own), ...whichSO2(own) };
  const rest = takeTitrant(own, figures, said);
  const labels = labelFigures(own.pieces, rest);
  const left = takeBareTitrant(takeVolumes(rest, labels, said), said);
  for (const figure of figures) claimFigure(own, figure);
  refuseSeveral(own);
  // Figures that could be either are asked for by what is missing.
  const isAsked = said.sample_mL === undefined || said.titrant_mL === undefined;
  for (const figure of left)
    if (!isAsked || (figure.unit !== 'mL' && figure.unit !== undefined))
      own.problems.push({ code: 'ambiguous-number', about: figureWords(own, figure) });
  if (said.blank_mL !== undefined && said.titrant_mL !== undefined && said.blank_mL > said.titrant_mL)
    own.problems.push({ code: 'conflicting-values', about: `${said.blank_mL} / ${said.titrant_mL}` });
  if (!isPossible(said)) own.problems.push({ code: 'value-out-of-range', about: '' });
  return { ...draftOfBoard(own, 'titration'), titration: said };
}

/** A sample is of one vessel: of several nobody can tell which. */
function refuseSeveral(board: Board): void {
  const [first, second] = board.findings.filter(({ field }) => field === 'vessel' || field === 'vessels');
  if (first === undefined || (second === undefined && first.field === 'vessel')) return;
  board.problems.push({
    code: 'conflicting-values',
    about: [first, second]
      .map((one) => (one ? wordsOf(board, one.from, one.to) : ''))
      .filter(Boolean)
      .join(' / '),
  });
}

/** `AO 20` names no vessel. */
function withoutLabWords(board: Board): Board {
  for (const { ids, from, to } of board.pieces)
    if (ids.some((id) => id.startsWith('lab-'))) for (let i = from; i <= to; i++) board.taken[i] = true;
  return board;
}

/**
 * Two volumes in millilitres, or one beside the strength of a titrant; or sample and titrant by their names. A sample
 * alone may stand beside readings that are told already; one volume beside a method and nothing of them is a titration
 * of which something is missing.
 */
function isTitration(board: Board, figures: readonly LabFigure[]): boolean {
  const { pieces, cues } = board;
  const says = (id: OwnWordId): boolean => pieces.some((_, k) => isOwn(pieces, k, id));
  const ofUnit = (...units: readonly LabFigure['unit'][]): number =>
    figures.filter(({ unit }) => unit !== undefined && units.includes(unit)).length;
  const [volumes, strengths] = [ofUnit('mL'), ofUnit('N', 'M')];
  const named = [says('lab-sample'), says('lab-titrant')].filter(Boolean).length;
  const tellsResult = cues.has('label:free') || cues.has('label:total') || ofUnit('mg/L') > 0;
  const isLittle = figures.length <= 2 && volumes === 1 && METHODS.some(says) && !tellsResult;
  if (isLittle && !board.message.includes('%')) return true;
  const isOfBurette = figures.every(({ unit }) => unit !== 'L' && unit !== 'mg' && unit !== 'mg/L');
  if (strengths > 0 && figures.length >= 2 && isOfBurette && METHODS.some(says)) return true;
  return figures.length >= 2 && (volumes >= 2 || named === 2 || (strengths > 0 && volumes + named > 0));
}

function methodOf({ pieces }: Board): Pick<SaidTitration, 'method'> {
  const says = (...ids: readonly OwnWordId[]): boolean => pieces.some((_, k) => isOwn(pieces, k, ...ids));
  const [isAeration, isIodine] = [says('lab-aeration', 'lab-naoh'), says('lab-iodine', 'lab-iodate')];
  if (isAeration === isIodine) return {};
  return { method: isAeration ? 'aeration' : 'iodine' };
}

function whichSO2({ cues, problems }: Board): Pick<SaidTitration, 'of'> {
  const [isFree, isTotal] = [cues.has('label:free'), cues.has('label:total')];
  if (isFree && isTotal) problems.push({ code: 'conflicting-values', about: 'free, total' });
  if (isFree === isTotal) return {};
  return { of: isTotal ? 'total' : 'free' };
}

/** The titrant's strength, or what was weighed in of iodate; gives back the other figures. */
function takeTitrant(board: Board, figures: readonly LabFigure[], said: Mutable): readonly LabFigure[] {
  const strengths = figures.filter(({ unit }) => unit === 'N' || unit === 'M');
  const [strength, another] = strengths;
  if (strength !== undefined && another === undefined) {
    const { value, unit } = strength;
    said.titrant = { strength: value, ...(unit === 'N' || unit === 'M' ? { unit } : {}) };
    return figures.filter((one) => one !== strength);
  }
  if (another !== undefined) return figures;
  const weighed = figures.find(({ unit }) => unit === 'mg');
  const flask =
    weighed && figures.find(({ from, unit }) => from > weighed.to && (unit === 'mL' || unit === 'L'));
  if (weighed && flask && board.pieces.some((_, k) => isOwn(board.pieces, k, 'lab-iodate'))) {
    said.titrant = {
      iodate_mg: weighed.value,
      flask_mL: flask.unit === 'L' ? flask.value * 1000 : flask.value,
    };
    return figures.filter((one) => one !== weighed && one !== flask);
  }
  const bare = figures.filter(({ unit, value }) => unit === undefined && value > 0 && value <= STRENGTH_MOST);
  const labels = labelFigures(board.pieces, figures);
  const [alone, second] = bare.filter((one) => !labels.has(one) || labels.get(one) === 'titrant');
  if (alone === undefined || second !== undefined) return figures;
  const hasBoth = figures.filter((one) => one !== alone && one.unit === 'mL').length >= 2;
  if (!hasBoth) return figures;
  said.titrant = { strength: alone.value };
  return figures.filter((one) => one !== alone);
}

const FIELD_OF = {
  sample: 'sample_mL',
  titrant: 'titrant_mL',
  blank: 'blank_mL',
  ascorbic: 'ascorbic_mg_L',
} as const satisfies Record<LabLabel, keyof SaidTitration>;

/** The volumes by their labels, then by what is missing; gives back what nobody can tell. */
function takeVolumes(
  figures: readonly LabFigure[],
  labels: ReadonlyMap<LabFigure, LabLabel>,
  said: Mutable,
): readonly LabFigure[] {
  const left: LabFigure[] = [];
  for (const figure of figures) {
    const label = labels.get(figure);
    const isOfAscorbic = label === 'ascorbic';
    const fits = isOfAscorbic
      ? figure.unit === undefined || figure.unit === 'mg/L'
      : figure.unit === undefined || figure.unit === 'mL';
    if (label === undefined || !fits || said[FIELD_OF[label]] !== undefined) left.push(figure);
    else said[FIELD_OF[label]] = figure.value;
  }
  const volumes = left.filter(({ unit }) => unit === 'mL');
  const others = left.filter(({ unit }) => unit !== 'mL');
  const [one, other, third] = volumes;
  if (one === undefined || third !== undefined) return left;
  if (other === undefined) {
    if (said.sample_mL === undefined && said.titrant_mL !== undefined) said.sample_mL = one.value;
    else if (said.titrant_mL === undefined && said.sample_mL !== undefined) said.titrant_mL = one.value;
    else if (said.sample_mL === undefined && PIPETTES_mL.includes(one.value)) said.sample_mL = one.value;
    else return left;
    return others;
  }
  if (said.sample_mL !== undefined || said.titrant_mL !== undefined) return left;
  const [small, large] = one.value < other.value ? [one.value, other.value] : [other.value, one.value];
  if (!PIPETTES_mL.includes(large) || PIPETTES_mL.includes(small) || small === large) return left;
  said.sample_mL = large;
  said.titrant_mL = small;
  return others;
}

/** Largest bare figure that is taken for what a burette gave, mL (own threshold). */
const BURETTE_mL = 50;

/** `AO 20 mL sample, 0.01 N, 1.9`: where only the burette's figure is missing, one that stands alone is it. */
function takeBareTitrant(left: readonly LabFigure[], said: Mutable): readonly LabFigure[] {
  const [one, other] = left;
  const isMissing =
    said.titrant_mL === undefined && said.sample_mL !== undefined && said.titrant !== undefined;
  if (!isMissing || one === undefined || other !== undefined) return left;
  if (one.unit !== undefined || one.value > BURETTE_mL) return left;
  said.titrant_mL = one.value;
  return [];
}

/** Whether burettes and pipettes have such volumes, and bottles such a titrant. */
function isPossible({ sample_mL = 20, titrant_mL = 0, titrant, ascorbic_mg_L = 0 }: SaidTitration): boolean {
  const isStrong =
    titrant !== undefined && 'strength' in titrant && !(titrant.strength > 0 && titrant.strength <= 2);
  return (
    sample_mL >= 0.1 &&
    sample_mL <= 1000 &&
    titrant_mL >= 0 &&
    titrant_mL <= 1000 &&
    !isStrong &&
    ascorbic_mg_L <= 10_000
  );
}
