import type { PaperSection } from '../../../src/domain/documents/paper';
import type { Sheet } from './pdf-page';
import { INK, RULE, STYLES, type TextStyle } from './pdf-style';
import { drawHeading, drawParagraph, drawRow, widthOf, wrap, type Cell } from './pdf-text';

type Table = Extract<PaperSection, { type: 'table' }>;
type Row = Table['rows'][number];

const GAP = 12;
const PADDING = 2.6;
const CELL_STYLES: Readonly<Record<Row['style'], TextStyle>> = {
  plain: STYLES.cell,
  group: STYLES.cellStrong,
  total: STYLES.cellTotal,
};
const HEAD_HEIGHT = STYLES.tableHead.leading + 2;
/** A table of so few rows stays on one page where a page can hold it. */
const SHORT = 12;
/** How much a long column asks for at most, so that it leaves room for others. */
const MOST_ASKED = 420;

/** Draws a table with its heading; its column heads stand again on every page it goes on to. */
export function drawTable(sheet: Sheet, table: Table): void {
  const columns = placeColumns(sheet, table);
  const cellsOf = (texts: readonly string[], style: TextStyle, tag: string): Cell[] =>
    columns.map((column, i) => ({ ...column, text: texts[i] ?? '', style, tag }));
  const heightOf = (row: Row) => {
    const style = CELL_STYLES[row.style];
    const lines = columns.map((column, i) => wrap(sheet, row.cells[i] ?? '', style, column.width).length);
    return Math.max(...lines) * style.leading + 2 * PADDING;
  };

  const labels = table.columns.map((column) => column.label);
  const head = () => {
    sheet.within('TR', () => drawRow(sheet, cellsOf(labels, STYLES.tableHead, 'TH'), { below: 2 }));
    sheet.rule(0.8, INK);
  };

  const kept = table.rows.slice(0, table.rows.length <= SHORT ? SHORT : 2);
  drawHeading(
    sheet,
    table.heading,
    kept.map(heightOf).reduce((sum, height) => sum + height, HEAD_HEIGHT),
  );
  sheet.within('Table', () => {
    head();
    table.rows.forEach((row, i) => {
      const next = table.rows[i + 1];
      const keep = next !== undefined && (row.style === 'group' || next.style === 'total') ? heightOf(next) : 0;
      const height = heightOf(row);
      if (!sheet.hasRoom(height + keep) && height + keep <= sheet.pageHeight) {
        sheet.turnPage();
        head();
      } else if (i > 0) sheet.rule(row.style === 'total' ? 0.8 : 0.4, row.style === 'total' ? INK : RULE);
      sheet.y += PADDING;
      sheet.within('TR', () =>
        drawRow(sheet, cellsOf(row.cells, CELL_STYLES[row.style], 'TD'), { below: PADDING, head }),
      );
    });
  });
  sheet.rule(0.8, INK);
  sheet.y += 4;
  if (table.note !== null && table.note !== '') drawParagraph(sheet, table.note, STYLES.note);
}

/**
 * Where the columns stand. Each asks for its widest cell; the right-aligned ones all get what the widest of them
 * asks, and the others share what is left by what they ask, be it more or less.
 */
function placeColumns(sheet: Sheet, table: Table): Pick<Cell, 'x' | 'width' | 'align'>[] {
  const asked = table.columns.map((column, i) => {
    const cells = table.rows.map((row) => widthOf(sheet, row.cells[i] ?? '', CELL_STYLES[row.style]));
    return Math.min(MOST_ASKED, Math.max(widthOf(sheet, column.label, STYLES.tableHead), ...cells) + 0.5);
  });
  const room = sheet.width - GAP * (asked.length - 1);
  const sum = (widths: readonly number[]) => widths.reduce((total, width) => total + width, 0);
  const isRigid = (i: number) => table.columns[i]?.align === 'right';
  const rigid = Math.max(0, ...asked.filter((_, i) => isRigid(i)));
  const free = room - rigid * asked.filter((_, i) => isRigid(i)).length;
  const shared = sum(asked.filter((_, i) => !isRigid(i)));
  const widths = asked.map((width, i) => (isRigid(i) ? rigid : (free * width) / shared));
  let x = 0;
  return widths.map((width, i) => {
    const place = { x, width, align: table.columns[i]?.align ?? ('left' as const) };
    x += width + GAP;
    return place;
  });
}
