import type { Sheet } from './pdf-page';
import { STYLES, type TextStyle } from './pdf-style';

export type Align = 'left' | 'right' | 'centre';

/** Width of a text on one line, in points. */
export function widthOf(sheet: Sheet, text: string, style: TextStyle): number {
  return sheet.document.font(style.weight).fontSize(style.size).widthOfString(text);
}

/**
 * Breaks a text into lines of at most `width`: at spaces and line ends, and within a word only where the word alone is
 * wider than that. A text without anything to print has no lines.
 */
export function wrap(sheet: Sheet, text: string, style: TextStyle, width: number): string[] {
  const fits = (line: string) => widthOf(sheet, line, style) <= width;
  const lines: string[] = [];
  for (const typed of text.split('\n')) {
    let line = '';
    for (const word of typed.split(/\s+/).filter((part) => part !== '')) {
      const longer = line === '' ? word : `${line} ${word}`;
      if (fits(longer)) {
        line = longer;
        continue;
      }
      if (line !== '') lines.push(line);
      line = word;
      while (!fits(line)) {
        const head = longestHead(line, fits);
        lines.push(head);
        line = line.slice(head.length);
      }
    }
    if (line !== '') lines.push(line);
  }
  return lines;
}

/** The longest beginning of a word that fits, at least a character of it. */
function longestHead(word: string, fits: (text: string) => boolean): string {
  const characters = Array.from(word);
  let count = characters.length - 1;
  while (count > 1 && !fits(characters.slice(0, count).join(''))) count -= 1;
  return characters.slice(0, Math.max(1, count)).join('');
}

/** Puts a line on its baseline; `x` is its left end, right end or middle. */
export function drawLine(
  sheet: Sheet,
  text: string,
  at: { readonly x: number; readonly baseline: number; readonly align?: Align },
  style: Pick<TextStyle, 'weight' | 'size' | 'colour'>,
): void {
  const document = sheet.document.font(style.weight).fontSize(style.size).fillColor(style.colour);
  const width = at.align === undefined || at.align === 'left' ? 0 : document.widthOfString(text);
  const x = at.align === 'right' ? at.x - width : at.align === 'centre' ? at.x - width / 2 : at.x;
  document.text(text, x, at.baseline, { lineBreak: false, baseline: 'alphabetic' });
}

/** The share of its size that a capital of Lato stands above the baseline. */
const CAPITAL_HEIGHT = 0.72;

/** The baseline of a line of the style whose top is at `y`: capitals stand in the middle of the line. */
export const baselineAt = (y: number, style: TextStyle): number =>
  y + (style.leading + style.size * CAPITAL_HEIGHT) / 2;

export interface Cell {
  readonly text: string;
  /** From the left margin. */
  readonly x: number;
  readonly width: number;
  readonly style: TextStyle;
  readonly align?: Align;
  /** What it is, such as `P` or `TD`. */
  readonly tag: string;
}

export interface RowOptions {
  readonly below?: number;
  /** Stays whole on one page where a page can hold it. */
  readonly whole?: boolean;
  /** Room that must be left beneath its first lines, for what belongs to it. */
  readonly keep?: number;
  /** Written again at the top of each page that the row goes on to. */
  readonly head?: () => void;
}

/**
 * Writes cells side by side, each wrapped within its own width, and moves down by the highest. A row that does not fit
 * goes on to the next page line by line, never leaving a line alone on either.
 */
export function drawRow(sheet: Sheet, cells: readonly Cell[], options: RowOptions = {}): void {
  const columns = cells.map((cell) => ({ ...cell, lines: wrap(sheet, cell.text, cell.style, cell.width) }));
  const count = Math.max(0, ...columns.map((column) => column.lines.length));
  const leading = Math.max(0, ...cells.map((cell) => cell.style.leading));
  const height = count * leading;
  const together = (options.whole === true && height <= sheet.pageHeight) || count <= 3 ? count : 2;

  const turn = () => {
    sheet.turnPage();
    options.head?.();
  };
  if (!sheet.hasRoom(together * leading + (together === count ? (options.keep ?? 0) : 0)) && sheet.y > sheet.top)
    turn();
  const elements = columns.map((column) => ({ column, element: sheet.begin(column.tag) }));
  for (let i = 0; i < count; i += 1) {
    const linesDue = i > 0 && count - i === 2 ? 2 : 1;
    if (i > 0 && !sheet.hasRoom(linesDue * leading)) turn();
    for (const { column, element } of elements) {
      const line = column.lines[i];
      if (line === undefined) continue;
      const x = sheet.left + column.x + (column.align === 'right' ? column.width : 0);
      const align = column.align ?? 'left';
      sheet.draw(
        () => drawLine(sheet, line, { x, baseline: baselineAt(sheet.y, column.style), align }, column.style),
        element,
      );
    }
    sheet.y += leading;
  }
  for (const { element } of elements) element.end();
  sheet.y += options.below ?? 0;
}

/** Writes a paragraph over the whole width. */
export function drawParagraph(
  sheet: Sheet,
  text: string,
  style: TextStyle = STYLES.body,
  options: RowOptions = {},
): void {
  drawRow(sheet, [{ text, x: 0, width: sheet.width, style, tag: 'P' }], { below: 3, ...options });
}

const ABOVE_HEADING = 9;
const BELOW_HEADING = 2;
/** Two lines of what follows stay with a heading. */
const KEPT_BELOW_HEADING = 28;

/** Writes a heading, names it in the outline, and keeps it with what follows. */
export function drawHeading(sheet: Sheet, text: string, keep: number = KEPT_BELOW_HEADING): void {
  sheet.keep(ABOVE_HEADING + STYLES.heading.leading + BELOW_HEADING + keep);
  if (sheet.y > sheet.top) sheet.y += ABOVE_HEADING;
  sheet.document.outline.addItem(text);
  drawRow(sheet, [{ text, x: 0, width: sheet.width, style: STYLES.heading, tag: 'H2' }], { below: BELOW_HEADING });
}
