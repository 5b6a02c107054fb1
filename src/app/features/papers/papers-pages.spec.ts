import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { appraisalSheet, restorationEstimate } from '../../../../tests/support/papers';
import { PAPERS_ROUTES } from './papers.routes';

let http: HttpTestingController;
beforeEach(() => {
  TestBed.configureTestingModule({
    providers: [provideHttpClient(), provideHttpClientTesting(), provideRouter(PAPERS_ROUTES)],
  });
  http = TestBed.inject(HttpTestingController);
});

async function opened(address: string): Promise<{ page: HTMLElement; stable: () => Promise<unknown> }> {
  const harness = await RouterTestingHarness.create(address);
  return { page: harness.routeNativeElement as HTMLElement, stable: () => harness.fixture.whenStable() };
}
const links = (page: HTMLElement) =>
  [...page.querySelectorAll('a')].map((link) => [link.textContent?.trim(), link.getAttribute('href')]);

it('the sheet of a set, with the estimate named in the address, and its files', async () => {
  const { page, stable } = await opened('/sets/7/appraisal-sheet?estimate=12');
  http.expectOne('/api/sets/7/appraisal-sheet?estimateId=12').flush(appraisalSheet());
  await stable();
  expect(page.querySelector('h1')?.textContent).toBe('Appraisal sheet');
  expect(links(page)).toEqual([
    ['Back to the set', '/sets/7'],
    ['PDF, Letter', '/api/sets/7/appraisal-sheet.pdf?paper=letter&estimateId=12'],
    ['PDF, A4', '/api/sets/7/appraisal-sheet.pdf?paper=a4&estimateId=12'],
  ]);
});

it('the estimate and its files', async () => {
  const { page, stable } = await opened('/estimates/12/restoration-estimate');
  http.expectOne('/api/estimates/12/restoration-estimate').flush(restorationEstimate());
  await stable();
  expect(page.querySelector('h1')?.textContent).toBe('Restoration estimate');
  expect(links(page)).toEqual([
    ['Back to the estimate', '/estimates/12'],
    ['PDF, Letter', '/api/estimates/12/restoration-estimate.pdf?paper=letter'],
    ['PDF, A4', '/api/estimates/12/restoration-estimate.pdf?paper=a4'],
  ]);
});

it('prints the page', async () => {
  const print = jest.spyOn(window, 'print').mockImplementation(() => undefined);
  const { page, stable } = await opened('/estimates/12/restoration-estimate');
  http.expectOne('/api/estimates/12/restoration-estimate').flush(restorationEstimate());
  await stable();
  page.querySelector('button')?.click();
  expect(print).toHaveBeenCalledTimes(1);
});

it('says why a document did not load, and loads it when asked again', async () => {
  const { page, stable } = await opened('/sets/7/appraisal-sheet');
  http.expectOne('/api/sets/7/appraisal-sheet').error(new ProgressEvent('error'));
  await stable();
  expect(page.querySelector('tw-failed')?.textContent).toContain('The server does not answer');
  expect(links(page)).toEqual([['Back to the set', '/sets/7']]);
  page.querySelector<HTMLButtonElement>('tw-failed button')?.click();
  await stable();
  http.expectOne('/api/sets/7/appraisal-sheet').flush(appraisalSheet());
  await stable();
  expect(page.querySelector('h1')?.textContent).toBe('Appraisal sheet');
});
