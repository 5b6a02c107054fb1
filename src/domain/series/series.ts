import type { Period } from '../calendar/period';

/**
 * A published price index, as loaded from `data/series`. Figures are the publisher's own strings, trailing zeros kept;
 * annual averages are the *published* ones, never a mean of months.
 */
export interface IndexSeries {
  /** Our id, such as `us-cpi-u`. */
  readonly id: string;
  readonly title: string;
  readonly publisher: string;
  /** The publisher's own series id, such as `CUUR0000SA0`. */
  readonly publisherSeriesId: string;
  readonly country: string;
  readonly currency: string;
  /** The reference base, such as `1982-84=100`. */
  readonly base: string;
  /** Names the set of figures in force, such as `2026-07`. */
  readonly release: string;
  readonly licence: string;
  /** Every published figure by period (years and months), unordered. */
  readonly figures: ReadonlyMap<Period, string>;
  /** Periods inside the range that the publisher never published, such as `2025-10`. */
  readonly missing: readonly Period[];
  /** Remarks on single figures, such as on 2025's average of eleven months. */
  readonly notes: ReadonlyMap<Period, string>;
}
