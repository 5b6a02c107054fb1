import { formatMoney } from '../money/money';
import { textWidth } from '../year-scale/measures';
import { moneyAxis } from './axis';

/** Amounts in currency units. */
export interface CostAgainstWorthFigures {
  readonly currency: string;
  readonly asFound: number;
  readonly asRestored: number;
  readonly restoredLow: number | null;
  readonly restoredHigh: number | null;
  readonly cost: { readonly low: number; readonly likely: number; readonly high: number };
}

/** A horizontal bar in the drawing's units (CSS px on screen, points on paper). */
export interface Bar {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

export interface AxisText {
  readonly x: number;
  readonly y: number;
  readonly text: string;
  readonly anchor: 'start' | 'middle' | 'end';
}

export interface CostAgainstWorthDrawing {
  readonly width: number;
  readonly height: number;
  readonly grid: readonly { readonly x: number; readonly y1: number; readonly y2: number }[];
  readonly axis: { readonly y: number; readonly x1: number; readonly x2: number; readonly labels: readonly AxisText[] };
  /** Row names. */
  readonly rows: readonly AxisText[];
  readonly found: Bar;
  /** As restored beyond as found; null where the set would be worth no more. */
  readonly uplift: Bar | null;
  /** As found beyond as restored, where work lowers the worth. */
  readonly drop: Bar | null;
  /** What the work costs, up to the worth it adds. */
  readonly cost: Bar;
  /** The end gap: from cost to worth where the work pays, beyond the worth where it does not; null where even. */
  readonly gap: (Bar & { readonly kind: 'gain' | 'loss' }) | null;
  /** Cost at low to high hours. */
  readonly range: Bar | null;
  /** Where both bars begin: at worth as found. */
  readonly origin: { readonly x: number; readonly y1: number; readonly y2: number };
  /** Worth restored, carried down to the cost. */
  readonly mark: { readonly x: number; readonly y1: number; readonly y2: number };
  readonly whisker: { readonly x1: number; readonly x2: number; readonly y: number; readonly reach: number } | null;
  /** A filled triangle's three points over the likely cost. */
  readonly pointer: string;
  readonly labels: readonly AxisText[];
}

export interface DrawingMeasures {
  readonly width: number;
  /** Row names stand beside the bars, or above them on a narrow drawing. */
  readonly narrow: boolean;
  /** Size of the text, which spaces the drawing. */
  readonly fontSize: number;
}

/**
 * Where everything of «cost against worth» stands. Both bars share an origin at worth as found: the worth bar ends at
 * worth restored, the cost bar at the cost, and the difference of their ends is the answer.
 */
export function drawCostAgainstWorth(
  figures: CostAgainstWorthFigures,
  measures: DrawingMeasures,
): CostAgainstWorthDrawing {
  const { currency, asFound, asRestored, restoredLow, restoredHigh, cost } = figures;
  const { width, narrow, fontSize: em } = measures;
  const bar = 2 * em;
  const left = narrow ? 2 : 8.5 * em;
  const right = width - (narrow ? 2 * em : 8 * em);
  const worthY = (narrow ? 3.2 : 2) * em;
  const costY = worthY + bar + (narrow ? 3.4 : 3.2) * em;
  const axisY = costY + bar + 2.4 * em;

  const axis = moneyAxis(Math.max(asFound, asRestored, restoredHigh ?? 0, asFound + cost.high), narrow ? 3 : 5);
  const x = (amount: number) => round(left + ((right - left) * amount) / axis.end);
  const span = (from: number, to: number, y: number, height = bar): Bar => ({
    x: x(Math.min(from, to)),
    y: round(y),
    width: round(x(Math.max(from, to)) - x(Math.min(from, to))),
    height: round(height),
  });
  const whole = (amount: number) => formatMoney(String(amount), currency, { whole: true });

  const costEnd = asFound + cost.likely;
  const paysUpTo = Math.max(asFound, Math.min(costEnd, asRestored));
  const gap = asRestored - costEnd;
  const thin = 0.8 * em;
  const rowText = (y: number, text: string): AxisText =>
    narrow
      ? { x: left, y: round(y - 2 * em), text, anchor: 'start' }
      : { x: 0, y: round(y + bar / 2 + em * 0.35), text, anchor: 'start' };

  return {
    width,
    height: round(axisY + 2 * em),
    grid: axis.lines.map((amount) => ({ x: x(amount), y1: round(worthY - 0.6 * em), y2: round(axisY) })),
    axis: {
      y: round(axisY),
      x1: x(0),
      x2: x(axis.end),
      labels: axis.lines.map((amount, at) => ({
        x: x(amount),
        y: round(axisY + 1.5 * em),
        text: whole(amount),
        anchor: at === 0 ? 'start' : at === axis.lines.length - 1 ? 'end' : 'middle',
      })),
    },
    rows: [rowText(worthY, 'Worth'), rowText(costY, 'Cost of work')],
    found: span(0, asFound, worthY),
    uplift: asRestored > asFound ? span(asFound, asRestored, worthY) : null,
    drop: asRestored < asFound ? span(asRestored, asFound, worthY) : null,
    cost: span(asFound, paysUpTo, costY),
    gap:
      gap === 0
        ? null
        : gap > 0
          ? { ...span(costEnd, asRestored, costY), kind: 'gain' }
          : { ...span(paysUpTo, costEnd, costY), kind: 'loss' },
    range:
      cost.low < cost.high ? span(asFound + cost.low, asFound + cost.high, costY + bar / 2 - thin / 2, thin) : null,
    origin: { x: x(asFound), y1: round(worthY), y2: round(costY + bar) },
    mark: { x: x(asRestored), y1: round(worthY), y2: round(costY + bar + 0.5 * em) },
    whisker:
      restoredLow !== null && restoredHigh !== null && restoredLow < restoredHigh
        ? { x1: x(restoredLow), x2: x(restoredHigh), y: round(worthY + bar / 2), reach: round(0.45 * em) }
        : null,
    pointer: triangle(x(costEnd), costY - 0.25 * em, 0.5 * em),
    labels: [
      ...(narrow
        ? [above(worthY, `${whole(asFound)} as found, ${whole(asRestored)} restored`, x(0) + 4 * em)]
        : besideWorth(whole, asFound, asRestored, {
            worthY,
            bar,
            em,
            x,
            end: Math.max(asFound, asRestored, restoredHigh ?? 0),
          })),
      ...(narrow
        ? [above(costY, `likely ${whole(cost.likely)}`, x(0) + 8 * em)]
        : [
            {
              ...above(costY, `likely ${whole(cost.likely)}`, x(costEnd)),
              y: round(costY + bar + 1.4 * em),
              anchor: 'middle' as const,
            },
          ]),
    ],
  };

  function above(y: number, text: string, at: number): AxisText {
    return { x: round(at), y: round(y - 2 * em), text, anchor: 'start' };
  }
}

function besideWorth(
  whole: (amount: number) => string,
  asFound: number,
  asRestored: number,
  at: { worthY: number; bar: number; em: number; x: (amount: number) => number; end: number },
): AxisText[] {
  const { worthY, bar, em, x, end } = at;
  const uplift = asRestored - asFound;
  const sign = uplift > 0 ? '+' : uplift < 0 ? '−' : '';
  const above = worthY - 0.5 * em;
  const found = `${whole(asFound)} as found`;
  const added = `${sign}${whole(Math.abs(uplift))}`;
  const restored = `${whole(asRestored)} restored`;
  const barEnd = x(Math.max(asFound, asRestored));
  // over a short bar the two would run into each other; then the uplift stands behind the worth restored
  const apart = x(0) + textWidth(found, em) + em < barEnd - textWidth(added, em);
  return [
    { x: x(0), y: round(above), text: found, anchor: 'start' },
    ...(apart ? [{ x: barEnd, y: round(above), text: added, anchor: 'end' as const }] : []),
    {
      x: round(x(end) + 0.8 * em),
      y: round(worthY + bar / 2 + 0.35 * em),
      text: apart ? restored : `${restored}, ${added}`,
      anchor: 'start',
    },
  ];
}

/** A triangle pointing down whose tip is at (x, y): points for an SVG polygon. */
const triangle = (x: number, y: number, half: number): string =>
  `${round(x)},${round(y)} ${round(x - half)},${round(y - 1.6 * half)} ${round(x + half)},${round(y - 1.6 * half)}`;

/** A tenth of a unit is finer than any screen or printer shows. */
const round = (value: number): number => Math.round(value * 10) / 10;

/** The chart in a sentence, for those who do not see it. */
export function costAgainstWorthSentence(figures: CostAgainstWorthFigures): string {
  const { currency, asFound, asRestored, cost } = figures;
  const whole = (amount: number) => formatMoney(String(amount), currency, { whole: true });
  const uplift = asRestored - asFound;
  const gap = Math.round(uplift - cost.likely);
  const added = uplift < 0 ? `it takes ${whole(-uplift)} off the worth` : `it adds ${whole(uplift)}`;
  const answer =
    gap === 0
      ? 'that is even'
      : gap > 0
        ? `that is ${whole(gap)} more than it costs`
        : uplift < 0
          ? `${whole(-gap)} lost in all`
          : `it costs ${whole(-gap)} more than that`;
  const range = cost.low < cost.high ? `, ${whole(cost.low)} to ${whole(cost.high)}` : '';
  return `Worth ${whole(asFound)} as found and ${whole(asRestored)} restored. The work likely costs ${whole(cost.likely)}${range}; ${added}: ${answer}.`;
}
