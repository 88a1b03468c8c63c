import { FluentBundle, FluentResource } from '@fluent/bundle';
import type { Language } from '../reader/understood.ts';
import { withCapital } from './capital.ts';
import { fold } from './fold.ts';
import type { Line, Reply } from './reply.ts';

/** What a person gets: the text, and the buttons with their labels. */
export interface Said {
  readonly text: string;
  readonly buttons: readonly { readonly key: string; readonly mark: string; readonly label: string }[];
  /** The message whose reply this one takes the place of. */
  readonly replaces?: string;
}

/** Makes the text of a reply. */
export type Say = (reply: Reply) => Said;

/** The Fluent text of each language; `en` is whole and stands in for what another has not yet. */
export type LocaleSources = Readonly<Partial<Record<Language, string>>> & { readonly en: string };

type Sentence = Pick<Line, 'key' | 'values' | 'list'>;

function bundleOf(language: Language, source: string): FluentBundle {
  const bundle = new FluentBundle(language, { useIsolating: false });
  const [fault] = bundle.addResource(new FluentResource(source));
  if (fault) throw new TypeError(`Cannot read the sentences of ${language}: ${fault.message}`);
  return bundle;
}

function format(bundles: readonly FluentBundle[], { key, values, list }: Sentence): string {
  const bundle = bundles.find((one) => one.getMessage(key)?.value);
  const pattern = bundle?.getMessage(key)?.value;
  if (!bundle || !pattern) throw new TypeError(`Cannot say "${key}" as no language has that sentence`);
  const args = { ...withNames(bundles, values), ...(list && { list: joined(bundles, key, list) }) };
  const faults: Error[] = [];
  const text = bundle.formatPattern(pattern, args, faults);
  if (faults.length > 0) throw new TypeError(`Cannot say "${key}": ${faults[0]?.message}`);
  return text.replaceAll(ENDS_TWICE, '$1.');
}

/** A month that is shortened with a point, at the end of a sentence: `8 de out..` ends once. */
const ENDS_TWICE = /(\p{L})\.\.(?!\.)/gu;

/** Values that are names of vessels: what is kept as `barrel 17` is called in each language as it is there. */
const NAMES: ReadonlySet<string> = new Set(['vessel', 'vessels', 'other', 'to']);

const KEPT_BARREL = /\bbarrel (?=\d)/g;

function withNames(bundles: readonly FluentBundle[], values: Line['values']): Line['values'] {
  const isBarrel = Object.entries(values).some(
    ([name, value]) => NAMES.has(name) && typeof value === 'string' && value.includes('barrel '),
  );
  if (!isBarrel || !bundles.some((one) => one.hasMessage('barrel-name'))) return values;
  const word = format(bundles, { key: 'barrel-name', values: {} });
  return Object.fromEntries(
    Object.entries(values).map(([name, value]) => [
      name,
      NAMES.has(name) && typeof value === 'string' ? value.replaceAll(KEPT_BARREL, `${word} `) : value,
    ]),
  );
}

/** The parts of a list, with the separator of that sentence or the usual one between them. */
function joined(bundles: readonly FluentBundle[], key: string, list: readonly Sentence[]): string {
  const own = `${key}-separator`;
  const separator = bundles.some((one) => one.hasMessage(own)) ? own : 'list-separator';
  return list.map((one) => format(bundles, one)).join(format(bundles, { key: separator, values: {} }));
}

/**
 * Makes `say` from the text of the locale files, once; what is wrong in one but English shows at its first reply. Throws a TypeError for a sentence that is missing, or that
 * takes a variable nobody handed in: half a sentence about a dose is worse than none.
 *
 * @example
 * ```ts
 * makeSay({ en: 'hi = Hello { $who }' })({ language: 'en', buttons: [], lines: [{ room: 'first', key: 'hi', values: { who: 'T4' } }] }).text // => "Hello T4"
 * ```
 */
export function makeSay(sources: LocaleSources): Say {
  const english = bundleOf('en', sources.en);
  const chains = new Map<Language, readonly FluentBundle[]>([['en', [english]]]);
  // To read the sentences of a language takes as long as to answer a hundred messages: each waits for its first reply.
  const chain = (language: Language): readonly FluentBundle[] => {
    const known = chains.get(language);
    if (known !== undefined) return known;
    const source = sources[language];
    const made = source === undefined ? [english] : [bundleOf(language, source), english];
    chains.set(language, made);
    return made;
  };
  return (reply) => {
    const sayLine = (line: Line): string => withCapital(format(chain(line.language ?? reply.language), line));
    const labelOf = (button: Reply['buttons'][number]): string =>
      format(chain(button.language ?? reply.language), { key: button.label, values: button.values });
    const lines = reply.lines.map((line) => ({ line, text: sayLine(line) }));
    const hasMore = reply.buttons.some(({ label }) => label === 'button-more');
    return {
      // What is folded away stands behind the button `More`: without it nothing is.
      text: hasMore
        ? fold(lines, () => format(chain(reply.language), { key: 'folded', values: {} }))
        : lines.map(({ text }) => text).join('\n'),
      buttons: reply.buttons.map((button) => ({
        key: button.key,
        mark: button.mark,
        label: labelOf(button),
      })),
      ...(reply.replaces !== undefined && { replaces: reply.replaces }),
    };
  };
}
