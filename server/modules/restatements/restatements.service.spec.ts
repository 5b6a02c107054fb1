import { join } from 'node:path';
import { ROOT } from '../../../tests/support/root';
import { restatedPrice } from '../../../src/contracts/sets';
import type { Period } from '../../../src/domain/calendar/period';
import { loadReferenceData } from '../../reference-data/reference-data';
import { createRestatementsService } from './restatements.service';

const service = createRestatementsService({ referenceData: loadReferenceData(join(ROOT, 'data')) });
const price = (amount: string, period: string, currency = 'USD') => ({ amount, currency, period: period as Period });

describe('a set’s price when new', () => {
  it('is restated to the newest published month, in the form a set carries', () => {
    const restated = service.restatePrice(price('169.95', '1941'));
    expect(restatedPrice.parse(restated)).toEqual(restated);
    expect(restated).toMatchObject({
      known: true,
      series: 'us-cpi-u',
      release: '2026-07',
      from: { period: '1941', index: '14.7' },
      to: { period: '2026-07', index: '333.918' },
      restated: { amount: '3860.50', currency: 'USD' },
      rounding: { low: '3847.41', high: '3873.68' },
      withinYear: { low: '3661.25', high: '4024.78' },
    });
  });

  it('is unknown, with the reason in words, where its period was not published', () => {
    expect(service.restatePrice(price('45', '1905'))).toEqual({
      known: false,
      reason: 'The index begins after 1905. The nearest published: 1913.',
      neighbours: ['1913'],
    });
  });

  it('is unknown in a currency that no index is kept for', () => {
    expect(service.restatePrice(price('45', '1941', 'GBP'))).toEqual({
      known: false,
      reason: 'No price index for GBP is kept.',
      neighbours: [],
    });
  });

  it('is a bug when it is no plain decimal', () => {
    expect(() => service.restatePrice(price('-1', '1941'))).toThrow('not-a-plain-decimal');
  });

  it('comes with its amount in every published year for the year scale', () => {
    const result = service.restateOverTime(price('169.95', '1941'));
    if (!result.ok) throw new Error(result.error.reason);
    const { curve, restatement, series } = result.value;
    expect(series.id).toBe('us-cpi-u');
    expect(restatement.restated).toBe('3860.50');
    expect([curve.at(0)?.period, curve.at(-1)?.period, curve.length]).toEqual(['1913', '2025', 113]);
    expect(curve.find(({ period }) => period === '1941')?.amount).toBe('169.95');
  });

  it('has no curve where it cannot be restated', () => {
    expect(service.restateOverTime(price('45', '2025-10'))).toEqual({
      ok: false,
      error: {
        reason: 'No figure was ever published for Oct 2025. The nearest published: Sep 2025 and Nov 2025.',
        neighbours: ['2025-09', '2025-11'],
      },
    });
  });
});
