import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { amountsIn, appraisalSheet, ESTIMATE, restorationEstimate, SET } from '../../../tests/support/papers';
import { hasTool, pdfText } from '../../../tests/support/pdf-text';
import { ROOT } from '../../../tests/support/root';
import type { Paper } from '../../../src/domain/documents/paper';
import type { PaperSize } from '../../../src/domain/estimate/terms';
import { renderPaperPdf } from './paper-pdf';
import { readFonts } from './pdf-style';

const fonts = readFonts(join(ROOT, 'node_modules/@expo-google-fonts/lato'));
const pdfOf = (paper: Paper, size: PaperSize = 'letter') => renderPaperPdf(paper, { size, fonts });

/** What an outside tool says about a PDF on its standard input. */
const tell = (tool: string, args: readonly string[], pdf: Buffer) =>
  spawnSync(tool, args, { input: pdf, encoding: 'utf8' }).stdout;
const oneSpaced = (text: string) => text.replace(/\s+/g, ' ');

const manyLines = Array.from({ length: 120 }, (_, i) => ({
  ...ESTIMATE.lines[1]!,
  content: { ...ESTIMATE.lines[1]!.content, description: `Rewire section ${i + 1}` },
}));
const longBasis = Array.from({ length: 700 }, (_, i) => `reason${i + 1}`).join(' ');
const withLongBasis = appraisalSheet({
  set: { ...SET, worths: SET.worths.map((worth) => ({ ...worth, basis: longBasis })), serial: 'X'.repeat(80) },
});

