import type { Write } from '../../src/core/cellar/cellar-store.ts';
import type { Answer } from '../../src/chat/conversation/ports.ts';
import type { Fields, Reading } from '../../src/chat/reader/understood.ts';
import type { Reply } from '../../src/chat/replies/reply.ts';
import type { Turn } from './conversation-of.ts';
import { say } from './say.ts';

/** Words that a program lets slip and no sentence has. */
const SLIPS = ['NaN', 'undefined', 'Infinity', '[object', '{$', '{ $', '???'];

/** All that is wrong with how one message was handled; empty when nothing is. */
export function faults(turn: Turn): string[] {
  const { handled, again } = turn;
  const readings = handled.understood?.readings ?? [];
  const answers = handled.answers ?? [];
  return [
    ...(JSON.stringify(again) === JSON.stringify(handled) ? [] : ['handled twice, it comes out differently']),
    // An errand is answered by whoever runs it.
    ...(handled.replies.length === 0 && handled.errand === undefined ? ['no reply'] : []),
    ...(readings.length === answers.length ? [] : [`${readings.length} readings, ${answers.length} answers`]),
    ...handled.replies.flatMap((reply) => wrongText(turn, reply)),
    ...readings.flatMap((reading, at) => {
      const shared = handled.understood?.shared ?? {};
      return wrongAnswer(reading, { ...shared, ...reading.fields }, answers[at] ?? null);
    }),
    ...readings.flatMap((reading, at) => unsaid(reading, answers[at] ?? null, handled.replies)),
    ...handled.replies.flatMap((reply) => wrongKind(readings, reply)),
    ...wrongNotes(readings, handled.writes),
  ];
}

function wrongText({ message }: Turn, reply: Reply): string[] {
  const { text, buttons } = say(reply);
  const theirs = message.content.kind === 'text' ? message.content.text.toLowerCase() : '';
  const all = [text, ...buttons.map((button) => button.label)].join('\n');
  return [
    ...(text.trim() === '' ? ['an empty reply'] : []),
    // A person's own words may stand in the reply, whatever they are.
    ...SLIPS.filter((slip) => all.includes(slip) && !theirs.includes(slip.toLowerCase())).map(
      (slip) => `the reply says ${slip}`,
    ),
    ...buttons
      .filter((button) => Buffer.byteLength(button.key) > 64)
      .map((button) => `long key ${button.key}`),
  ];
}

/** A dose, or a button, in a reply to what must get none. */
function wrongKind(readings: readonly Reading[], reply: Reply): string[] {
  const every = (holds: (reading: Reading) => boolean): boolean =>
    readings.length > 0 && readings.every(holds);
  const doses = reply.lines.filter((line) => line.key.startsWith('dose-')).map((line) => line.key);
  return [
    ...(every((one) => one.problems.length > 0) ? doses.map((key) => `${key} beside a problem`) : []),
    ...(every((one) => one.intent === 'emergency')
      ? [...doses, ...reply.buttons.map((one) => one.label)].map((key) => `${key} in an emergency`)
      : []),
  ];
}

/** What the log must not get from a message that is not understood, or that is for help. */
function wrongNotes(readings: readonly Reading[], writes: readonly Write[]): string[] {
  const kinds = writes.flatMap((write) => (write.kind === 'entry' ? [write.entry.kind] : []));
  const isWrong = readings.length > 0 && readings.every(({ problems }) => problems.length > 0);
  const isEmergency = readings.some(({ intent }) => intent === 'emergency');
  return kinds.flatMap((kind) => [
    // What is not calculated is noted as it was written.
    ...(isWrong && kind !== 'other' ? [`a ${kind} noted beside a problem`] : []),
    ...(isEmergency ? [`a ${kind} noted in an emergency`] : []),
  ]);
}

function wrongAnswer(reading: Reading, fields: Fields, answer: Answer | null): string[] {
  const found = notFinite(answer, 'answer');
  if (reading.problems.length > 0) {
    if (answer !== null) found.push('an answer beside a problem');
    if (reading.asks.length > 0) found.push('a question beside a problem');
  }
  if ((reading.intent === 'emergency' || reading.intent === 'chat') && answer !== null)
    found.push(`an answer to ${reading.intent}`);
  if (answer !== null && reading.intent === 'dose' && hasAmount(answer)) {
    const known = { ...reading.assumed, ...fields };
    found.push(...needs(known).map((need) => `an amount without ${need}`));
    found.push(
      ...reading.asks.filter((ask) => ask !== 'vessel').map((ask) => `an amount while ${ask} is asked`),
    );
  }
  return found;
}

function hasAmount(answer: Answer): boolean {
  const amounts: Readonly<Record<string, unknown>> = { ...answer };
  return ['mass_g', 'additive_volume_mL', 'tablets', 'measure', 'SO2_g'].some(
    (key) => amounts[key] !== undefined,
  );
}

/** What an amount of additive cannot be known without. */
function needs(known: Fields): string[] {
  const lacking: string[] = [];
  const target = known.target ?? {};
  if (known.volume_L === undefined) lacking.push('volume');
  if (known.additive === undefined) lacking.push('additive');
  if (known.target === undefined) lacking.push('target');
  if (known.additive?.endsWith('-solution') && known.strength_percent === undefined) lacking.push('strength');
  if (known.additive === 'tablet' && known.tablet_SO2_g === undefined) lacking.push('tablet size');
  if (!('add_mg_L' in target) && known.free_mg_L === undefined) lacking.push('free SO2');
  if ('molecular_mg_L' in target && known.ph === undefined) lacking.push('pH');
  return lacking;
}

/** Assumptions that a reply with an amount does not state. */
function unsaid(reading: Reading, answer: Answer | null, replies: readonly Reply[]): string[] {
  if (answer === null || !hasAmount(answer)) return [];
  // Where the limit leaves no room the reply shows no amount.
  if ('capped' in answer && answer.capped?.dose_mg_L === 0) return [];
  const inEnglish = (reply: Reply): Reply => ({
    ...reply,
    language: 'en',
    lines: reply.lines.map((one) => ({ ...one, language: 'en' })),
  });
  const text = replies.map((reply) => say(inEnglish(reply)).text).join('\n');
  const { assumed } = reading;
  const signs: readonly (readonly [string, boolean, RegExp])[] = [
    ['additive', assumed.additive !== undefined, /metabisulfite/i],
    ['target', assumed.target !== undefined && reading.intent === 'dose', /molecular/i],
    ['stage', assumed.stage !== undefined && reading.intent === 'dose', /malolactic|ferment/i],
    ['volume', assumed.volume_L !== undefined, /225|100 kg/],
    ['gallon', assumed.gallon !== undefined, assumed.gallon === 'US' ? /US gal/i : /imp/i],
  ];
  return signs
    .filter(([, there, sign]) => there && !sign.test(text))
    .map(([what]) => `the assumed ${what} is not said`);
}

function notFinite(value: unknown, path: string): string[] {
  if (typeof value === 'number') {
    if (!Number.isFinite(value)) return [`${path} is ${value}`];
    const signed = /steps|rounding_mg_L|values|temperature_C/.test(path);
    return value < 0 && !signed ? [`${path} is negative: ${value}`] : [];
  }
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, one]) => notFinite(one, `${path}.${key}`));
}
