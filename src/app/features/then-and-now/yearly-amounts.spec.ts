import { toIndexSeries } from '../../../contracts/series';
import type { Period } from '../../../domain/calendar/period';
import { FIGURES, SERIES } from './testing';
import { amountsByMonth, amountsByYear, bridges } from './yearly-amounts';

const charted = { series: toIndexSeries(SERIES, FIGURES), amount: '169.95', from: '1941' as Period };

it('restates to every published year and to the newest month of a year without an average', () => {
  const amounts = amountsByYear(charted);
  expect(amounts.map(({ period }) => period)).toEqual([
    '1913',
    '1929',
    '1930',
    '1933',
    '1940',
    '1941',
    '2007',
    '2024',
    '2025',
    '2026-05',
  ]);
  expect(amounts.find(({ period }) => period === '1941')?.amount).toBe('169.95');
  expect(amounts.at(-1)?.amount).toBe('3874.43');
});

it('leaves a month open that was never published, and bridges it between its neighbours', () => {
  const amounts = amountsByMonth(charted);
  expect(amounts.find(({ period }) => period === '2025-10')?.amount).toBeNull();
  expect(amounts.at(-1)?.period).toBe('2026-05');
  const bridge = bridges(amounts).find(([before]) => before.period === '2025-09');
  expect(bridge?.map(({ period }) => period)).toEqual(['2025-09', '2025-11']);
});

it('bridges nothing before the first and after the last published amount', () => {
  const open = { time: 0, amount: null };
  const known = { time: 1, amount: '1.00' };
  const period = (text: string) => text as Period;
  expect(
    bridges([
      { ...open, period: period('2025-01') },
      { ...known, period: period('2025-02') },
      { ...open, period: period('2025-03') },
    ]),
  ).toEqual([]);
});
