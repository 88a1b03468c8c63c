/**
 * The bot's own words that a platform lists behind a slash, the same in every language: whoever taps one has chosen no
 * language by it. `start` is what Telegram itself sends first.
 */
export const LISTED_COMMANDS = ['start', 'today', 'due', 'vessels', 'open', 'settings', 'help'] as const;
