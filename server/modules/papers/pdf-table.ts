import type { PaperSection } from '../../../src/domain/documents/paper';
import type { Sheet } from './pdf-page';
import { INK, RULE, STYLES, type TextStyle } from './pdf-style';
import { drawHeading, drawParagraph, drawRow, widthOf, wrap, type Cell } from './pdf-text';

type Table = Extract<PaperSection, { type: 'table' }>;
type Row = Table['rows'][number];

const GAP = 12;
/** Keeps a text that just fits from being broken by rounding. */
const SLACK = 0.5;
const PADDING = 2.6;
const CELL_STYLES: Readonly<Record<Row['style'], TextStyle>> = {
  plain: STYLES.cell,
  group: STYLES.cellStrong,
  total: STYLES.cellTotal,
};
const HEAD_HEIGHT = STYLES.tableHead.leading + 2;
/** A table that takes at most this share of a page stays on one. */
const SHORT = 0.35;
/** A cell narrower than this stays on one line. */
const FEW_WORDS = 76;
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

  const sumOf = (rows: readonly Row[]) => rows.reduce((sum, row) => sum + heightOf(row), HEAD_HEIGHT);
  const whole = sumOf(table.rows);
  drawHeading(sheet, table.heading, whole <= SHORT * sheet.pageHeight ? whole : sumOf(table.rows.slice(0, 3)));
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
 * Where the columns stand. The right-aligned ones all get what the widest of them asks; the others get their longest
 * word or a few words, and share what is left by how much more they ask.
 */
function placeColumns(sheet: Sheet, table: Table): Pick<Cell, 'x' | 'width' | 'align'>[] {
  const columns = table.columns.map(({ label, align }, i) => {
    const texts = table.rows.map((row) => ({ text: row.cells[i] ?? '', style: CELL_STYLES[row.style] }));
    const all = [{ text: label, style: STYLES.tableHead }, ...texts];
    const widest = Math.max(...all.map(({ text, style }) => widthOf(sheet, text, style)));
    const words = all.flatMap(({ text, style }) => text.split(/\s+/).map((word) => widthOf(sheet, word, style)));
    const least = Math.min(Math.max(...words, Math.min(widest, FEW_WORDS)) + SLACK, sheet.width / table.columns.length);
    return { align, least, asked: Math.max(least, Math.min(MOST_ASKED, widest + SLACK)) };
  });
  const sum = (widths: readonly number[]) => widths.reduce((total, width) => total + width, 0);
  const figures = columns.filter(({ align }) => align === 'right');
  const texts = columns.filter(({ align }) => align === 'left');
  const figureWidth = Math.max(0, ...figures.map(({ asked }) => asked));
  const room = sheet.width - GAP * (columns.length - 1) - figureWidth * figures.length;
  const spare = room - sum(texts.map(({ least }) => least));
  const wanted = texts.map(({ asked, least }) => asked - least + SLACK);
  let x = 0;
  return columns.map(({ align, least, asked }) => {
    const share = (spare * (asked - least + SLACK)) / sum(wanted);
    const width = align === 'right' ? figureWidth : least + share;
    const place = { x, width, align };
    x += width + GAP;
    return place;
  });
}
