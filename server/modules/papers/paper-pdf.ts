import { formatDate } from '../../../src/domain/calendar/period';
import type { Paper, PaperCostAgainstWorth, PaperSection } from '../../../src/domain/documents/paper';
import type { PaperSize } from '../../../src/domain/estimate/terms';
import { costChartHeight, drawCostChart } from './pdf-cost-chart';
import { drawFigures } from './pdf-figures';
import { Sheet } from './pdf-page';
import { INK, OUTLINE, STYLES, type FontBytes } from './pdf-style';
import { drawTable } from './pdf-table';
import { baselineAt, drawHeading, drawLine, drawParagraph, drawRow, widthOf, wrap } from './pdf-text';
import { drawYearScaleOn } from './pdf-year-scale';

const FACT_LABEL_WIDTH = 104;

/**
 * Sets a document as a PDF: Lato embedded, text selectable, tagged and outlined, charts as vectors, pages numbered.
 * The same content gives the same bytes. Every figure is the document's own text; nothing is computed here.
 */
export function renderPaperPdf(
  paper: Paper,
  options: { readonly size: PaperSize; readonly fonts: FontBytes },
): Promise<Buffer> {
  const sheet = new Sheet({
    ...options,
    title: `${paper.title} ${paper.reference}`,
    author: paper.practice.name,
    subject: paper.subtitle,
    language: paper.language,
    preparedOn: paper.preparedOn,
  });
  drawHead(sheet, paper);
  if (paper.figures.length > 0) drawFigures(sheet, paper.figures);
  if (paper.yearScale !== null) drawYearScaleOn(sheet, paper.yearScale);
  for (const section of paper.sections) sheet.within('Sect', () => drawSection(sheet, section, paper.costAgainstWorth));
  drawFooters(sheet, paper);
  return sheet.finish();
}

function drawHead(sheet: Sheet, paper: Paper): void {
  const { practice, reference, preparedBy } = paper;
  const half = sheet.width * 0.62;
  const right = { x: half, width: sheet.width - half, align: 'right' as const, tag: 'P' };
  const row = (left: string, style: (typeof STYLES)['practice' | 'practiceLine'], text: string, rightStyle = style) =>
    drawRow(sheet, [
      { text: left, x: 0, width: half - 12, style, tag: 'P' },
      { ...right, text, style: rightStyle },
    ]);
  row(practice.name, STYLES.practice, reference, STYLES.reference);
  const lines = practice.lines.length === 0 ? [''] : practice.lines;
  lines.forEach((line, i) => row(line, STYLES.practiceLine, i === 0 ? formatDate(paper.preparedOn) : ''));
  sheet.y += 8;
  sheet.rule(1.6, INK);
  sheet.y += 11;
  drawRow(sheet, [{ text: paper.title, x: 0, width: sheet.width, style: STYLES.title, tag: 'H1' }], { below: 1 });
  drawParagraph(sheet, paper.subtitle, STYLES.subtitle, { below: 1 });
  drawParagraph(sheet, `Prepared by ${preparedBy.name}, ${preparedBy.capacity}.`, STYLES.subtitle, { below: 4 });
  drawParagraph(sheet, paper.standing, STYLES.standing, { below: 8 });
}

function drawSection(sheet: Sheet, section: PaperSection, chart: PaperCostAgainstWorth | null): void {
  switch (section.type) {
    case 'table':
      drawTable(sheet, section);
      break;
    case 'facts':
      drawFacts(sheet, section);
      break;
    case 'paragraphs':
      drawHeading(sheet, section.heading);
      for (const paragraph of section.paragraphs) drawParagraph(sheet, paragraph);
      break;
    case 'cost-against-worth':
      drawHeading(sheet, section.heading, chart === null ? undefined : costChartHeight(sheet, chart));
      if (chart !== null) drawCostChart(sheet, chart);
      for (const paragraph of section.paragraphs) drawParagraph(sheet, paragraph);
      break;
    case 'cautions':
      drawHeading(sheet, section.heading);
      for (const { title, whatToDo } of section.items) drawCaution(sheet, title, whatToDo);
      drawParagraph(sheet, section.note, STYLES.note);
  }
}

const FACT_GAP = 2;
/** So few facts stay on one page. */
const FEW_FACTS = 12;

function drawFacts(sheet: Sheet, { heading, rows }: Extract<PaperSection, { type: 'facts' }>): void {
  const value = { x: FACT_LABEL_WIDTH, width: sheet.width - FACT_LABEL_WIDTH, style: STYLES.body, tag: 'P' };
  const heightOf = (text: string) =>
    wrap(sheet, text, value.style, value.width).length * value.style.leading + FACT_GAP;
  const kept = rows.slice(0, rows.length <= FEW_FACTS ? FEW_FACTS : 2);
  drawHeading(
    sheet,
    heading,
    kept.reduce((sum, row) => sum + heightOf(row.value), 0),
  );
  for (const row of rows)
    drawRow(
      sheet,
      [
        { text: row.label, x: 0, width: FACT_LABEL_WIDTH - 12, style: STYLES.strong, tag: 'P' },
        { ...value, text: row.value },
      ],
      { below: FACT_GAP },
    );
}

const CAUTION_INDENT = 12;

/** A caution stands whole beside a heavy bar, which reads without colour. */
function drawCaution(sheet: Sheet, title: string, whatToDo: string): void {
  const width = sheet.width - CAUTION_INDENT;
  const lines = (text: string) => wrap(sheet, text, STYLES.body, width).length * STYLES.body.leading;
  const height = STYLES.strong.leading * wrap(sheet, title, STYLES.strong, width).length + lines(whatToDo);
  sheet.keep(height);
  const top = sheet.y;
  sheet.decorate(() => {
    sheet.document.rect(sheet.left, top, 3, Math.min(height, sheet.bottom - top)).fill(INK);
  });
  drawRow(sheet, [{ text: title, x: CAUTION_INDENT, width, style: STYLES.strong, tag: 'P' }]);
  drawRow(sheet, [{ text: whatToDo, x: CAUTION_INDENT, width, style: STYLES.body, tag: 'P' }], { below: 5 });
}

/** The document's number, what it is, and `Page 1 of 3` at the foot of every page. */
function drawFooters(sheet: Sheet, paper: Paper): void {
  const { start, count } = sheet.document.bufferedPageRange();
  const style = STYLES.footer;
  for (let i = 0; i < count; i += 1) {
    sheet.document.switchToPage(start + i);
    sheet.y = sheet.bottom + 14;
    sheet.rule(0.5, OUTLINE);
    const page = `Page ${i + 1} of ${count}`;
    const room = sheet.width - widthOf(sheet, page, style) - 16;
    const name = `${paper.title} ${paper.reference}, ${paper.practice.name}, ${formatDate(paper.preparedOn)}.`;
    const lines = [...wrap(sheet, name, style, room), ...wrap(sheet, paper.standing, style, room)].slice(0, 3);
    sheet.decorate(() => {
      sheet.y += 5;
      const right = { x: sheet.left + sheet.width, baseline: baselineAt(sheet.y, style), align: 'right' as const };
      drawLine(sheet, page, right, style);
      for (const line of lines) {
        drawLine(sheet, line, { x: sheet.left, baseline: baselineAt(sheet.y, style) }, style);
        sheet.y += style.leading;
      }
    });
  }
}
