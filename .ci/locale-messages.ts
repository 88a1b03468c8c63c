import { FluentParser, Visitor } from '@fluent/syntax';
import type {
  Message,
  MessageReference,
  Resource,
  Term,
  TermReference,
  VariableReference,
} from '@fluent/syntax';

/** The messages of a locale by key, each with the values that its sentence takes, in order. */
export type LocaleMessages = ReadonlyMap<string, readonly string[]>;

/**
 * Reads a Fluent file. What a message takes includes what the messages and terms in it take.
 *
 * @throws SyntaxError when a line cannot be read or a key stands twice: Fluent itself would pass over it in silence.
 */
export function localeMessages(ftl: string): LocaleMessages {
  const resource = new FluentParser({ withSpans: true }).parse(ftl);
  const entries = new Map<string, Message | Term>();
  for (const entry of resource.body) {
    if (entry.type === 'Junk')
      throw new SyntaxError(`Cannot read the locale at: ${entry.content.slice(0, 80)}`);
    if (entry.type !== 'Message' && entry.type !== 'Term') continue;
    const key = entry.type === 'Term' ? `-${entry.id.name}` : entry.id.name;
    if (entries.has(key)) throw new SyntaxError(`Cannot have two sentences with one key: ${key}`);
    entries.set(key, entry);
  }
  const messages = [...entries].filter(([key]) => !key.startsWith('-'));
  return new Map(messages.map(([key]) => [key, [...taken(key, entries)].toSorted()]));
}

/** Keys that other messages of the locale refer to. */
export function referredTo(ftl: string): ReadonlySet<string> {
  const resource: Resource = new FluentParser({ withSpans: false }).parse(ftl);
  const found = new References();
  found.visit(resource);
  return new Set(found.entries);
}

class References extends Visitor {
  readonly variables: string[] = [];
  readonly entries: string[] = [];
  override visitVariableReference(node: VariableReference): void {
    this.variables.push(node.id.name);
  }
  override visitMessageReference(node: MessageReference): void {
    this.entries.push(node.id.name);
  }
  override visitTermReference(node: TermReference): void {
    this.entries.push(`-${node.id.name}`);
    this.genericVisit(node);
  }
}

function taken(key: string, entries: ReadonlyMap<string, Message | Term>, above: string[] = []): Set<string> {
  const entry = entries.get(key);
  if (entry === undefined) throw new SyntaxError(`Cannot refer to ${key}: the locale has no such sentence`);
  if (above.includes(key)) throw new SyntaxError(`Cannot refer to ${key} from within itself`);
  const found = new References();
  found.visit(entry);
  const below = found.entries.flatMap((one) => [...taken(one, entries, [...above, key])]);
  return new Set([...found.variables, ...below]);
}
