import type { RecentMessage } from './demo-message.ts';

/** What the invented cellar has done today: in the last hour, so that there is a day sheet whenever one looks. */
export const LAST_HOUR: readonly RecentMessage[] = [
  { back_min: 55, by: 'Nora', text: 'T1 now free 23 total 106 pH 3.34' },
  { back_min: 40, by: 'Ines', text: 'order T1 90 g kmbs' },
  { back_min: 25, by: 'Tomas', text: 'added 90 g kmbs T1 lot 4502' },
  { back_min: 10, by: 'Nora', text: 'T5 now free 2 pH 3.42' },
  { back_min: 4, by: 'Tomas', text: 'topped B1' },
  { back_min: 1, by: 'Tomas', text: 'added 200 g bentonite T5' },
];
