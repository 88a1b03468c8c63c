import type { CellarView, Write } from '../../../../core/cellar/cellar-store.ts';
import { zoneNamed } from '../../../../core/time/zone-named.ts';
import type { Setting } from '../../../reader/command.ts';
import { numberText } from '../../../replies/number-text.ts';
import type { Line } from '../../../replies/reply.ts';
import type { SentenceKey } from '../../../replies/sentence-keys.ts';
import { scheduleDaily } from '../../daily.ts';
import type { Here } from '../../here.ts';
import { SETTINGS_KEY } from '../../keys.ts';
import { line } from '../../lines/line.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { mergeSettings, withUnits, type CellarSettings, type Settings } from '../../settings.ts';

/** All settings, each with how to change it. */
export function showSettings(here: Here): Handled {
  const { settings } = here;
  const keys: SentenceKey[] = [
    'setting-units',
    'setting-usual-additive',
    'setting-target',
    'setting-allowance',
    'setting-basis',
    'setting-law',
    'setting-yield',
    'setting-zone',
    'setting-daily',
    'setting-quiet',
    'setting-ph-days',
    'setting-check-days',
    'setting-short-replies',
    'setting-language',
  ];
  const values = valuesOf(settings, here);
  return replying(here, {
    lines: [line('first', 'settings-head'), ...keys.map((key) => line('first', key, values))],
  });
}

/** Sets something for the whole cellar, from the next message on. */
export async function setSetting(setting: Setting, here: Here, view: CellarView): Promise<Handled> {
  const changed = changeOf(setting, here.settings);
  if (changed === undefined) return settingWrong(setting.of, setting.of === 'zone' ? setting.zone : '', here);
  const kept = await view.kept(SETTINGS_KEY);
  const before = kept === undefined ? {} : (JSON.parse(kept) as CellarSettings);
  const targets = { ...before.targets, ...changed.targets };
  const taken = takenAway(setting);
  const after = {
    ...without({ ...before, ...changed }, taken),
    ...(Object.keys(targets).length > 0 && { targets }),
  };
  const text = JSON.stringify(after);
  const settings: Settings = { ...mergeSettings(here.settings, text), language: here.settings.language };
  const next: Here = { ...here, settings: without(settings, taken) };
  const { writes, ...said } = replying(here, { lines: [settingLine(setting.of, next)] });
  const isTimed = setting.of === 'zone' || setting.of === 'daily' || setting.of === 'quiet';
  const daily = isTimed ? await scheduleDaily(next, view, { anew: true }) : [];
  const keep: Write = { kind: 'keep', key: SETTINGS_KEY, text };
  return { ...said, writes: [keep, ...daily, ...writes] };
}

/** What cannot be set gets a sentence with an example. */
export function settingWrong(of: Setting['of'], about: string, here: Here): Handled {
  return replying(here, { lines: [line('first', 'setting-wrong', { of, text: about })] });
}

/** What somebody sets to nothing. */
function takenAway(setting: Setting): 'allowance_percent' | 'yield_L_per_100_kg' | undefined {
  if (setting.of === 'allowance' && setting.percent === 0) return 'allowance_percent';
  return setting.of === 'yield' && setting.yield_L_per_100_kg === 'off' ? 'yield_L_per_100_kg' : undefined;
}

function without<S extends CellarSettings>(settings: S, name: keyof CellarSettings | undefined): S {
  return Object.fromEntries(Object.entries(settings).filter(([one]) => one !== name)) as S;
}

function changeOf(setting: Setting, settings: Settings): CellarSettings | undefined {
  switch (setting.of) {
    case 'units':
      return unitsOf(setting.units, settings);
    case 'usual-additive':
      return usualOf(setting);
    case 'target':
      return { targets: { ...settings.targets, [setting.style]: setting.molecular_mg_L } };
    case 'quiet':
      return { quiet: { from_minute: setting.from_minute, to_minute: setting.to_minute } };
    case 'daily':
      return { daily_minute: setting.at_minute };
    case 'zone': {
      const zone = zoneNamed(setting.zone);
      return zone === undefined ? undefined : { zone };
    }
    case 'allowance':
      return { allowance_percent: setting.percent };
    case 'basis':
      return { basis: setting.basis };
    case 'yield':
      return setting.yield_L_per_100_kg === 'off' ? {} : { yield_L_per_100_kg: setting.yield_L_per_100_kg };
    case 'law':
      return { region: setting.region };
    case 'short-replies':
      return { shortReplies: setting.on };
    case 'ph-days':
      return { ph_days: setting.days };
    case 'check-days':
      return setting.of_what === 'usual' ? { usual_days: setting.days } : { often_days: setting.days };
  }
}

function unitsOf(units: Settings['units'], settings: Settings): CellarSettings {
  const { gallon, volumeUnit, temperatureUnit } = withUnits(settings, units);
  return { units, gallon, volumeUnit, temperatureUnit };
}

function usualOf(setting: Extract<Setting, { of: 'usual-additive' }>): CellarSettings | undefined {
  const { additive, strength_percent, strength_of } = setting;
  // What is usual must be told whole: a solution is none without its strength.
  if (additive.endsWith('-solution') && strength_percent === undefined) return undefined;
  if (additive === 'tablet') return undefined;
  if (strength_percent === undefined) return { usualAdditive: additive };
  return {
    usualAdditive: additive,
    usualStrength: { strength_percent, ...(strength_of && { strength_of }) },
  };
}

function settingLine(of: Setting['of'], here: Here): Line {
  const values = valuesOf(here.settings, here);
  return { ...line('first', 'setting-set'), list: [{ key: `setting-${of}`, values }] };
}

function minuteText(minute: number): string {
  return `${Math.floor(minute / 60)}:${String(minute % 60).padStart(2, '0')}`;
}

function valuesOf(settings: Settings, { memory }: Pick<Here, 'memory'>): Record<string, string> {
  const mark = memory.decimalMark ?? '.';
  const said = (value: number): string => numberText(value, 2, mark);
  const { targets, quiet, daily_minute: daily, usualStrength } = settings;
  return {
    units: settings.units,
    additive: settings.usualAdditive,
    strength: usualStrength === undefined ? 'none' : said(usualStrength.strength_percent),
    red: said(targets.red),
    white: said(targets.white),
    sweet: said(targets.sweet),
    percent: settings.allowance_percent === undefined ? 'none' : said(settings.allowance_percent),
    basis: settings.basis,
    region: settings.region,
    yield:
      settings.yield_L_per_100_kg === undefined ? 'none' : numberText(settings.yield_L_per_100_kg, 1, mark),
    zone: settings.zone ?? 'none',
    daily: daily === 'off' ? 'off' : minuteText(daily),
    from: minuteText(quiet.from_minute),
    to: minuteText(quiet.to_minute),
    days: String(settings.ph_days),
    usual: String(settings.usual_days),
    often: String(settings.often_days),
    short: settings.shortReplies ? 'short' : 'long',
  };
}
