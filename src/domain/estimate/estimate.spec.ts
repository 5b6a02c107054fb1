import * as fc from 'fast-check';
import { Dec } from '../money/decimal';
import { centsToDecimal } from '../money/money';
import { expectedHours, isTooLarge, LARGEST_NET, lineNet, marginOfMarkup, MOST_LINES, type Line } from './line';
import { LINE_KINDS, STAGES, TAX_TREATMENTS } from './terms';
import { estimateTotals, percentOf, taxPerItem, type Terms } from './totals';

const TERMS: Terms = { currency: 'USD', taxTreatment: 'both', taxRatePercent: '6.875', depositPercent: '40' };

const hundredths = (most: number) => fc.integer({ min: 0, max: most }).map((n) => (n / 100).toFixed(2));
const percent = fc.integer({ min: 0, max: 2_000_000 }).map((n) => new Dec(n).div(10_000).toFixed());
const threePoints = fc
  .tuple(fc.nat(5000), fc.nat(5000), fc.nat(5000))
  .map((n) => [...n].sort((a, b) => a - b).map((h) => (h / 100).toFixed(2)))
  .map(([low = '', likely = '', high = '']) => ({ low, likely, high }));
const line: fc.Arbitrary<Line> = fc.oneof(
  fc.record({
    kind: fc.constant('labour' as const),
    stage: fc.constantFrom(...STAGES),
    description: fc.constant('x'),
    hours: threePoints,
    rate: hundredths(50_000),
  }),
  fc.record({
    kind: fc.constant('part' as const),
    stage: fc.constantFrom(...STAGES),
    description: fc.constant('x'),
    quantity: fc.integer({ min: 0, max: 99_999 }).map((n) => new Dec(n).div(1000).toFixed()),
    unitCost: fc.integer({ min: 0, max: 9_999_999 }).map((n) => new Dec(n).div(10_000).toFixed()),
    markupPercent: percent,
  }),
  fc.record({
    kind: fc.constant('outside' as const),
    stage: fc.constantFrom(...STAGES),
    description: fc.constant('x'),
    quote: hundredths(999_999),
    markupPercent: percent,
  }),
);
const lines = fc.array(line, { maxLength: 30 });
const terms = fc.record({
  currency: fc.constant('USD'),
  taxTreatment: fc.constantFrom(...TAX_TREATMENTS),
  taxRatePercent: percent,
  depositPercent: fc.constantFrom('0', '40', '100'),
});

describe('a line', () => {
  const placed = { stage: 'signal', description: 'x' } as const;
  const hours = { low: '3.50', likely: '4.50', high: '6.50' };
  test('labour is hours × rate at each point', () => {
    const labour: Line = { kind: 'labour', ...placed, hours, rate: '68.00' };
    expect((['low', 'likely', 'high'] as const).map((p) => centsToDecimal(lineNet(labour, p)))).toEqual([
      '238.00',
      '306.00',
      '442.00',
    ]);
  });
  test('a part is quantity × cost × (1 + markup), rounded once at the end', () => {
    // 3 × 0.335 = 1.005, × 1.5 = 1.5075: rounding the cost or the unit price first would give 1.53 or 1.50
    const part: Line = { kind: 'part', ...placed, quantity: '3', unitCost: '0.335', markupPercent: '50' };
    expect(lineNet(part, 'likely')).toBe(151);
    expect(lineNet({ ...part, quantity: '1', unitCost: '0.01', markupPercent: '50' }, 'low')).toBe(2); // 0.015
  });
  test('outside work is the quote × (1 + markup), the same at every point', () => {
    const outside: Line = { kind: 'outside', ...placed, quote: '150.00', markupPercent: '10' };
    expect([lineNet(outside, 'low'), lineNet(outside, 'high')]).toEqual([16_500, 16_500]);
  });
  test('comes to nine digits at most, at its high hours', () => {
    const labour: Line = { kind: 'labour', ...placed, hours, rate: '153846153.84' };
    expect([isTooLarge(labour), isTooLarge({ ...labour, rate: '153846153.85' })]).toEqual([false, true]);
    const part: Line = { kind: 'part', ...placed, quantity: '999999', unitCost: '999999999', markupPercent: '999' };
    expect(isTooLarge(part)).toBe(true); // though too large for exact cents, it throws nothing
  });
  test('expected hours are the mean of the three points', () => {
    expect(expectedHours(hours)).toBe('4.67');
    expect(expectedHours({ low: '2', likely: '2', high: '2' })).toBe('2.00');
  });
});

