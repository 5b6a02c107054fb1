import fc from 'fast-check';
import { SAMPLE, seriesOf } from '../../../tests/support/sample-series';
import type { Period } from '../calendar/period';
import { Dec } from '../money/decimal';
import type { PlainDecimal } from '../money/money';
import { expectOk } from '../result';
import type { IndexSeries } from '../series/series';
import { restate, restatedCurve } from './restate';

const between = (amount: string, from: string, to: string, series: IndexSeries = SAMPLE) =>
  expectOk(restate({ series, amount: amount as PlainDecimal, from: from as Period, to: to as Period }));

const refusal = (from: string, to: string) => {
  const result = restate({ series: SAMPLE, amount: '1' as PlainDecimal, from: from as Period, to: to as Period });
  if (result.ok) throw new Error('expected a refusal');
  return result.error;
};

describe('a restated price', () => {
  it('gives figures, factor, bands and basis of one sum', () => {
    // 169.95 × 335.123 ÷ 14.7, and its bands, computed apart with Python's decimal module
    expect(between('169.95', '1941', '2026-05')).toEqual({
      from: { period: '1941', index: '14.7' },
      to: { period: '2026-05', index: '335.123' },
      factor: '22.79748299319727891156462585034013605442',
      original: '169.95',
      restated: '3874.43',
      precisionAmount: '3870',
      rounding: { low: '3861.29', high: '3887.66' },
      withinYear: { low: '3674.46', high: '4039.30' },
      basis:
        'Price × 335.123 (May 2026) ÷ 14.7 (1941 average); US Bureau of Labor Statistics, CPI-U, some figures, ' +
        'CUUR0000SA0, 1982-84=100; release 2026-05.',
    });
  });

  it('rounds once, at the end, half away from zero', () => {
    const series = seriesOf({ 1901: '10.0', 1902: '10.5' });
    expect(between('0.10', '1901', '1902', series).restated).toBe('0.11'); // 0.105
    expect(between('0.3', '1901', '1902', series).restated).toBe('0.32'); // 0.315
  });

  it('takes half a unit of each figure’s own last decimal', () => {
    const series = seriesOf({ 1901: '10.0', 1902: '20.000' });
    const { rounding } = between('1000', '1901', '1902', series);
    expect(rounding).toEqual({ low: '1990.00', high: '2010.10' }); // 1000 × 19.9995 ÷ 10.05, 1000 × 20.0005 ÷ 9.95
  });

  it('keeps the amount as it was given, without leading zeros', () => {
    expect(between('39.95', '1941', '2024').original).toBe('39.95');
    expect(between('0039.9', '1941', '2024').original).toBe('39.9');
    expect(between('0.0625', '1941', '2024').original).toBe('0.0625');
  });

  it('has no band within the year for a price dated by a month', () => {
    expect(between('29.95', '1939-09', '2024-12').withinYear).toBeNull();
  });

  it('has no band within the year where no month of it was published', () => {
    expect(between('29.95', '1929', '2024-12').withinYear).toBeNull();
  });

  it('leaves a target year as it is: only the year paid varies', () => {
    const { withinYear } = between('100', '1941', '1929');
    expect(withinYear).toEqual({ low: '110.32', high: '121.28' }); // × 17.1 ÷ 15.5 and ÷ 14.1
    expect(between('100', '1929', '1941').withinYear).toBeNull();
  });

  it('names the note of a figure that has one', () => {
    expect(between('1', '1941', '2025').basis).toContain('; 2025 average: of eleven months.');
    expect(between('1', '2025', '2025').basis.match(/eleven/g)).toHaveLength(1);
  });

  it.each(['1941', '1941-05', '2025'])('between equal periods (%s) is unchanged, with closed bands', (period) => {
    const same = between('29.95', period, period);
    expect(same).toMatchObject({ factor: '1', restated: '29.95', precisionAmount: '29.95' });
    expect(same.rounding).toEqual({ low: '29.95', high: '29.95' });
    expect(same.withinYear).toEqual(period.length === 4 ? { low: '29.95', high: '29.95' } : null);
  });
});

