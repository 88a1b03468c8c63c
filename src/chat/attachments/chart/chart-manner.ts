import type { Telling } from '../../replies/moment-text.ts';
import type { DecimalMark } from '../../replies/number-text.ts';

/** How a picture and the text beside it tell days and figures. */
export interface ChartManner {
  readonly telling: Telling;
  readonly mark: DecimalMark;
  readonly unit: 'mg/L' | 'ppm';
}
