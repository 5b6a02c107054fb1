import {
  costAgainstWorthSentence,
  drawCostAgainstWorth,
  type AxisText,
  type Bar,
} from '../../../src/domain/charts/cost-against-worth';
import type { PaperCostAgainstWorth } from '../../../src/domain/documents/paper';
import type { Sheet } from './pdf-page';
import {
  COST,
  COST_RANGE,
  FOUND,
  GAIN,
  INK,
  INK_SOFT,
  INK_VARIANT,
  LOSS,
  OUTLINE,
  PAPER,
  RULE,
  STYLES,
  UPLIFT,
  UPLIFT_GROUND,
  type Weight,
} from './pdf-style';
import { baselineAt, drawLine, widthOf, type Align } from './pdf-text';

const ALIGN: Readonly<Record<AxisText['anchor'], Align>> = { start: 'left', middle: 'centre', end: 'right' };
const HATCH_STEP = 4;
const ABOVE = 4;
const BELOW = 6;
const KEY_HEIGHT = STYLES.chart.leading + 2;

const drawingOn = (sheet: Sheet, chart: PaperCostAgainstWorth) =>
  drawCostAgainstWorth(chart, { width: sheet.width, narrow: false, fontSize: STYLES.chart.size });

/** The room that the chart and its key take. */
export const costChartHeight = (sheet: Sheet, chart: PaperCostAgainstWorth): number =>
  ABOVE + drawingOn(sheet, chart).height + KEY_HEIGHT + BELOW;

/**
 * Draws cost against worth. The parts differ without colour: as found is plain, uplift is hatched, cost is dark, and
 * the gap is hatched to the right where the work pays and to the left where it does not.
 */
export function drawCostChart(sheet: Sheet, chart: PaperCostAgainstWorth): void {
  const drawing = drawingOn(sheet, chart);
  sheet.keep(costChartHeight(sheet, chart));
  const top = sheet.y + ABOVE;
  const { document } = sheet;

  const fill = ({ x, y, width, height }: Bar, colour: string) => document.rect(x, y, width, height).fill(colour);
  const line = (x1: number, y1: number, x2: number, y2: number, width: number, colour: string) =>
    document.lineWidth(width).moveTo(x1, y1).lineTo(x2, y2).stroke(colour);
  const hatch = (bar: Bar, ground: string, colour: string, lean: 'right' | 'left') => {
    const { x, y, width, height } = bar;
    fill(bar, ground);
    document.save().rect(x, y, width, height).clip();
    for (let foot = x - height; foot < x + width + height; foot += HATCH_STEP)
      line(foot, y + height, foot + (lean === 'right' ? height : -height), y, 0.9, colour);
    document.restore();
    document.lineWidth(0.8).rect(x, y, width, height).stroke(colour);
  };
  const range = ({ x, y, width, height }: Bar) =>
    document.lineWidth(0.6).rect(x, y, width, height).fillAndStroke(COST_RANGE, INK_VARIANT);
  const label = (text: AxisText, weight: Weight, colour: string) =>
    drawLine(
      sheet,
      text.text,
      { x: text.x, baseline: text.y, align: ALIGN[text.anchor] },
      { weight, size: STYLES.chart.size, colour },
    );

  const drawKey = () => {
    const swatch = (x: number): Bar => ({ x, y: drawing.height + 2, width: 12, height: 7 });
    let x = 0;
    const entry = (text: string, show: (bar: Bar) => unknown) => {
      show(swatch(x));
      drawLine(sheet, text, { x: x + 16, baseline: baselineAt(drawing.height, STYLES.chart) }, STYLES.chart);
      x += 16 + widthOf(sheet, text, STYLES.chart) + 14;
    };
    entry('As found', (bar) => fill(bar, FOUND));
    if (drawing.uplift !== null) entry('Uplift', (bar) => hatch(bar, UPLIFT_GROUND, UPLIFT, 'right'));
    entry('Cost at likely hours', (bar) => fill(bar, COST));
    if (drawing.range !== null) entry('Cost, low to high hours', range);
    if (drawing.gap?.kind === 'gain') entry('Worth beyond the cost', (bar) => hatch(bar, PAPER, GAIN, 'right'));
    if (drawing.gap?.kind === 'loss') entry('Cost beyond the worth', (bar) => hatch(bar, PAPER, LOSS, 'left'));
  };

  sheet.within(
    'Figure',
    () =>
      sheet.draw(() => {
        document.save().translate(sheet.left, top);
        for (const { x, y1, y2 } of drawing.grid) line(x, y1, x, y2, 0.4, RULE);
        line(drawing.axis.x1, drawing.axis.y, drawing.axis.x2, drawing.axis.y, 0.6, OUTLINE);
        if (drawing.range !== null) range(drawing.range);
        fill(drawing.found, FOUND);
        if (drawing.uplift !== null) hatch(drawing.uplift, UPLIFT_GROUND, UPLIFT, 'right');
        if (drawing.drop !== null) hatch(drawing.drop, PAPER, LOSS, 'left');
        if (drawing.cost.width > 0) fill(drawing.cost, COST);
        if (drawing.gap?.kind === 'gain') hatch(drawing.gap, PAPER, GAIN, 'right');
        if (drawing.gap?.kind === 'loss') hatch(drawing.gap, PAPER, LOSS, 'left');
        document.dash(2, { space: 2 });
        line(drawing.origin.x, drawing.origin.y1, drawing.origin.x, drawing.origin.y2, 0.7, OUTLINE);
        document.undash();
        line(drawing.mark.x, drawing.mark.y1, drawing.mark.x, drawing.mark.y2, 1.2, UPLIFT);
        if (drawing.whisker !== null) {
          const { x1, x2, y, reach } = drawing.whisker;
          line(x1, y, x2, y, 1.2, INK);
          for (const x of [x1, x2]) line(x, y - reach, x, y + reach, 1.2, INK);
        }
        document.polygon(...pointsOf(drawing.pointer)).fill(INK);
        for (const text of drawing.axis.labels) label(text, 'regular', INK_SOFT);
        for (const text of drawing.rows) label(text, 'bold', INK);
        for (const text of drawing.labels) label(text, 'regular', INK);
        drawKey();
        document.restore();
      }),
    { alt: costAgainstWorthSentence(chart) },
  );
  sheet.y = top + drawing.height + KEY_HEIGHT + BELOW;
}

/** The points of an SVG polygon, `1,2 3,4`. */
const pointsOf = (points: string): number[][] => points.split(' ').map((point) => point.split(',').map(Number));
