import * as fc from 'fast-check';
import { moneyAxis } from './axis';
import { costAgainstWorthSentence, drawCostAgainstWorth, type CostAgainstWorthFigures } from './cost-against-worth';

const figures = (asFound: number, asRestored: number, low: number, likely: number, high: number) =>
  ({
    currency: 'USD',
    asFound,
    asRestored,
    restoredLow: null,
    restoredHigh: null,
    cost: { low, likely, high },
  }) satisfies CostAgainstWorthFigures;
const WIDE = { width: 720, narrow: false, fontSize: 13 };
const NARROW = { width: 328, narrow: true, fontSize: 13 };
const amount = fc.nat(500_000).map((n) => n / 10);
const anyFigures = fc
  .tuple(amount, amount, fc.array(amount, { minLength: 3, maxLength: 3 }), amount, amount)
  .map(([found, restored, costs, below, beyond]) => {
    const [low = 0, likely = 0, high = 0] = [...costs].sort((a, b) => a - b);
    return {
      ...figures(found, restored, low, likely, high),
      restoredLow: Math.max(0, restored - below),
      restoredHigh: restored + beyond,
    };
  });
/** Positions are rounded to a tenth. */
const NEAR = 0.35;

test('both bars begin at worth as found, and the gap spans their ends', () => {
  fc.assert(
    fc.property(anyFigures, fc.constantFrom(WIDE, NARROW), (of, measures) => {
      const d = drawCostAgainstWorth(of, measures);
      const at = (value: number) => d.axis.x1 + ((d.axis.x2 - d.axis.x1) * value) / moneyAxisEnd(of, measures.narrow);
      expect(d.cost.x).toBeCloseTo(d.origin.x, 5);
      expect(Math.abs(d.found.x + d.found.width - d.origin.x)).toBeLessThan(NEAR);
      if (d.uplift) expect(Math.abs(d.uplift.x - d.origin.x)).toBeLessThan(NEAR);
      const cost = of.asFound + of.cost.likely;
      if (d.gap?.kind === 'gain') {
        expect(of.asRestored).toBeGreaterThan(cost);
        expect(Math.abs(d.gap.x - at(cost))).toBeLessThan(NEAR);
        expect(Math.abs(d.gap.x + d.gap.width - d.mark.x)).toBeLessThan(NEAR);
      } else if (d.gap) {
        expect(cost).toBeGreaterThan(of.asRestored);
        expect(Math.abs(d.gap.x + d.gap.width - at(cost))).toBeLessThan(NEAR);
      } else expect(cost).toBe(of.asRestored);
    }),
  );
});

const moneyAxisEnd = ({ asFound, asRestored, restoredHigh, cost }: CostAgainstWorthFigures, narrow: boolean): number =>
  moneyAxis(Math.max(asFound, asRestored, restoredHigh ?? 0, asFound + cost.high), narrow ? 3 : 5).end;

test('everything stays between the ends of the axis', () => {
  fc.assert(
    fc.property(anyFigures, fc.constantFrom(WIDE, NARROW), (of, measures) => {
      const d = drawCostAgainstWorth(of, measures);
      for (const bar of [d.found, d.uplift, d.drop, d.cost, d.gap, d.range]) {
        if (bar === null) continue;
        expect(bar.width).toBeGreaterThanOrEqual(0);
        expect(bar.x).toBeGreaterThanOrEqual(d.axis.x1 - NEAR);
        expect(bar.x + bar.width).toBeLessThanOrEqual(d.axis.x2 + NEAR);
      }
      expect(d.axis.x2).toBeLessThanOrEqual(measures.width);
      expect(d.axis.labels[0]?.text).toBe('$0');
    }),
  );
});

test('an axis has round steps from zero, five at most, and reaches the largest amount', () => {
  fc.assert(
    fc.property(fc.double({ min: 0, max: 1e9, noNaN: true }), fc.constantFrom(3, 5), (largest, most) => {
      const { end, lines } = moneyAxis(largest, most);
      expect(lines[0]).toBe(0);
      expect(lines.length - 1).toBeLessThanOrEqual(most);
      expect(end).toBeGreaterThanOrEqual(largest);
    }),
  );
  expect(moneyAxis(3500)).toEqual({ end: 4000, lines: [0, 1000, 2000, 3000, 4000] });
});

test('a range or a whisker is drawn only where low and high differ', () => {
  const exact = drawCostAgainstWorth(figures(650, 2250, 1200, 1200, 1200), WIDE);
  expect([exact.range, exact.whisker]).toEqual([null, null]);
  const ranged = drawCostAgainstWorth(
    { ...figures(650, 2250, 900, 1200, 1900), restoredLow: 2000, restoredHigh: 2500 },
    WIDE,
  );
  expect(ranged.range?.width).toBeGreaterThan(0);
  expect(ranged.whisker?.x2).toBeGreaterThan(ranged.whisker?.x1 ?? Infinity);
});

test.each([
  [
    figures(650, 2250, 900, 1200, 1900),
    'costs $1,200, $900 to $1,900; it adds $1,600: that is $400 more than it costs.',
  ],
  [figures(650, 2250, 2000, 2000, 2000), 'costs $2,000; it adds $1,600: it costs $400 more than that.'],
  [figures(650, 2250, 1600, 1600, 1600), 'costs $1,600; it adds $1,600: that is even.'],
  [figures(1000, 700, 100, 100, 100), 'costs $100; it takes $300 off the worth: $400 lost in all.'],
])('is said in a sentence', (of, end) => {
  expect(costAgainstWorthSentence(of)).toContain(`The work likely ${end}`);
});
