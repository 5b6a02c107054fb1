import { ESTIMATE, restorationEstimate, SET } from '../../../tests/support/papers';
import { fileNameOf } from './phrases';
import type { Paper, PaperSection } from './paper';

const rowsOf = (paper: Paper, heading: string) => {
  const found = paper.sections.find((one) => one.heading === heading);
  if (found?.type !== 'table') throw new Error(`no table «${heading}»`);
  return found;
};
const wordsOf = (paper: Paper, heading: string) => {
  const found = paper.sections.find((one): one is PaperSection & { type: 'paragraphs' } => one.heading === heading);
  return found?.paragraphs.join(' ') ?? '';
};

it('groups lines by stage in the order of the job, each stage with its sum', () => {
  const rows = rowsOf(restorationEstimate(), 'The work, stage by stage').rows;
  expect(rows.map((row) => [row.style, ...row.cells])).toEqual([
    ['group', 'Intake and safety', '', '', '$97.50'],
    ['plain', 'Inspect, make safe and record', 'Labour', '1.5 h', '$97.50'],
    ['group', 'Power supply', '', '', '$436.17'],
    ['plain', 'Rewire the power supply', 'Labour', '6 h', '$390.00'],
    ['plain', 'Filter capacitors', 'Part', '3', '$46.17'],
    ['group', 'Speaker and dial', '', '', '$132.00'],
    ['plain', 'Recone the speaker', 'Outside work', '', '$132.00'],
    ['total', 'All stages, before tax', '', '', '$665.67'],
  ]);
});

it('sums by kind with tax by category, its rate and its note, and the deposit', () => {
  const table = rowsOf(restorationEstimate(), 'What it comes to');
  expect(table.rows.map((row) => row.cells)).toEqual([
    ['Labour', '$325.00', '$487.50', '$780.00'],
    ['Parts', '$46.17', '$46.17', '$46.17'],
    ['Outside work', '$132.00', '$132.00', '$132.00'],
    ['Before tax', '$503.17', '$665.67', '$958.17'],
    ['Taxed: parts', '$46.17', '$46.17', '$46.17'],
    ['Tax at 6.875%', '$3.17', '$3.17', '$3.17'],
    ['Total', '$506.34', '$668.84', '$961.34'],
    ['Deposit, 40% of likely', '', '$267.54', ''],
  ]);
  expect(table.note).toBe('Parts are taxed. Sample state rule.');
});

it('a kind of work that the estimate lacks has no row', () => {
  const rows = rowsOf(restorationEstimate({ lines: ESTIMATE.lines.slice(0, 3) }), 'What it comes to').rows;
  expect(rows.map((row) => row.cells[0])).not.toContain('Outside work');
});

it('says the range in words', () => {
  const words = wordsOf(restorationEstimate(), 'How far it may move');
  for (const amount of ['$506.34', '$668.84', '$961.34']) expect(words).toContain(amount);
});

it('names the least certain work first and what may still turn up', () => {
  const words = wordsOf(restorationEstimate(), 'What is not known yet');
  expect(words).toMatch(/Least certain: Rewire the power supply, 4 to 10 h \(\$260 to \$650\); Inspect/);
  expect(words).toMatch(/once the chassis is open/);
});

it('prints the practice’s notes and terms', () => {
  expect(wordsOf(restorationEstimate(), 'Notes and terms')).toContain('kept dry and insured here');
  const without = restorationEstimate({ notes: ' ' });
  expect(without.sections.map((one) => one.heading)).not.toContain('Notes and terms');
});

it('says no tax and no deposit in words', () => {
  const paper = restorationEstimate({ taxTreatment: 'none', depositPercent: '0' });
  const rows = rowsOf(paper, 'What it comes to').rows.map((row) => row.cells);
  expect(rows).toContainEqual(['Tax', 'None', 'None', 'None']);
  expect(paper.figures[1]).toMatchObject({ label: 'Deposit', amount: 'None asked', weight: 'words' });
});

it('an estimate without lines has no sums, only words', () => {
  const paper = restorationEstimate({ lines: [] });
  expect(paper.figures[0]).toMatchObject({ amount: 'Not priced yet', weight: 'words' });
  expect(paper.costAgainstWorth).toBeNull();
  expect(paper.sections.some((one) => one.type === 'table')).toBe(false);
});

it('says which worth is missing instead of a verdict', () => {
  const paper = restorationEstimate({ verdict: null, set: { ...SET, worths: SET.worths.slice(1) } });
  expect(paper.costAgainstWorth).toBeNull();
  expect(wordsOf(paper, 'Cost against worth')).toBe(
    'The worth restored is not on record, so the cost of the work cannot be set against what it adds.',
  );
});

it('names its file after the number and the kind of document', () => {
  expect(fileNameOf(restorationEstimate())).toBe('E-0142 restoration estimate.pdf');
});

it('is about the set and its owner', () => {
  expect(restorationEstimate().subtitle).toBe(
    'Rewire, recap and align. Corvane 9-T, radio, 1938, S-0318, for Wren Łukowska',
  );
  expect(ESTIMATE.set.ownerName).toBe('Wren Łukowska');
});
