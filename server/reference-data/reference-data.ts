import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { loadSeries, type PublishedSeries } from './series-file';

/** The published figures the product works with, checked at the start and unchangeable after. */
export interface ReferenceData {
  /** The series that prices are restated by, in the order of their ids. */
  readonly list: readonly PublishedSeries[];
  /** One of `list`; undefined for any other id. */
  readonly seriesById: (id: string) => PublishedSeries | undefined;
  /** The series for prices in a currency; undefined where none is kept. */
  readonly seriesByCurrency: (currency: string) => PublishedSeries | undefined;
}

/**
 * Reads and checks every series of `<dataFolder>/series`. Series of a finer old base are checked too, and left out:
 * no figure of the product comes from them.
 * Throws naming the file, the line and what would do, when anything is not as its meta record says.
 */
export function loadReferenceData(dataFolder: string): ReferenceData {
  const folder = join(dataFolder, 'series');
  const ids = readdirSync(folder)
    .filter((file) => file.endsWith('.json'))
    .map((file) => file.slice(0, -'.json'.length))
    .sort();
  const list = Object.freeze(ids.map((id) => loadSeries(folder, id)).filter((series) => series.role === 'primary'));
  if (list.length === 0) throw new Error(`${folder} holds no series to restate prices by.`);
  return Object.freeze({
    list,
    seriesById: (id: string) => list.find((series) => series.id === id),
    seriesByCurrency: (currency: string) => list.find((series) => series.currency === currency),
  });
}