describe('an estimate', () => {
  test('of no lines is nothing', () => {
    expect(estimateTotals([], TERMS)).toMatchObject({
      likely: { total: '0.00', tax: '0.00' },
      deposit: '0.00',
      stages: [],
      hours: { likely: '0.00' },
    });
  });

  test.each([
    ['none', '0.00', '0.00'],
    ['parts', '100.00', '6.88'],
    ['labour', '1010.00', '69.44'],
    ['both', '1110.00', '76.31'],
  ] as const)('taxed on %s: taxable %s, tax %s', (taxTreatment, taxable, tax) => {
    const all: Line[] = [
      { kind: 'labour', stage: 'test', description: 'x', hours: { low: '1', likely: '10', high: '20' }, rate: '90.00' },
      { kind: 'part', stage: 'test', description: 'x', quantity: '1', unitCost: '100', markupPercent: '0' },
      { kind: 'outside', stage: 'test', description: 'x', quote: '110.00', markupPercent: '0' },
    ];
    expect(estimateTotals(all, { ...TERMS, taxTreatment }).likely).toMatchObject({ subtotal: '1110.00', taxable, tax });
  });

  test('of the most and largest lines still adds up in exact cents', () => {
    const largest: Line = {
      kind: 'outside',
      stage: 'test',
      description: 'x',
      quote: LARGEST_NET,
      markupPercent: '0',
    };
    const all = Array<Line>(MOST_LINES).fill(largest);
    expect(estimateTotals(all, { ...TERMS, taxRatePercent: '999.9999' }).high).toMatchObject({
      subtotal: '999999999990.00',
      tax: '9999998999900.00',
      total: '10999998999890.00',
    });
  });

  test('whose sums agree, whatever its lines', () => {
    fc.assert(
      fc.property(lines, terms, (all, under) => {
        const totals = estimateTotals(all, under);
        for (const { labour, parts, outside, subtotal, taxable, tax, total } of [
          totals.low,
          totals.likely,
          totals.high,
        ]) {
          expect(new Dec(labour).plus(parts).plus(outside).toFixed(2)).toBe(subtotal);
          expect(new Dec(subtotal).plus(tax).toFixed(2)).toBe(total);
          expect(centsToDecimal(percentOf(taxable, under.taxRatePercent))).toBe(tax);
        }
        const stages = totals.stages.reduce((sum, { subtotal }) => sum.plus(subtotal), new Dec(0));
        expect(stages.toFixed(2)).toBe(totals.likely.subtotal);
        const [low, likely, high] = [totals.low, totals.likely, totals.high].map(({ total }) => new Dec(total));
        expect(low?.lte(likely ?? 0) && likely?.lte(high ?? 0)).toBe(true);
      }),
    );
  });

  test('does not depend on the order of its lines', () => {
    fc.assert(
      fc.property(lines, terms, (all, under) => {
        expect(estimateTotals([...all].reverse(), under)).toEqual(estimateTotals(all, under));
      }),
    );
  });

  test('costs more with one more line, never less', () => {
    fc.assert(
      fc.property(lines, line, terms, (all, more, under) => {
        const [before, after] = [estimateTotals(all, under), estimateTotals([...all, more], under)];
        return new Dec(after.likely.total).gte(before.likely.total);
      }),
    );
  });

  test('taxes every kind of line under exactly one of parts and labour', () => {
    for (const kind of LINE_KINDS) {
      const one: Line =
        kind === 'labour'
          ? { kind, stage: 'test', description: 'x', hours: { low: '1', likely: '1', high: '1' }, rate: '10' }
          : kind === 'part'
            ? { kind, stage: 'test', description: 'x', quantity: '1', unitCost: '10', markupPercent: '0' }
            : { kind, stage: 'test', description: 'x', quote: '10', markupPercent: '0' };
      const taxable = (['parts', 'labour'] as const).map(
        (t) => estimateTotals([one], { ...TERMS, taxTreatment: t }).likely.taxable,
      );
      expect([...taxable].sort()).toEqual(['0.00', '10.00']);
    }
  });
});

test('tax by the item can differ from tax on the sum by cents', () => {
  expect([taxPerItem(['1.99', '1.99', '1.99'], '7.25'), percentOf('5.97', '7.25')]).toEqual([42, 43]);
});

test('a markup names the margin it amounts to', () => {
  expect(['25', '50', '100', '0', '30'].map(marginOfMarkup)).toEqual(['20', '33.33', '50', '0', '23.08']);
});

test('no markup amounts to a margin of the whole price', () => {
  fc.assert(fc.property(percent, (markup) => new Dec(marginOfMarkup(markup)).lt(100)));
});
