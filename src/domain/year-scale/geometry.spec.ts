import * as fc from 'fast-check';
import { midYear, type Period } from '../calendar/period';
import { gridAmounts } from './curve';
import type { YearScaleInput, YearScaleSize } from './drawing';
import { drawYearScale } from './geometry';
import { textWidth } from './measures';

const period = (text: string) => text as Period;
const dollars = (amount: number) => `$${Math.round(amount).toLocaleString('en-US')}`;

/** A price that doubles every twenty years from 1913 to 2025. */
const curveFrom = (price: number, paid: number) =>
  Array.from({ length: 113 }, (_, i) => ({ year: 1913 + i, amount: price * 2 ** ((1913 + i - paid) / 20) }));

function input(options: { size?: YearScaleSize; width?: number; from?: string; to?: string } = {}): YearScaleInput {
  const from = period(options.from ?? '1941');
  const to = period(options.to ?? '2026-07');
  const amount = 169.95 * 2 ** ((midYear(to) - midYear(from)) / 20);
  return {
    size: options.size ?? 'glass',
    width: options.width ?? 1296,
    first: period('1913-01'),
    last: period('2026-07'),
    then: { period: from, amount: 169.95, text: '$169.95' },
    now: { period: to, amount, text: dollars(amount) },
    curve: curveFrom(169.95, midYear(from) - 0.5),
    factor: '22.4',
    multipliers: [1920, 1930, 1940, 1950].map((year) => ({ year, multiplier: '16.4' })),
    formatAmount: dollars,
  };
}

const numeralTexts = (options: Parameters<typeof input>[0]) =>
  drawYearScale(input(options)).numerals.map((numeral) => numeral.text);

describe('ticks', () => {
  it('stand at every year, taller at fives, tallest at decades', () => {
    const { ticks } = drawYearScale(input());
    expect(ticks).toHaveLength(114);
    const length = (kind: string) =>
      ticks.filter((tick) => tick.kind === kind).map((tick) => tick.y2 - tick.y1)[0] ?? 0;
    expect(length('decade')).toBeGreaterThan(length('five'));
    expect(length('five')).toBeGreaterThan(length('year'));
  });

  it('leave out the years under 4.6 px a year', () => {
    const kinds = (width: number) =>
      new Set(drawYearScale(input({ size: 'phone', width })).ticks.map((tick) => tick.kind));
    // 44 px of margins; 113.5 years between the middles of the end months
    expect(kinds(44 + Math.ceil(113.5 * 4.6))).toContain('year');
    expect(kinds(44 + Math.floor(113.4 * 4.6))).not.toContain('year');
  });
});

describe('numerals', () => {
  it('letter each decade, save the one the needle would cross', () => {
    expect(numeralTexts({ from: '1941' })).toEqual([
      '1920',
      '1930',
      '1950',
      '1960',
      '1970',
      '1980',
      '1990',
      '2000',
      '2010',
      '2020',
    ]);
    expect(numeralTexts({ from: '1955' })).toContain('1940');
  });

  it('letter every twentieth year when tight', () => {
    expect(numeralTexts({ size: 'phone', width: 390, from: '1951' })).toEqual([
      '1920',
      '1940',
      '1960',
      '1980',
      '2000',
      '2020',
    ]);
  });

  it('keep clear of the periods written under a strip', () => {
    expect(numeralTexts({ size: 'strip', width: 1020 })).not.toContain('2020');
  });

  it('are absent from a row', () => {
    expect(numeralTexts({ size: 'row', width: 190 })).toEqual([]);
  });
});

describe('the curve', () => {
  it('is dotted up to the paid period and goes on from there', () => {
    const drawing = drawYearScale(input({ from: '1941' }));
    const { x, y } = drawing.then.head;
    expect(drawing.curveBefore.endsWith(`L${x} ${y}`)).toBe(true);
    expect(drawing.curveAfter.startsWith(`M${x} ${y}`)).toBe(true);
    expect(drawing.curveAfter).toContain(`${drawing.now.head.x} ${drawing.now.head.y}`);
  });

  it('has nothing before it when the price was paid in the first period', () => {
    expect(drawYearScale(input({ from: '1913-01' })).curveBefore).toBe('');
  });

  it('opens where a year is missing', () => {
    const whole = input();
    const open = drawYearScale({ ...whole, curve: whole.curve.filter(({ year }) => year !== 1970) });
    expect(open.curveAfter.slice(1)).toContain('M');
    expect(open.area).toBe('');
    expect(drawYearScale(whole).curveAfter.slice(1)).not.toContain('M');
  });

  it('lies on the axis when the price is nothing', () => {
    const whole = input();
    const drawing = drawYearScale({
      ...whole,
      then: { ...whole.then, amount: 0 },
      now: { ...whole.now, amount: 0 },
      curve: whole.curve.map(({ year }) => ({ year, amount: 0 })),
    });
    expect(drawing.grid).toEqual([]);
    expect(drawing.now.head.y).toBe(drawing.base.y1);
  });
});

describe('grid lines', () => {
  it.each([
    [3802, [1000, 2000, 3000]],
    [5000, [1000, 2000, 3000, 4000, 5000]],
    [5999, [1000, 2000, 3000, 4000, 5000]],
    [6000, [2000, 4000, 6000]],
    [1.1, [0.2, 0.4, 0.6, 0.8, 1]],
    [0.07, [0.02, 0.04, 0.06]],
    [0, []],
  ])('up to %p stand at %p', (most, amounts) => expect(gridAmounts(most)).toEqual(amounts));

  it('are one to five, and the last is not above the most', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-4, max: 1e12, noNaN: true }), (most) => {
        const amounts = gridAmounts(most);
        expect(amounts.length).toBeGreaterThanOrEqual(1);
        expect(amounts.length).toBeLessThanOrEqual(5);
        expect(amounts.at(-1)).toBeLessThanOrEqual(most * (1 + 1e-9));
      }),
    );
  });
});

