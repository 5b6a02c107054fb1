import type { PaperFigure } from '../../../src/domain/documents/paper';
import type { Sheet } from './pdf-page';
import { INK, RULE, STYLES, type TextStyle } from './pdf-style';
import { baselineAt, drawLine, widthOf, wrap } from './pdf-text';

const STYLE_OF_WEIGHT: Readonly<Record<PaperFigure['weight'], TextStyle>> = {
  light: STYLES.figureLight,
  heavy: STYLES.figureHeavy,
  words: STYLES.figureWords,
};
const PADDING = 9;
const TOP = 5;
const LEAST_AMOUNT_SIZE = 12;

/** Draws the figures side by side: label, amount, range, basis. The group never splits over two pages. */
export function drawFigures(sheet: Sheet, figures: readonly PaperFigure[]): void {
  const column = sheet.width / figures.length;
  const width = column - 2 * PADDING + PADDING / 2;
  const shrink = fittingShare(sheet, figures, width);
  const blocks = figures.map((figure) => {
    const amount = STYLE_OF_WEIGHT[figure.weight];
    return [
      { style: STYLES.figureLabel, lines: [figure.label] },
      {
        style: figure.weight === 'words' ? amount : { ...amount, size: amount.size * shrink },
        lines: wrap(sheet, figure.amount, amount, figure.weight === 'words' ? width : Infinity),
      },
      { style: STYLES.figureRange, lines: wrap(sheet, figure.range ?? '', STYLES.figureRange, width) },
      { style: STYLES.note, lines: wrap(sheet, figure.basis, STYLES.note, width) },
    ];
  });
  const heights = blocks.map((block) => block.reduce((sum, { style, lines }) => sum + style.leading * lines.length, 0));
  const height = TOP + Math.max(...heights);
  sheet.keep(height);
  sheet.rule(1.6, INK);
  const top = sheet.y;
  blocks.forEach((block, i) => {
    const left = sheet.left + i * column;
    if (i > 0)
      sheet.decorate(() => {
        sheet.document
          .lineWidth(0.5)
          .moveTo(left, top)
          .lineTo(left, top + height)
          .stroke(RULE);
      });
    sheet.y = top + TOP;
    sheet.within('Sect', () => {
      for (const { style, lines } of block) drawBlock(sheet, lines, style, i === 0 ? left : left + PADDING);
    });
  });
  sheet.y = top + height + 8;
}

function drawBlock(sheet: Sheet, lines: readonly string[], style: TextStyle, x: number): void {
  if (lines.length === 0) return;
  sheet.within('P', () => {
    for (const line of lines) {
      sheet.draw(() => drawLine(sheet, line, { x, baseline: baselineAt(sheet.y, style) }, style));
      sheet.y += style.leading;
    }
  });
}

/** The one share of their full size at which all amounts fit, so that they stay comparable. */
function fittingShare(sheet: Sheet, figures: readonly PaperFigure[], width: number): number {
  const amounts = figures.filter((figure) => figure.weight !== 'words');
  const shares = amounts.map((figure) => width / widthOf(sheet, figure.amount, STYLE_OF_WEIGHT[figure.weight]));
  return Math.max(LEAST_AMOUNT_SIZE / STYLES.figureHeavy.size, Math.min(1, ...shares));
}
