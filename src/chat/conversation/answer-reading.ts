import type { Language, Reading } from '../reader/understood.ts';
import { answerAdded } from './intents/added.ts';
import { answerChat } from './intents/chat.ts';
import { answerDose } from './intents/dose.ts';
import { answerEffect } from './intents/effect.ts';
import { answerEmergency } from './intents/emergency.ts';
import { answerProblem } from './intents/problem.ts';
import { answerReading as answerKeptReading } from './intents/reading.ts';
import { answerSolution } from './intents/solution.ts';
import type { Outcome, Turn } from './outcome.ts';

/** What to say to one reading: an emergency before a problem, a problem before every figure. */
export function answerReading(reading: Reading, language: Language, turn: Turn): Outcome {
  if (reading.intent === 'emergency') return answerEmergency(language);
  if (reading.problems.length > 0) return answerProblem(reading);
  switch (reading.intent) {
    case 'dose':
      return answerDose(reading, turn);
    case 'effect':
      return answerEffect(reading, turn);
    case 'added':
      return answerAdded(reading, turn);
    case 'reading':
      return answerKeptReading(reading, turn);
    case 'solution':
      return answerSolution(reading, turn);
    case 'chat':
    case 'command':
    case 'titration':
      return answerChat(reading);
  }
}
