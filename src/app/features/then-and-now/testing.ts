import type { SeriesSummary } from '../../../contracts/series';

/** Published figures of the index, as many as the specs need. Source: US Bureau of Labor Statistics, CUUR0000SA0. */
export const FIGURES = [
  { period: '1913', index: '9.9' },
  { period: '1929', index: '17.1' },
  { period: '1930', index: '16.7' },
  { period: '1933', index: '13.0' },
  { period: '1939-09', index: '14.1' },
  { period: '1940', index: '14.0' },
  { period: '1941', index: '14.7' },
  { period: '1941-01', index: '14.1' },
  { period: '1941-12', index: '15.5' },
  { period: '2007', index: '207.342' },
  { period: '2024', index: '313.689' },
  { period: '2025', index: '321.943' },
  { period: '2025-09', index: '324.800' },
  { period: '2025-11', index: '324.122' },
  { period: '2026-05', index: '335.123' },
];

export const SERIES: SeriesSummary = {
  id: 'us-cpi-u',
  title: 'CPI-U, all items, US city average, not seasonally adjusted',
  publisher: 'US Bureau of Labor Statistics',
  publisherSeriesId: 'CUUR0000SA0',
  country: 'US',
  currency: 'USD',
  base: '1982-84=100',
  first: '1913-01',
  last: '2026-05',
  lastYear: '2025',
  release: '2026-05',
  missing: ['2025-10'],
  notes: [],
  licence: 'Public domain',
  credit: 'Source: US Bureau of Labor Statistics',
};
