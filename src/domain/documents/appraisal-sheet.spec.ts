import { appraisalSheet, RESTATED, SET } from '../../../tests/support/papers';
import type { Paper, PaperSection } from './paper';

const section = <T extends PaperSection['type']>(paper: Paper, type: T, heading: string) => {
  const found = paper.sections.find((one) => one.heading === heading);
  if (found?.type !== type) throw new Error(`no ${type} «${heading}»`);
  return found as Extract<PaperSection, { type: T }>;
};
const figure = (paper: Paper, label: string) => paper.figures.find((one) => one.label === label);
const text = (paper: Paper) => JSON.stringify(paper);

it('says who it is about, who prepared it and in what capacity, and that it is a working sheet', () => {
  const paper = appraisalSheet();
  expect(paper.reference).toBe('S-0318');
  expect(paper.subtitle).toBe('Corvane 9-T, radio, 1938, for Wren Łukowska');
  expect(paper.preparedBy).toEqual({ name: 'Rui Restorer', capacity: 'restorer, Quayside Set Works' });
  expect(paper.standing).toMatch(/working sheet.*not an appraisal report/i);
});

it('is a working sheet even when an appraiser prepares it', () => {
  const paper = appraisalSheet({ preparedBy: { name: 'Ana', role: 'appraiser' } });
  expect(paper.preparedBy.capacity).toBe('appraiser, Quayside Set Works');
  expect(paper.standing).toMatch(/no appraiser has signed it/);
});

it('shows the price when new to the cent and light, today’s money with «about», heavy, with both bands and its basis', () => {
  const paper = appraisalSheet();
  expect(figure(paper, 'Cost when new')).toEqual({
    label: 'Cost when new',
    amount: '$39.95',
    weight: 'light',
    range: null,
    basis: 'In 1938. Source: Maker’s price list',
  });
  const now = figure(paper, 'In today’s money');
  expect(now).toMatchObject({ amount: 'about $538', weight: 'heavy' });
  expect(now?.range).toBe('$537 to $539 by index rounding; $528 to $546 by month of 1938');
  expect(now?.basis).toMatch(/TEST0001, release 2026-07, 1938 average to Jul 2026/);
});

it('keeps the restated price and worth apart, in words', () => {
  const paper = appraisalSheet();
  expect(section(paper, 'paragraphs', 'A restated price is not worth').paragraphs.join()).toMatch(
    /not what the set is worth/,
  );
});

it('works the restated price to the cent in its own section', () => {
  const rows = section(appraisalSheet(), 'facts', 'Cost when new, and in today’s money').rows;
  const value = (label: string) => rows.find((row) => row.label === label)?.value;
  expect(value('In today’s money')).toContain(RESTATED.restatement.restated);
  for (const end of ['low', 'high'] as const) {
    expect(value('Rounding band')).toContain(RESTATED.restatement.rounding[end]);
    expect(value('Within-year band')).toContain(RESTATED.restatement.withinYear?.[end]);
  }
  expect(value('Basis')).toBe(RESTATED.restatement.basis);
});

it('shows the worths in force with type of value, range, person, basis and date', () => {
  const paper = appraisalSheet();
  expect(figure(paper, 'Worth as found')).toMatchObject({ amount: '$140', range: null });
  expect(figure(paper, 'Worth restored')).toMatchObject({ amount: '$950', range: '$850 to $1,100' });
  const cells = section(paper, 'table', 'Worth').rows.map((row) => row.cells);
  expect(cells).toContainEqual(['Type of value', 'Fair market value', 'Fair market value']);
  expect(cells).toContainEqual(['Who says so', 'Rui Restorer', 'Idris Bellweather']);
  expect(cells).toContainEqual(['Effective', '10 Apr 2026', '14 Apr 2026']);
  expect(text(paper)).not.toContain('Superseded');
});

it('gives the present condition of each part, in the order of an inspection', () => {
  const rows = section(appraisalSheet(), 'table', 'Condition by part').rows.map((row) => row.cells);
  expect(rows).toEqual([
    ['Cabinet', '3 Sound', 'Veneer lifting at the left rear.', '14 Apr 2026'],
    ['Wiring', '1 Poor', 'Rubber insulation crumbles.', '14 Apr 2026'],
  ]);
});

it('prints recorded voltages and what to do, and defers to local codes', () => {
  const cautions = section(appraisalSheet(), 'cautions', 'Cautions');
  expect(cautions.items[0]?.title).toContain('385 V');
  expect(cautions.items[1]?.whatToDo).toContain('Paper behind the rectifier.');
  expect(cautions.note).toMatch(/Local codes/);
});

it('says that no recorded hazard does not mean safe', () => {
  const cautions = section(appraisalSheet({ set: { ...SET, hazards: [] } }), 'cautions', 'Cautions');
  expect(cautions.items[0]?.whatToDo).toMatch(/Do not plug in an untested set/);
});

it('carries the chart and the verdict of the estimate', () => {
  const paper = appraisalSheet();
  expect(paper.costAgainstWorth).toMatchObject({ asFound: 140, asRestored: 950, restoredLow: 850, restoredHigh: 1100 });
  const words = section(paper, 'cost-against-worth', 'Cost against worth').paragraphs.join(' ');
  expect(words).toContain('At the likely cost the work adds more than it costs');
  for (const amount of ['$668.84', '+$810', '+$141.16', '−$151.34']) expect(words).toContain(amount);
});

it('says so when two worths are of different types', () => {
  const worths = SET.worths.map((worth, i) => (i === 0 ? { ...worth, valueType: 'replacement' as const } : worth));
  expect(text(appraisalSheet({ set: { ...SET, worths } }))).toMatch(/worths are of different types/);
});

it('puts what is unknown in words, never as a zero', () => {
  const paper = appraisalSheet({
    set: { ...SET, priceWhenNew: null, worths: [], condition: [], year: null, serial: '', ownerName: null },
    restated: null,
    estimate: null,
  });
  expect(paper.figures.map((one) => [one.amount, one.weight])).toEqual([
    ['Not on record', 'words'],
    ['Not known', 'words'],
    ['Not on record', 'words'],
    ['Not on record', 'words'],
  ]);
  expect(paper.yearScale).toBeNull();
  expect(paper.costAgainstWorth).toBeNull();
  expect(text(paper)).not.toMatch(/\$0|"null|undefined/);
  expect(section(paper, 'paragraphs', 'Worth').paragraphs).toHaveLength(1);
});

it('says why a price cannot be restated', () => {
  const reason = 'The index begins after 1905.';
  const paper = appraisalSheet({ restated: { known: false, reason } });
  expect(figure(paper, 'In today’s money')).toMatchObject({ amount: 'Not restated', weight: 'words', basis: reason });
  expect(paper.yearScale).toBeNull();
});

it('sends tax, insurance and legal questions to those who answer for them', () => {
  expect(section(appraisalSheet(), 'paragraphs', 'Limits').paragraphs.join(' ')).toMatch(/tax, insurance and law/);
});
