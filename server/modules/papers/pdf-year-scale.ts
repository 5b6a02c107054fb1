import type { PaperYearScale } from '../../../src/domain/documents/paper';
import { paperYearScaleInput } from '../../../src/domain/documents/year-scale';
import { drawYearScale, type Label, type Needle, type Segment } from '../../../src/domain/year-scale/geometry';
import type { Sheet } from './pdf-page';
import { CURVE, CURVE_GROUND, INK, INK_SOFT, NEEDLE, OUTLINE, PAPER, type Weight } from './pdf-style';
import { drawLine, type Align } from './pdf-text';

const ALIGN: Readonly<Record<Label['anchor'], Align>> = { start: 'left', middle: 'centre', end: 'right' };
const TICK_WIDTHS = { year: 0.5, five: 0.7, decade: 1.2 } as const;

/**
 * Draws the year scale at its print size. The needles differ without colour: the then needle is thin with an open
 * ring, the now needle thick with a solid disc.
 */
export function drawYearScaleOn(sheet: Sheet, scale: PaperYearScale): void {
  const drawing = drawYearScale(paperYearScaleInput(scale, 'print', sheet.width));
  sheet.keep(drawing.height + 6);
  const top = sheet.y;
  const { document } = sheet;

  const line = ({ x1, y1, x2, y2 }: Segment, width: number, colour: string) =>
    document.lineWidth(width).moveTo(x1, y1).lineTo(x2, y2).stroke(colour);
  const label = (text: Label, weight: Weight, colour: string) =>
    drawLine(
      sheet,
      text.text,
      { x: text.x, baseline: text.y, align: ALIGN[text.anchor] },
      { weight, size: text.size, colour },
    );
  const needle = (which: Needle, who: 'then' | 'now') => {
    const { x, y, radius } = which.head;
    line(which.line, who === 'then' ? 1 : 2.2, NEEDLE);
    if (who === 'then') document.lineWidth(1.4).circle(x, y, radius).fillAndStroke(PAPER, NEEDLE);
    else document.circle(x, y, radius).fill(NEEDLE);
    if (which.year !== null) label(which.year, who === 'then' ? 'regular' : 'bold', NEEDLE);
    if (which.amount !== null) label(which.amount, who === 'then' ? 'regular' : 'black', INK);
  };

  sheet.within(
    'Figure',
    () =>
      sheet.draw(() => {
        document.save().translate(sheet.left, top);
        if (drawing.area !== '') document.path(drawing.area).fill(CURVE_GROUND);
        line(drawing.base, 0.6, OUTLINE);
        for (const tick of drawing.ticks) line(tick, TICK_WIDTHS[tick.kind], INK);
        if (drawing.curveBefore !== '')
          document.lineWidth(1).dash(1.2, { space: 2 }).path(drawing.curveBefore).stroke(CURVE).undash();
        if (drawing.curveAfter !== '') document.lineWidth(1.3).path(drawing.curveAfter).stroke(CURVE);
        for (const numeral of drawing.numerals) label(numeral, 'regular', INK_SOFT);
        needle(drawing.then, 'then');
        needle(drawing.now, 'now');
        document.restore();
      }),
    { alt: scale.sentence },
  );
  sheet.y = top + drawing.height + 6;
}
