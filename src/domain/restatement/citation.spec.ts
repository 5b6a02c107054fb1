import { SAMPLE } from '../../../tests/support/sample-series';
import type { Period } from '../calendar/period';
import type { PlainDecimal } from '../money/money';
import { expectOk } from '../result';
import { citeRestatement } from './citation';
import { restate } from './restate';

const cite = (from: string, to: string, address?: string) =>
  citeRestatement({
    series: SAMPLE,
    restatement: expectOk(
      restate({ series: SAMPLE, amount: '169.95' as PlainDecimal, from: from as Period, to: to as Period }),
    ),
    ...(address === undefined ? {} : { address }),
  });

describe('a citation', () => {
  it('names amounts, range, sum, publisher, series, base and release, and what it is not', () => {
    expect(cite('1941', '2026-05', 'http://127.0.0.1/then-and-now?price=169.95')).toBe(
      '$169.95 of 1941 average is $3,874.43 ($3,861.29 to $3,887.66) in money of May 2026: × 335.123 ÷ 14.7, ' +
        'US Bureau of Labor Statistics, CPI-U, some figures, CUUR0000SA0, 1982-84=100, release 2026-05. ' +
        'A restated price is not what the set is worth. http://127.0.0.1/then-and-now?price=169.95',
    );
  });

  it('names no range where there is none', () => {
    expect(cite('1941', '1941')).toContain('is $169.95 in money of 1941 average:');
  });
});
