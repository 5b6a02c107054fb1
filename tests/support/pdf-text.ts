import { spawnSync } from 'node:child_process';

/** Whether an outside tool is here; CI insists on it, elsewhere the tests that need it say that they were skipped. */
export function hasTool(name: string): boolean {
  const found = spawnSync(name, ['-v']).error === undefined;
  if (!found && process.env['CI'] === 'true')
    throw new Error(`${name} is needed here: install poppler-utils and qpdf.`);
  return found;
}

/** The selectable text of a PDF, by poppler's pdftotext. */
export function pdfText(pdf: Buffer): string {
  const { stdout, status, stderr } = spawnSync('pdftotext', ['-layout', '-', '-'], { input: pdf, encoding: 'utf8' });
  if (status !== 0) throw new Error(`pdftotext failed: ${stderr}`);
  return stdout;
}