const poppler = hasTool('pdftotext');
(poppler ? describe : describe.skip)(poppler ? 'as read' : 'as read: skipped, poppler-utils is not installed', () => {
  describe.each<[string, Paper]>([
    ['appraisal sheet', appraisalSheet()],
    ['restoration estimate', restorationEstimate()],
  ])('%s', (_, paper) => {
    it.each<PaperSize>(['letter', 'a4'])('carries every amount as selectable text on %s', async (size) => {
      const text = pdfText(await pdfOf(paper, size));
      const amounts = amountsIn(JSON.stringify(paper));
      expect(amounts.length).toBeGreaterThan(10);
      expect(amountsIn(text)).toEqual(expect.arrayContaining(amounts));
    });

    it('carries its words, headings and standing', async () => {
      const text = oneSpaced(tell('pdftotext', ['-raw', '-', '-'], await pdfOf(paper)));
      for (const { heading } of paper.sections) expect(text).toContain(heading);
      for (const words of [paper.title, paper.subtitle, paper.standing, paper.preparedBy.name])
        expect(text).toContain(words);
      for (const section of paper.sections)
        if ('paragraphs' in section)
          for (const paragraph of section.paragraphs) expect(text).toContain(oneSpaced(paragraph));
    });
  });

  it('embeds Lato and nothing else', async () => {
    const fontsUsed = tell('pdffonts', ['-'], await pdfOf(appraisalSheet()))
      .trim()
      .split('\n')
      .slice(2);
    expect(fontsUsed).toHaveLength(4);
    for (const font of fontsUsed) expect(font).toMatch(/\+Lato-\w+ .*Identity-H +yes yes yes/);
  });

  it.each<[PaperSize, RegExp]>([
    ['letter', /Page size: +612 x 792 /],
    ['a4', /Page size: +595\.28 x 841\.89 /],
  ])('on %s has its size, title and tags', async (size, pageSize) => {
    const info = tell('pdfinfo', ['-'], await pdfOf(appraisalSheet(), size));
    expect(info).toMatch(pageSize);
    expect(info).toMatch(/Title: +Appraisal sheet S-0318/);
    expect(info).toMatch(/Author: +Quayside Set Works/);
    expect(info).toMatch(/Tagged: +yes/);
  });

  it('repeats a long table’s heads on every page, and numbers the pages', async () => {
    const pages = pdfText(await pdfOf(restorationEstimate({ lines: manyLines })))
      .split('\f')
      .slice(0, -1);
    expect(pages.length).toBeGreaterThan(4);
    pages.forEach((page, i) => expect(page).toContain(`Page ${i + 1} of ${pages.length}`));
    for (const page of pages.filter((one) => /Rewire section \d+ +Labour/.test(one)))
      expect(page).toMatch(/Work +Kind +Hours or quantity +Amount/);
    for (const { content } of manyLines) expect(pages.join()).toContain(content.description);
  });

  it('keeps a figure group on one page', async () => {
    const address = Array.from({ length: 47 }, (_, i) => `Line ${i + 1}`);
    const paper = appraisalSheet();
    const pages = pdfText(await pdfOf({ ...paper, practice: { ...paper.practice, lines: address } })).split('\f');
    const withLabel = pages.findIndex((page) => page.includes('In today’s money'));
    for (const words of ['about $538', 'by index', 'what the set is worth', '$850 to $1,100'])
      expect(pages[withLabel]).toContain(words);
  });

  it('loses nothing of a text longer than a page and writes nothing outside the margins', async () => {
    const pdf = await pdfOf(withLongBasis);
    const text = pdfText(pdf);
    for (const word of longBasis.split(' ')) expect(text).toContain(word);
    const words = [
      ...tell('pdftotext', ['-bbox', '-', '-'], pdf).matchAll(/xMin="([\d.-]+)".*xMax="([\d.]+)" yMax="([\d.]+)"/g),
    ];
    expect(words.length).toBeGreaterThan(1400);
    for (const [, left, right, foot] of words) {
      expect(Number(left)).toBeGreaterThan(55);
      expect(Number(right)).toBeLessThan(612 - 55);
      expect(Number(foot)).toBeLessThan(792 - 36);
    }
  });

  it('breaks no word of a table that a column can hold', async () => {
    const said = 'Nell Harrow, restorer, Quayside Set Works, after a talk with two dealers and one collector';
    const paper = appraisalSheet({
      set: { ...SET, worths: SET.worths.map((worth) => ({ ...worth, saidBy: said, basis: said })) },
    });
    const words = new Set(tell('pdftotext', ['-raw', '-', '-'], await pdfOf(paper)).split(/\s+/));
    for (const word of `Worth Range Type Effective Who says so Basis ${said}`.split(' ')) expect(words).toContain(word);
  });

  it('draws the year scale and the chart as vectors, with the screen’s own words', async () => {
    const pdf = await pdfOf(appraisalSheet());
    const text = pdfText(pdf);
    for (const words of ['1950', '2010', '$140 as found', '+$810', '$950 restored', 'likely $669'])
      expect(text).toContain(words);
    expect(text).toMatch(/Worth beyond the cost/);
    expect(tell('pdfimages', ['-list', '-'], pdf).trim().split('\n')).toHaveLength(2); // its two lines of heading
  });

  it('says a loss as plainly as a gain', async () => {
    const verdict = { ...ESTIMATE.verdict!, asRestored: '400.00', uplift: '260.00' };
    const text = pdfText(await pdfOf(restorationEstimate({ verdict })));
    expect(text).toContain('Cost beyond the worth');
    expect(text).not.toContain('Worth beyond the cost');
  });

  it('keeps a short table whole', async () => {
    const pages = (lines: number) => restorationEstimate({ lines: manyLines.slice(0, lines) });
    for (let lines = 20; lines < 60; lines += 3) {
      const text = pdfText(await pdfOf(pages(lines))).split('\f');
      const start = text.find((page) => page.includes('What it comes to'));
      expect(start).toMatch(/Deposit, 40% of likely/);
    }
  });
});

it('gives the same bytes for the same content', async () => {
  expect((await pdfOf(appraisalSheet())).equals(await pdfOf(appraisalSheet()))).toBe(true);
});

const qpdf = hasTool('qpdf');
(qpdf ? it : it.skip)(
  qpdf ? 'is a well-formed PDF' : 'is a well-formed PDF: skipped, qpdf is not installed',
  async () => {
    const folder = mkdtempSync(join(tmpdir(), 'thenworth-paper-'));
    const file = join(folder, 'paper.pdf');
    writeFileSync(file, await pdfOf(withLongBasis));
    const { status, stdout } = spawnSync('qpdf', ['--check', file], { encoding: 'utf8' });
    rmSync(folder, { recursive: true });
    expect(stdout).toMatch(/No syntax or stream encoding errors found/);
    expect(status).toBe(0);
  },
);
