// Made from locales/en.ftl by `node .ci/sentence-keys.ts`: change the locale, not this file.
import type { SentenceKey } from './sentence-keys.ts';

// prettier-ignore
/** The sentences of help by topic, each topic a screen, in the order in which they are said. */
export const HELP_KEYS: Readonly<Record<string, readonly SentenceKey[]>> = {
  wine: ['help-wine-1', 'help-wine-2', 'help-wine-3', 'help-wine-4', 'help-wine-5', 'help-wine-6', 'help-wine-7', 'help-wine-8', 'help-wine-9'],
  must: ['help-must-1', 'help-must-2', 'help-must-3', 'help-must-4', 'help-must-5', 'help-must-6', 'help-must-7'],
  bottling: ['help-bottling-1', 'help-bottling-2', 'help-bottling-3', 'help-bottling-4', 'help-bottling-5', 'help-bottling-6'],
  solutions: ['help-solutions-1', 'help-solutions-2', 'help-solutions-3', 'help-solutions-4', 'help-solutions-5', 'help-solutions-6', 'help-solutions-7'],
  law: ['help-law-1', 'help-law-2', 'help-law-3', 'help-law-4', 'help-law-5', 'help-law-6', 'help-law-7', 'help-law-8', 'help-law-9'],
  round: ['help-round-1', 'help-round-2', 'help-round-3', 'help-round-4', 'help-round-5', 'help-round-6', 'help-round-7', 'help-round-8'],
  stock: ['help-stock-1', 'help-stock-2', 'help-stock-3', 'help-stock-4', 'help-stock-5', 'help-stock-6', 'help-stock-7', 'help-stock-8'],
  log: ['help-log-1', 'help-log-2', 'help-log-3', 'help-log-4', 'help-log-5', 'help-log-6', 'help-log-7', 'help-log-8'],
  vessels: ['help-vessels-1', 'help-vessels-2', 'help-vessels-3', 'help-vessels-4', 'help-vessels-5', 'help-vessels-6', 'help-vessels-7', 'help-vessels-8', 'help-vessels-9', 'help-vessels-10'],
  reminders: ['help-reminders-1', 'help-reminders-2', 'help-reminders-3', 'help-reminders-4', 'help-reminders-5', 'help-reminders-6'],
  settings: ['help-settings-1', 'help-settings-2', 'help-settings-3', 'help-settings-4', 'help-settings-5', 'help-settings-6', 'help-settings-7', 'help-settings-8'],
  pictures: ['help-pictures-1', 'help-pictures-2'],
  files: ['help-files-1', 'help-files-2', 'help-files-3', 'help-files-4'],
  people: ['help-people-1', 'help-people-2', 'help-people-3', 'help-people-4', 'help-people-5', 'help-people-6', 'help-people-7'],
  lab: ['help-lab-1', 'help-lab-2', 'help-lab-3', 'help-lab-4', 'help-lab-5', 'help-lab-6', 'help-lab-7', 'help-lab-8'],
  forecast: ['help-forecast-1', 'help-forecast-2', 'help-forecast-3', 'help-forecast-4', 'help-forecast-5', 'help-forecast-6', 'help-forecast-7'],
};
