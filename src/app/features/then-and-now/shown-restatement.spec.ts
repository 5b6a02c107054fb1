import { toIndexSeries } from '../../../contracts/series';
import type { Period } from '../../../domain/calendar/period';
import type { PlainDecimal } from '../../../domain/money/money';
import { restate } from '../../../domain/restatement/restate';
import { expectOk } from '../../../domain/result';
import { citation } from './citation';
import {
  formatBand,
  formatFactor,
  formatFigure,
  formatPrice,
  formatPurchasingPower,
  roundedFrom,
  type ShownRestatement,
} from './shown-restatement';
import { FIGURES, SERIES } from './testing';

function shown(amount: string, from: string, to: string): ShownRestatement {
  const series = toIndexSeries(SERIES, FIGURES);
  const value = expectOk(restate({ series, amount: amount as PlainDecimal, from: from as Period, to: to as Period }));
  return { ...value, series: SERIES.id, release: SERIES.release, currency: 'USD' };
}

it('shows whole dollars from a hundred up, cents below', () => {
  const large = shown('169.95', '1941', '2026-05');
  expect(formatFigure(large, large.restated)).toBe('$3,874');
  expect(formatBand(large, large.rounding)).toBe('$3,861 to $3,888');
  const small = shown('0.25', '1941', '2026-05');
  expect(formatFigure(small, small.restated)).toBe('$5.70');
});

it.each([
  ['22.797483', '× 22.80'],
  ['0.04386', '× 0.04386'],
  ['1', '× 1.00'],
])('writes the factor %s as %s', (factor, text) => expect(formatFactor(factor)).toBe(text));

it.each([
  ['0.0439', '4.4¢'],
  ['1.3154', '$1.32'],
])('writes what a dollar buys, %s, as %s', (amount, text) => expect(formatPurchasingPower(amount, 'USD')).toBe(text));

it.each([
  ['14.7', '14.65 to 14.75'],
  ['335.123', '335.1225 to 335.1235'],
  ['100', '99.5 to 100.5'],
])('says what the published figure %s stands for', (index, text) => expect(roundedFrom(index)).toBe(text));

it('keeps every decimal of a price', () => {
  expect(formatPrice('1250.5', 'USD')).toBe('$1,250.50');
  expect(formatPrice('1250.0125', 'USD')).toBe('$1,250.0125');
});

it('cites publisher, series, release, figures, bands, date and address', () => {
  const text = citation({
    shown: shown('29.95', '1939-09', '2026-05'),
    series: SERIES,
    workedOutOn: '2026-12-01',
    address: 'http://localhost/then-and-now?amount=29.95',
  });
  expect(text).toBe(
    'US Bureau of Labor Statistics, CPI-U, all items, US city average, not seasonally adjusted, series CUUR0000SA0, ' +
      '1982-84=100, release 2026-05. Index Sep 1939: 14.1; May 2026: 335.123. $29.95 in Sep 1939 is $711.84 in May 2026 ' +
      '(factor 23.7675886525; $709.32 to $714.37 by the rounding of the index). ' +
      'Worked out with Thenworth, 1 Dec 2026: http://localhost/then-and-now?amount=29.95',
  );
});
