import type { Language } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { line } from '../lines/line.ts';
import type { Outcome } from '../outcome.ts';

/**
 * What comes before all else, in the order it is done. Eyes: the data sheets' P305+P351+P338 (rinse, take lenses out);
 * out to fresh air, nobody after anyone, the emergency services: common practice, no source.
 */
const EMERGENCY = ['emergency-out', 'emergency-nobody-in', 'emergency-call', 'emergency-eyes'] as const;

/** The reply to an emergency: in the language it was recognised in, then in English; no dose, question or button. */
export function answerEmergency(recognised: Language): Outcome {
  const languages: readonly Language[] = recognised === 'en' ? ['en'] : [recognised, 'en'];
  const lines = languages.flatMap((language): Line[] =>
    EMERGENCY.map((key) => ({ ...line('first', key), language })),
  );
  return { answer: null, inRound: lines, lines, buttons: [] };
}