describe('the amounts', () => {
  it('stand right of the then needle and left of the now needle', () => {
    const { then, now } = drawYearScale(input());
    expect([then.amount?.anchor, now.amount?.anchor]).toEqual(['start', 'end']);
  });

  it('flip the price past 62 % of the width', () => {
    const anchor = (from: string) =>
      drawYearScale(input({ size: 'strip-narrow', width: 340, from })).then.amount?.anchor;
    expect(anchor('1982')).toBe('start');
    expect(anchor('1986')).toBe('end');
  });

  it('say how far apart they are where there is room', () => {
    expect(drawYearScale(input()).between?.labels.map((label) => label.text)).toEqual(['× 22.4', 'over 85 years']);
    expect(drawYearScale(input({ width: 700, from: '1960' })).between).toBeNull();
  });
});

it('names the second band by its period', () => {
  const { multipliers } = drawYearScale(input());
  expect(multipliers?.titles.map((title) => title.text)).toEqual(['Year', 'To Jul 2026']);
  // 1940 is crossed by the needle at 1941
  expect(multipliers?.factors).toHaveLength(3);
});

it('leaves out a multiplier that the band’s title would cross', () => {
  const factors = (width: number) => drawYearScale(input({ width })).multipliers?.factors.map(({ x }) => x) ?? [];
  expect(factors(1296)).toHaveLength(3);
  expect(factors(700)).toEqual([]); // 1920 alone is lettered and has one
});

it('puts the amounts in the order of their needles when both stand on one period', () => {
  const { then, now } = drawYearScale(input({ from: '1941', to: '1941' }));
  expect(then.amount!.x).toBeLessThan(now.amount!.x);
  expect(then.tag!.x).toBeLessThan(now.tag!.x);
});

it('says itself in a sentence', () => {
  const whole = input();
  expect(drawYearScale({ ...whole, now: { ...whole.now, text: '$3,802' } }).sentence).toBe(
    'Year scale from 1913 to Jul 2026. $169.95 paid in 1941 is restated to $3,802 in Jul 2026.',
  );
});

describe('any two periods', () => {
  const anyPeriod = fc
    .tuple(fc.integer({ min: 1913, max: 2025 }), fc.option(fc.integer({ min: 1, max: 12 })))
    .map(([year, month]) => (month === null ? `${year}` : `${year}-${String(month).padStart(2, '0')}`));
  const sized = fc.oneof(
    fc.record({ size: fc.constant<YearScaleSize>('glass'), width: fc.integer({ min: 640, max: 1500 }) }),
    fc.record({ size: fc.constant<YearScaleSize>('phone'), width: fc.integer({ min: 320, max: 640 }) }),
  );

  it('keep tags inside and off each other, and amounts on the drawing', () => {
    fc.assert(
      fc.property(sized, anyPeriod, anyPeriod, (size, from, to) => {
        const { then, now, width } = drawYearScale(input({ ...size, from, to }));
        const tags = [then.tag!, now.tag!].sort((a, b) => a.x - b.x);
        expect(tags[0]!.x).toBeGreaterThanOrEqual(8);
        expect(tags[1]!.x + tags[1]!.width).toBeLessThanOrEqual(width - 7.9);
        expect(tags[0]!.x + tags[0]!.width).toBeLessThanOrEqual(tags[1]!.x);
        for (const amount of [then.amount!, now.amount!]) {
          const wide = textWidth(amount.text, amount.size);
          const start = amount.anchor === 'start' ? amount.x : amount.x - wide;
          expect(start).toBeGreaterThanOrEqual(0);
          expect(start + wide).toBeLessThanOrEqual(width);
        }
      }),
      { numRuns: 300 },
    );
  });

  it('never print one amount over the other', () => {
    fc.assert(
      fc.property(sized, anyPeriod, anyPeriod, (size, from, to) => {
        const { then, now } = drawYearScale(input({ ...size, from, to }));
        const box = (label: NonNullable<typeof then.amount>) => {
          const wide = textWidth(label.text, label.size);
          const start = label.anchor === 'start' ? label.x : label.x - wide;
          return { start, end: start + wide, top: label.y - label.size * 0.8, foot: label.y };
        };
        const [a, b] = [box(then.amount!), box(now.amount!)];
        expect(a.end <= b.start || b.end <= a.start || a.foot <= b.top || b.foot <= a.top).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  it('stand in their order on the axis, heads between the plot’s top and its foot', () => {
    fc.assert(
      fc.property(sized, anyPeriod, anyPeriod, (size, from, to) => {
        const drawing = drawYearScale(input({ ...size, from, to }));
        const order = Math.sign(midYear(period(to)) - midYear(period(from)));
        // a tenth of a px may round two neighbours onto one place, never past each other
        expect(Math.sign(drawing.now.head.x - drawing.then.head.x) * order).toBeGreaterThanOrEqual(0);
        for (const needle of [drawing.then, drawing.now]) expect(needle.head.y).toBeLessThanOrEqual(drawing.base.y1);
      }),
    );
  });
});