describe('a price that cannot be restated', () => {
  it.each([
    ['2025-10', 'never-published', ['2025-09', '2025-11']],
    ['1931', 'never-published', ['1929', '1933']],
    ['1941-Q3', 'never-published', ['1941-07', '1941-09']],
    ['2026', 'no-annual-average', ['2025']],
    ['2026-06', 'not-yet-published', ['2026-05']],
    ['2027', 'not-yet-published', ['2025']],
    ['1912', 'before-series', ['1929']],
    ['1913-01', 'before-series', ['1939-09']],
  ])('is refused for %s (%s) with the nearest published', (period, reason, neighbours) => {
    expect(refusal(period, '2024')).toEqual({
      code: 'period-not-published',
      which: 'from',
      period,
      reason,
      neighbours,
    });
    expect(refusal('2024', period)).toMatchObject({ which: 'to', period, reason, neighbours });
  });

  it('names the earlier period first when both are missing', () => {
    expect(refusal('1912', '2025-10')).toMatchObject({ which: 'from', period: '1912' });
  });

  it('has no curve either', () => {
    expect(restatedCurve(SAMPLE, '1' as PlainDecimal, '2025-10' as Period)).toMatchObject({
      ok: false,
      error: { which: 'from', reason: 'never-published' },
    });
  });
});

describe('the curve', () => {
  it('holds every published annual average, oldest first, and the price itself in its own year', () => {
    const curve = expectOk(restatedCurve(SAMPLE, '29.95' as PlainDecimal, '1939' as Period));
    expect(curve.map(({ period }) => period)).toEqual([
      '1929',
      '1933',
      '1939',
      '1940',
      '1941',
      '1949',
      '2007',
      '2024',
      '2025',
    ]);
    expect(curve[2]).toEqual({ period: '1939', amount: '29.95' });
    for (const { period, amount } of curve) expect(amount).toBe(between('29.95', '1939', period).restated);
  });
});

describe('properties of restating', () => {
  const periods = fc.constantFrom(...SAMPLE.figures.keys());
  const amounts = fc
    .tuple(fc.integer({ min: 0, max: 999_999_999 }), fc.integer({ min: 0, max: 9999 }))
    .map(([units, fraction]) => `${units}.${String(fraction).padStart(4, '0')}`);

  it('the way back has the inverse factor', () => {
    fc.assert(
      fc.property(periods, periods, (from, to) => {
        const product = new Dec(between('1', from, to).factor).times(between('1', to, from).factor);
        expect(product.minus(1).abs().lt('1e-37')).toBe(true);
      }),
    );
  });

  it('there and back by unrounded factors gives the amount to the cent', () => {
    fc.assert(
      fc.property(amounts, periods, periods, (amount, from, to) => {
        const there = new Dec(amount).times(between('1', from, to).factor);
        const back = there.times(between('1', to, from).factor);
        expect(back.toFixed(4)).toBe(amount);
      }),
    );
  });

  it('more paid is never less restated', () => {
    fc.assert(
      fc.property(amounts, amounts, periods, periods, (a, b, from, to) => {
        const [less, more] = new Dec(a).lte(b) ? [a, b] : [b, a];
        const restated = [less, more].map((amount) => new Dec(between(amount, from, to).restated));
        expect(restated[0]?.lte(restated[1] ?? 0)).toBe(true);
      }),
    );
  });

  it('the rounding band holds the amount, and the rounded amount too', () => {
    fc.assert(
      fc.property(amounts, periods, periods, (amount, from, to) => {
        const { restated, rounding, precisionAmount } = between(amount, from, to);
        for (const held of [restated, precisionAmount]) {
          expect(new Dec(held).gte(rounding.low)).toBe(true);
          expect(new Dec(held).lte(rounding.high)).toBe(true);
        }
      }),
    );
  });

  it('prices fall where the index falls', () => {
    fc.assert(
      fc.property(amounts, periods, periods, (amount, from, to) => {
        const { factor, from: a, to: b, restated } = between(amount, from, to);
        const rising = new Dec(b.index).gte(a.index);
        expect(new Dec(factor).gte(1)).toBe(rising);
        if (!rising) expect(new Dec(restated).lte(new Dec(amount).toFixed(2))).toBe(true);
      }),
    );
  });

  it('whole cents between equal periods come back as they are', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 99_999_999_999 }), periods, (cents, period) => {
        const amount = new Dec(cents).div(100).toFixed(2);
        expect(between(amount, period, period)).toMatchObject({
          restated: amount,
          rounding: { low: amount, high: amount },
        });
      }),
    );
  });
});
