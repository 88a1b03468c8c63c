import type { Fields } from '../reader/understood.ts';
import type { Waiting } from './memory.ts';

/**
 * The choice of a question whose name holds all words of a text (`potassium`, `bisulfite solution`); undefined where
 * none does, or more than one.
 */
export function choiceByWords(text: string, { letters }: Waiting): Fields | undefined {
  const words = text.split(/[^\p{L}\d]+/u).filter((word) => word !== '');
  if (words.length === 0) return undefined;
  const fitting = Object.values(letters).filter(({ additive }) => {
    const names = additive?.split('-') ?? [];
    return words.every((word) => names.includes(word));
  });
  const exact = fitting.find(({ additive }) => additive === words.join('-'));
  return exact ?? (fitting.length === 1 ? fitting[0] : undefined);
}
