import type { Period } from '../../src/domain/calendar/period';
import type { IndexSeries } from '../../src/domain/series/series';

/** Some published figures of the US CPI-U (Bureau of Labor Statistics, CUUR0000SA0), enough for the domain's examples. */
const FIGURES: readonly (readonly [string, string])[] = [
  ['1929', '17.1'],
  ['1933', '13.0'],
  ['1939', '13.9'],
  ['1940', '14.0'],
  ['1941', '14.7'],
  ['1949', '23.8'],
  ['2007', '207.342'],
  ['2024', '313.689'],
  ['2025', '321.943'],
  ['1939-09', '14.1'],
  ['1941-01', '14.1'],
  ['1941-02', '14.1'],
  ['1941-03', '14.2'],
  ['1941-04', '14.3'],
  ['1941-05', '14.4'],
  ['1941-06', '14.7'],
  ['1941-07', '14.7'],
  ['1941-08', '14.9'],
  ['1941-09', '15.1'],
  ['1941-10', '15.3'],
  ['1941-11', '15.4'],
  ['1941-12', '15.5'],
  ['2024-12', '315.605'],
  ['2025-09', '324.800'],
  ['2025-11', '324.122'],
  ['2025-12', '324.054'],
  ['2026-04', '333.020'],
  ['2026-05', '335.123'],
];

export const SAMPLE: IndexSeries = {
  id: 'sample',
  title: 'CPI-U, some figures',
  publisher: 'US Bureau of Labor Statistics',
  publisherSeriesId: 'CUUR0000SA0',
  country: 'US',
  currency: 'USD',
  base: '1982-84=100',
  release: '2026-05',
  licence: 'Public domain',
  figures: new Map(FIGURES as readonly (readonly [Period, string])[]),
  missing: ['2025-10' as Period],
  notes: new Map([['2025' as Period, '2025 average: of eleven months']]),
};

/** The sample with other figures, such as two invented ones for a single rule. */
export const seriesOf = (figures: Readonly<Record<string, string>>): IndexSeries => ({
  ...SAMPLE,
  figures: new Map(Object.entries(figures) as [Period, string][]),
  missing: [],
  notes: new Map(),
});
