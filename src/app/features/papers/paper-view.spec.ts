import { TestBed } from '@angular/core/testing';
import { amountsIn, appraisalSheet, restorationEstimate } from '../../../../tests/support/papers';
import type { Paper } from '../../../domain/documents/paper';
import { PaperView } from './paper-view';

function shown(paper: Paper): HTMLElement {
  const fixture = TestBed.createComponent(PaperView);
  fixture.componentRef.setInput('paper', paper);
  fixture.detectChanges();
  return fixture.nativeElement as HTMLElement;
}
const textOf = (element: Element | null) => (element?.textContent ?? '').replace(/\s+/g, ' ').trim();

it.each<[string, Paper]>([
  ['appraisal sheet', appraisalSheet()],
  ['restoration estimate', restorationEstimate()],
])('the %s shows every amount and every section of its content', (_, paper) => {
  const page = shown(paper);
  const text = textOf(page);
  const amounts = amountsIn(JSON.stringify(paper));
  expect(amountsIn(text)).toEqual(expect.arrayContaining(amounts));
  expect([...page.querySelectorAll('h2')].map(textOf)).toEqual(paper.sections.map((section) => section.heading));
  for (const words of [paper.title, paper.subtitle, paper.standing, paper.preparedBy.name, paper.preparedBy.capacity])
    expect(text).toContain(words);
});

it('names the document in its one first-level heading', () => {
  const headings = [...shown(appraisalSheet()).querySelectorAll('h1')];
  expect(headings.map(textOf)).toEqual(['Appraisal sheet']);
});

it('draws the year scale with its sentence for those who do not see it', () => {
  const scale = shown(appraisalSheet()).querySelector('tw-paper-year-scale');
  expect(scale?.getAttribute('role')).toBe('img');
  expect(scale?.getAttribute('aria-label')).toBe('$39.95 paid in 1938 is about $538 in the money of Jul 2026.');
  expect(textOf(scale)).toContain('about $538');
});

it('without a price when new there is no scale, and words stand for amounts', () => {
  const page = shown(appraisalSheet({ restated: null, estimate: null }));
  expect(page.querySelector('tw-paper-year-scale')).toBeNull();
  expect([...page.querySelectorAll('.amount--words')].map(textOf)).toEqual(['Not known']);
});

it('heads table rows and columns, figures to the right', () => {
  const tables = [...shown(restorationEstimate()).querySelectorAll('table')];
  const heads = [...(tables[0]?.querySelectorAll('thead th[scope=col]') ?? [])].map(textOf);
  expect(heads).toEqual(['Work', 'Kind', 'Hours or quantity', 'Amount']);
  const last = tables[0]?.querySelector('tbody tr:last-child');
  expect(textOf(last?.querySelector('th[scope=row]') ?? null)).toBe('All stages, before tax');
  expect(textOf(last?.querySelector('td.right:last-child') ?? null)).toBe('$665.67');
});
