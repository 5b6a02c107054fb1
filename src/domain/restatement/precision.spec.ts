import fc from 'fast-check';
import { Dec } from '../money/decimal';
import { formatAbout, roundToBand } from './precision';

const within = (low: string, amount: string, high: string) =>
  roundToBand(new Dec(amount), { low: new Dec(low), high: new Dec(high) });

describe('an amount to the precision of its band', () => {
  it.each([
    ['1464.50', '1469.50', '1474.50', '1470'],
    ['1464.51', '1469.50', '1474.50', '1470'],
    ['3847.41', '3860.50', '3873.68', '3860'],
    ['673.48', '675.90', '678.34', '676'],
    ['40000', '43210', '47000', '43000'],
    ['22.64', '22.72', '22.79', '22.70'],
    ['124.25', '124.26', '124.27', '124.26'],
    ['29.95', '29.95', '29.95', '29.95'],
    ['0', '0', '0', '0.00'],
  ])('%s ≤ %s ≤ %s reads %s', (low, amount, high, expected) => {
    expect(within(low, amount, high)).toBe(expected);
  });

  it('goes by the nearer end of the band', () => {
    expect(within('1464.60', '1469.50', '1999')).toBe('1470'); // 4.90 below: whole units, which happen to end in 0
    expect(within('1464.60', '1468.50', '1999')).toBe('1469');
    expect(within('1463.50', '1468.50', '1999')).toBe('1470'); // 5.00 below: tens
  });

  it('never leaves the band, at a cent at the finest', () => {
    const amounts = fc.integer({ min: 0, max: 1_000_000_000 });
    fc.assert(
      fc.property(amounts, amounts, amounts, (base, below, above) => {
        const [amount, low, high] = [base + below, base, base + below + above].map((n) => new Dec(n).div(100));
        if (amount === undefined || low === undefined || high === undefined) throw new Error('three amounts');
        const rounded = new Dec(roundToBand(amount, { low, high }));
        expect(rounded.gte(low) && rounded.lte(high)).toBe(true);
      }),
    );
  });
});

describe('an amount for reading', () => {
  const rounding = { low: '1464.50', high: '1474.50' };

  it('says «about» at the precision of an open band', () => {
    expect(formatAbout({ restated: '1469.50', precisionAmount: '1470', rounding }, 'USD')).toBe('about $1,470');
    expect(formatAbout({ restated: '22.72', precisionAmount: '22.70', rounding }, 'USD')).toBe('about $22.70');
  });

  it('is exact where the band is closed', () => {
    const closed = { low: '29.95', high: '29.95' };
    expect(formatAbout({ restated: '29.95', precisionAmount: '29.95', rounding: closed }, 'USD')).toBe('$29.95');
  });
});
