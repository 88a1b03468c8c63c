import type { Language } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import { line } from '../lines/line.ts';
import type { Outcome } from '../outcome.ts';

/**
 * What comes before all else, in the order it is done. Eyes: the data sheets' P305+P351+P338 (rinse, take lenses out);
 * swallowed: rinse the mouth, no vomiting, poison control (common practice, no source); skin: rinse, take wet clothes
 * off (common practice, no source); out to fresh air, nobody after
 * anyone, the emergency services: common practice, no source.
 */
const EMERGENCY = ['emergency-out', 'emergency-nobody-in', 'emergency-call', 'emergency-eyes'] as const;

/** What the hurt person needs goes right after "everybody out". */
const FIRST_AID: Readonly<Record<string, SentenceKey>> = {
  eyes: 'emergency-eyes',
  swallowed: 'emergency-swallowed',
  skin: 'emergency-skin',
};

function keysFor(topic: string | undefined): readonly SentenceKey[] {
  const aid = topic === undefined ? undefined : FIRST_AID[topic];
  if (aid === undefined) return EMERGENCY;
  const [out, ...others] = EMERGENCY;
  return [out, aid, ...others.filter((key) => key !== aid)];
}

/** The reply to an emergency: in the language it was recognised in, then in English; no dose, question or button. */
export function answerEmergency(recognised: Language, topic?: string): Outcome {
  const languages: readonly Language[] = recognised === 'en' ? ['en'] : [recognised, 'en'];
  const lines = languages.flatMap((language): Line[] =>
    keysFor(topic).map((key) => ({ ...line('first', key), language })),
  );
  return { answer: null, inRound: lines, lines, buttons: [] };
}
