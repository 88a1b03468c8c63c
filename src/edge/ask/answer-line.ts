import type { IncomingMessage } from '../../chat/conversation/ports.ts';
import type { Language } from '../../chat/reader/understood.ts';
import { faultText } from '../fault-text.ts';
import type { Unasked } from '../serve-due.ts';
import { makeServe, type Serving } from '../serve-message.ts';
import { shownName } from '../shown-name.ts';
import { readInputLine, type InputLine } from './input-line.ts';
import { toOutputLine, toSendsLine } from './output-line.ts';
import type { PlaceOf } from './place.ts';

/** What answering a line needs. */
export interface LineOptions extends Pick<Serving, 'handle' | 'say' | 'settings'> {
  readonly placeOf: PlaceOf;
  /** Says what falls due by a moment. */
  readonly sayDue: (at: number) => Promise<readonly Unasked[]>;
  readonly language: Language;
  /** Names the run: a message without an id has one of its own in every run. */
  readonly run: string;
  /** The time in milliseconds since 1970, for lines that tell none. */
  readonly now: () => number;
  /** Told of the moment of each line before it is answered. */
  readonly setClock: (at: number) => void;
}

/** Makes the answering of `--jsonl` lines, one after the other: each is a chat of its own, unless `chat` joins several. */
export function makeAnswerLine(options: LineOptions): (line: string) => Promise<object> {
  let count = 0;
  const answer = async (input: InputLine): Promise<object> => {
    count += 1;
    const id = input.id ?? null;
    const at = input.at === undefined ? options.now() : Date.parse(input.at);
    options.setClock(at);
    if (input.tick) return toSendsLine(id, await options.sayDue(at));
    const { store, ...place } = options.placeOf(input.chat === undefined ? undefined : String(input.chat));
    const message: IncomingMessage = {
      ...place,
      ...personOf(input),
      id: id === null ? `${options.run} ${count}` : String(id),
      at,
      language: input.language ?? options.language,
      trusted: true,
      content:
        input.press === undefined
          ? { kind: 'text', text: input.text ?? '' }
          : { kind: 'press', key: input.press },
    };
    const faults: unknown[] = [];
    const serve = makeServe({ ...options, store, report: (fault) => faults.push(fault) });
    const served = await serve(message);
    const line = toOutputLine(id, served);
    return faults.length === 0 ? line : { ...line, error: faults.map(faultText).join(' ') };
  };
  return async (line) => {
    const input = readInputLine(line);
    if ('error' in input) return { id: null, error: input.error };
    try {
      return await answer(input);
    } catch (fault) {
      // What fails in one line must not cost the others their answers.
      return { id: input.id ?? null, error: faultText(fault) };
    }
  };
}

function personOf({ person }: InputLine): Pick<IncomingMessage, 'person' | 'name'> {
  if (person === undefined) return { person: 'someone' };
  const name = shownName(String(person));
  return { person: String(person), ...(name !== undefined && { name }) };
}
