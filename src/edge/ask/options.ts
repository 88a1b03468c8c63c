import { parseArgs } from 'node:util';
import { ADDITIVES } from '../../core/additives/additives.ts';
import type { AdditiveId } from '../../core/additives/additive-id.ts';
import { REGIONS } from '../../core/limits/region.ts';
import { DEFAULT_SETTINGS, withUnits, type Settings } from '../../chat/conversation/settings.ts';
import { OperatorError } from '../operator-error.ts';
import { LANGUAGES } from '../../chat/reader/words/languages.ts';
import { isLanguage } from '../is-language.ts';
import type { KeptPart } from './kept-lines.ts';

/** What the command line asks for. */
export interface AskOptions {
  readonly jsonl: boolean;
  /** The message, where it stands on the command line. */
  readonly text: string;
  readonly settings: Settings;
  /** The cellar's file; absent: nothing is kept. */
  readonly data?: string;
  /** What of the file is to be printed, in place of answers. */
  readonly print?: KeptPart;
}

const USAGE = `npm run -s ask -- "T4 1450 gal pH 3.58 free 21"
npm run -s ask -- --jsonl < messages.jsonl
npm run -s ask -- --data FILE --log, or --vessels
options: --data FILE --language ${LANGUAGES.join('|')}  --basis pk-1.81|oiv  --additive NAME  --units metric|us|imperial
--region ${REGIONS.join('|')}`;

const UNITS = ['metric', 'us', 'imperial'] as const;
const BASES = ['pk-1.81', 'oiv'] as const;

/** An additive that is usual needs neither strength nor size to be told with every message. */
const USUAL: readonly string[] = Object.values(ADDITIVES)
  .filter(({ kind }) => kind === 'powder' || kind === 'gas')
  .map(({ id }) => id);

function oneOf<T extends string>(name: string, value: string | undefined, all: readonly T[]): T | undefined {
  if (value === undefined) return undefined;
  const found = all.find((one) => one === value);
  if (found === undefined) throw new OperatorError(`--${name} must be one of ${all.join(', ')}.`);
  return found;
}

function parse(args: readonly string[]) {
  try {
    return parseArgs({
      args: [...args],
      allowPositionals: true,
      options: {
        jsonl: { type: 'boolean' },
        language: { type: 'string' },
        basis: { type: 'string' },
        additive: { type: 'string' },
        units: { type: 'string' },
        region: { type: 'string' },
        data: { type: 'string' },
        log: { type: 'boolean' },
        vessels: { type: 'boolean' },
      },
    });
  } catch (error) {
    const reason = error instanceof Error ? error.message.split('. ')[0] : String(error);
    throw new OperatorError(`${reason}.\n${USAGE}`, { cause: error });
  }
}

/**
 * Reads the command line.
 *
 * @throws OperatorError with a sentence for an option that there is not, or a value that it cannot have.
 */
export function readOptions(args: readonly string[]): AskOptions {
  const { values, positionals } = parse(args);
  const text = positionals.join(' ');
  const jsonl = values.jsonl ?? false;
  const asked = [text.trim() !== '', jsonl, values.log, values.vessels].filter(Boolean);
  if (asked.length !== 1)
    throw new OperatorError(
      `One of these: a message, --jsonl with messages on stdin, --log or --vessels.\n${USAGE}`,
    );
  const { data } = values;
  const print = values.log ? 'log' : values.vessels ? 'vessels' : undefined;
  if (data?.trim() === '' || (print !== undefined && data === undefined))
    throw new OperatorError(`--data must name the cellar's file.\n${USAGE}`);
  if (values.language !== undefined && !isLanguage(values.language))
    throw new OperatorError(`--language must be one of ${LANGUAGES.join(', ')}.`);
  const basis = oneOf('basis', values.basis, BASES);
  const additive = oneOf('additive', values.additive, USUAL as readonly AdditiveId[]);
  const units = oneOf('units', values.units, UNITS);
  const region = oneOf('region', values.region?.trim().toLowerCase(), REGIONS);
  const settings: Settings = {
    ...withUnits(DEFAULT_SETTINGS, units ?? 'metric'),
    ...(values.language !== undefined && { language: values.language }),
    ...(basis !== undefined && { basis }),
    ...(region !== undefined && { region }),
    ...(additive !== undefined && { usualAdditive: additive }),
  };
  return {
    jsonl,
    text,
    settings,
    ...(data !== undefined && { data }),
    ...(print !== undefined && { print }),
  };
}
