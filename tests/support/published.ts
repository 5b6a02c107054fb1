import { join } from 'node:path';
import { loadSeries, type PublishedSeries } from '../../server/reference-data/series-file';
import { ROOT } from './root';

/** The product's own series. */
export const cpi: PublishedSeries = loadSeries(join(ROOT, 'data/series'), 'us-cpi-u');

/** The same index on the agency's older base, up to three times finer before 2007; for checks alone. */
export const cpi1967: PublishedSeries = loadSeries(join(ROOT, 'data/series'), 'us-cpi-u-1967');
