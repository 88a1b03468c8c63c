import type { Category, Product, Stage, Style } from '../wine.ts';
import type { Region } from './region.ts';

/** What the law asks about a wine. What is unknown is taken at its strictest, and said. */
export interface LimitFacts {
  /** The market; the international code where none is said. */
  readonly region?: Region;
  readonly style?: Style;
  /** Of the basis that the region's law names. */
  readonly sugar_g_L?: number;
  readonly category?: Category;
  readonly product?: Product;
  readonly stage?: Stage;
  readonly alcohol_percent?: number;
  /** `made-with`: only in the US, a wine "made with organic grapes". */
  readonly organic?: boolean | 'made-with';
  /** The class of sweet wines that it belongs to, by the figure that the law gives it (300, 350, 400): only when said. */
  readonly designated_mg_L?: number;
  /** The authority has declared the year a bad one: only when said. */
  readonly uplift?: boolean;
  /** Of a sparkling wine: of the class that the law calls quality. */
  readonly quality?: boolean;
  /** For a limit by mass. */
  readonly density_kg_L?: number;
  /** In the UK: a wine of the national scheme for protected names. */
  readonly pdo?: boolean;
  /** In South Africa: bulk wine for export. */
  readonly bulk?: boolean;
}
