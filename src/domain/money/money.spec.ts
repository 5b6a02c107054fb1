import * as fc from 'fast-check';
import { Dec } from './decimal';
import { cents, centsToDecimal, formatCents, formatMoney, parsePlainDecimal, sumCents, toCents } from './money';
import { percentToPpm, ppmToPercent, scaled, unscaled } from './scaled';

const anyCents = fc.integer({ min: -1e12, max: 1e12 });

describe('amounts as typed', () => {
  test.each(['0', '39.95', '123456789', '0.0001', '999999999.9999'])('%s is one', (text) => {
    expect(parsePlainDecimal(text)).toEqual({ ok: true, value: text });
  });
  test.each(['', ' 1', '-1', '+1', '1e3', '1,000', '.5', '5.', '1234567890', '1.00000', '١', 'NaN', '0x10', '1\n'])(
    '%j is none',
    (text) => {
      expect(parsePlainDecimal(text)).toMatchObject({ ok: false, error: { code: 'not-a-plain-decimal', text } });
    },
  );
});

describe('minor units', () => {
  test.each([
    ['0.005', 1],
    ['-0.005', -1],
    ['2.675', 268],
    ['1.005', 101],
    ['0.0049999', 0],
    ['999999999.995', 100_000_000_000],
  ])('%s rounds half away from zero to %i', (amount, expected) => {
    expect(toCents(amount)).toBe(expected);
  });
  test('there is no minus zero', () => {
    expect(Object.is(toCents('-0.001'), 0)).toBe(true);
    expect(centsToDecimal(toCents('-0.001'))).toBe('0.00');
  });
  test('fractions and numbers too large to count are bugs', () => {
    expect(() => cents(0.5)).toThrow(RangeError);
    expect(() => cents(2 ** 53)).toThrow(RangeError);
    expect(() => sumCents([cents(Number.MAX_SAFE_INTEGER), cents(1)])).toThrow(RangeError);
  });
  test('as a decimal and back is the same', () => {
    fc.assert(fc.property(anyCents, (n) => toCents(centsToDecimal(cents(n))) === n));
  });
  test('a sum does not depend on the order', () => {
    fc.assert(
      fc.property(fc.array(anyCents, { maxLength: 50 }), (all) => {
        const amounts = all.map(cents);
        return sumCents(amounts) === sumCents([...amounts].reverse());
      }),
    );
  });
});

describe('amounts for reading', () => {
  test.each([
    ['1234567.5', {}, '$1,234,567.50'],
    ['1465', { whole: true }, '$1,465'],
    ['-355', { whole: true }, '−$355'],
    ['135.4', { whole: true, signed: true }, '+$135'],
    ['0', { signed: true }, '$0.00'],
    ['-0.4', { whole: true, signed: true }, '$0'],
    ['999.5', { whole: true }, '$1,000'],
    ['-2.5', { whole: true }, '−$3'],
    ['12345678901234567890.125', {}, '$12,345,678,901,234,567,890.13'],
  ])('%s with %j reads %s', (amount, options, text) => {
    expect(formatMoney(amount, 'USD', options)).toBe(text);
  });
  test('other currencies carry their own sign', () => {
    expect(formatMoney('5', 'GBP')).toBe('£5.00');
    expect(formatMoney('5', 'XYZ')).toBe('XYZ 5.00');
    expect(formatCents(cents(-12345), 'USD')).toBe('−$123.45');
  });
});

describe('stored whole numbers', () => {
  test('percentages are parts per million', () => {
    expect([percentToPpm('7.25'), percentToPpm('100'), percentToPpm('0.0001')]).toEqual([72_500, 1_000_000, 1]);
    expect([ppmToPercent(72_500), ppmToPercent(0)]).toEqual(['7.25', '0']);
  });
  test('what does not fit is a bug', () => {
    expect(() => scaled('0.00001', 4)).toThrow(RangeError);
    expect(() => scaled('99999999999999999999', 4)).toThrow(RangeError);
  });
  test('there and back is the same', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 1e12 }),
        fc.integer({ min: 0, max: 4 }),
        (n, d) => scaled(unscaled(n, d), d) === n,
      ),
    );
  });
});

test('the private constructor keeps 40 digits and never writes an exponent', () => {
  expect(new Dec(1).div(3).toString()).toHaveLength(42);
  expect(new Dec('1e-30').toString()).not.toContain('e');
});
