import PDFDocument from 'pdfkit';
import type { PaperSize } from '../../../src/domain/estimate/terms';
import { WEIGHTS, type FontBytes } from './pdf-style';

const MM = 72 / 25.4;
const SIDE_MARGIN = 20 * MM;
const TOP_MARGIN = 18 * MM;
/** Above the footer, which stands within it. */
const BOTTOM_MARGIN = 28 * MM;

const PAPER_NAMES: Readonly<Record<PaperSize, string>> = { letter: 'LETTER', a4: 'A4' };

type Element = PDFKit.PDFStructureElement;

export interface SheetOptions {
  readonly size: PaperSize;
  readonly fonts: FontBytes;
  readonly title: string;
  readonly author: string;
  readonly subject: string;
  readonly language: string;
  /** ISO date; the same content on the same date gives the same file. */
  readonly preparedOn: string;
}

/**
 * A document being written from top to bottom: the place of the next line, page breaks, and the tags that tell what
 * each piece is. Lengths are points; `y` grows downwards.
 */
export class Sheet {
  readonly document: PDFKit.PDFDocument;
  readonly left = SIDE_MARGIN;
  readonly top = TOP_MARGIN;
  readonly width: number;
  readonly bottom: number;
  /** Top of what comes next. */
  y = TOP_MARGIN;
  private element: Element;

  constructor(options: SheetOptions) {
    const created = new Date(`${options.preparedOn}T00:00:00Z`);
    this.document = new PDFDocument({
      size: PAPER_NAMES[options.size],
      margin: 0,
      bufferPages: true,
      pdfVersion: '1.7',
      tagged: true,
      lang: options.language,
      displayTitle: true,
      info: {
        Title: options.title,
        Author: options.author,
        Subject: options.subject,
        Creator: 'Thenworth',
        CreationDate: created,
        ModDate: created,
      },
    });
    for (const weight of WEIGHTS) this.document.registerFont(weight, options.fonts[weight]);
    this.width = this.document.page.width - 2 * SIDE_MARGIN;
    this.bottom = this.document.page.height - BOTTOM_MARGIN;
    this.element = this.document.struct('Document');
    this.document.addStructure(this.element);
  }

  /** Height of a whole page's text. */
  get pageHeight(): number {
    return this.bottom - this.top;
  }

  hasRoom(height: number): boolean {
    return this.y + height <= this.bottom;
  }

  /** Turns the page unless so much room is left; nothing is ever higher than a page by this alone. */
  keep(height: number): void {
    if (!this.hasRoom(height) && this.y > this.top) this.turnPage();
  }

  turnPage(): void {
    this.document.addPage();
    this.y = this.top;
  }

  /** What `write` puts down becomes one element of the document, such as a paragraph `P`. */
  within(tag: string, write: () => void, options: PDFKit.Mixins.StructureElementOptions = {}): void {
    const outer = this.element;
    const element = this.document.struct(tag, options);
    outer.add(element);
    this.element = element;
    write();
    element.end();
    this.element = outer;
  }

  /** An element to which marks are added one by one; end it when all are drawn. */
  begin(tag: string): Element {
    const element = this.document.struct(tag);
    this.element.add(element);
    return element;
  }

  /** Draws as content of the current element, or of the one given. */
  draw(mark: () => void, element = this.element): void {
    element.add(mark);
  }

  /** Draws what carries no meaning of its own: rules, grounds, page numbers. */
  decorate(mark: () => void): void {
    this.document.markContent('Artifact');
    mark();
    this.document.endMarkedContent();
  }

  /** A horizontal rule at the present height over the whole width. */
  rule(thickness: number, colour: string, from = this.left, to = this.left + this.width): void {
    this.decorate(() => {
      this.document.lineWidth(thickness).moveTo(from, this.y).lineTo(to, this.y).stroke(colour);
    });
  }

  /** Ends the document and gives its bytes. */
  finish(): Promise<Buffer> {
    this.element.end();
    return new Promise((resolve, reject) => {
      const chunks: Buffer[] = [];
      this.document.on('data', (chunk: Buffer) => chunks.push(chunk));
      this.document.on('end', () => resolve(Buffer.concat(chunks)));
      this.document.on('error', reject);
      this.document.end();
    });
  }
}
