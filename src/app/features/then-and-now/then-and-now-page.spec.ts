import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting, type TestRequest } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { toIndexSeries } from '../../../contracts/series';
import type { Period } from '../../../domain/calendar/period';
import type { PlainDecimal } from '../../../domain/money/money';
import { restate } from '../../../domain/restatement/restate';
import { expectOk } from '../../../domain/result';
import { provideIcons } from '../../ui/provide-icons';
import { FIGURES, SERIES } from './testing';
import { ThenAndNowPage } from './then-and-now-page';
import { YearlyChart } from './yearly-chart';

@Component({ selector: 'tw-yearly-chart', template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class NoChart {
  readonly shown = input();
  readonly series = input();
}

const index = toIndexSeries(SERIES, FIGURES);
const wait = (ms: number) => new Promise((resolve) => setTimeout(resolve, ms));

let http: HttpTestingController;
let harness: RouterTestingHarness;
let page: HTMLElement;

/** The server's answer to a request for a restatement, by the same rule. */
function answer(request: TestRequest) {
  const { params } = request.request;
  const value = expectOk(
    restate({
      series: index,
      amount: params.get('amount') as PlainDecimal,
      from: params.get('from') as Period,
      to: params.get('to') as Period,
    }),
  );
  request.flush({
    series: SERIES.id,
    release: SERIES.release,
    from: value.from,
    to: value.to,
    factor: value.factor,
    original: { amount: value.original, currency: 'USD' },
    restated: { amount: value.restated, currency: 'USD' },
    bands: { rounding: value.rounding, withinYear: value.withinYear },
    basis: value.basis,
  });
}

/** Lets so much time pass. Not `whenStable`: that waits for answers which the specs have yet to give. */
const settle = async (ms = 0) => {
  for (const pause of [ms, 0, 0]) {
    await wait(pause);
    harness.detectChanges();
  }
};
/** The requests for a restatement that have come by now; waits for the first. */
async function asked(): Promise<TestRequest[]> {
  for (let tries = 0; tries < 200; tries++) {
    await settle(10);
    const requests = http.match(({ url }) => url.startsWith('/api/restatements'));
    if (requests.length > 0) return requests;
  }
  throw new Error('the server was not asked');
}
/** Waits until the page is as it should be; the expectation that follows says what it is instead. */
async function until(condition: () => boolean): Promise<void> {
  for (let tries = 0; tries < 200 && !condition(); tries++) await settle(10);
}
const address = () => TestBed.inject(Router).url;
const text = () => page.textContent?.replace(/\s+/g, ' ') ?? '';
const type = (control: string, value: string) => {
  const field = page.querySelector<HTMLInputElement | HTMLSelectElement>(`[formControlName="${control}"]`)!;
  field.value = value;
  field.dispatchEvent(new Event(field.tagName === 'SELECT' ? 'change' : 'input'));
};

async function open(address: string, figures = true) {
  TestBed.overrideComponent(ThenAndNowPage, { remove: { imports: [YearlyChart] }, add: { imports: [NoChart] } });
  TestBed.configureTestingModule({
    providers: [
      provideIcons(),
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([{ path: 'then-and-now', component: ThenAndNowPage }]),
    ],
  });
  http = TestBed.inject(HttpTestingController);
  harness = await RouterTestingHarness.create();
  await harness.navigateByUrl(address);
  page = harness.routeNativeElement!;
  http.expectOne('/api/series').flush({ items: [SERIES], total: 1 });
  http.expectOne('/api/list-prices').flush({ items: [], total: 0 });
  await settle();
  const request = http.expectOne('/api/series/us-cpi-u/figures');
  if (figures) request.flush({ series: SERIES.id, release: SERIES.release, figures: FIGURES });
  await settle();
}

it('shows at once what the figures give, then what the server answers', async () => {
  await open('/then-and-now?amount=169.95&from=1941');
  expect(text()).toContain('$3,874.43');
  const [request] = await asked();
  expect(request?.request.params.toString()).toBe('amount=169.95&from=1941&to=2026-05&series=us-cpi-u');
  answer(request!);
  await settle();
  expect(text()).toContain('Restated to May 2026');
  expect(text()).toContain('$3,861 to $3,888');
  expect(text()).toContain('14.7 stands for anything from 14.65 to 14.75');
  expect(text()).toContain('paid when prices stood highest in 1941');
  expect(text()).toContain('It is not what the set is worth.');
});

it('lets the server’s answer stand over its own', async () => {
  await open('/then-and-now?amount=100&from=1941&to=2024');
  const request = (await asked())[0]!;
  request.flush({
    series: SERIES.id,
    release: '2026-06',
    from: { period: '1941', index: '14.7' },
    to: { period: '2024', index: '313.700' },
    factor: '21.340136',
    original: { amount: '100', currency: 'USD' },
    restated: { amount: '2134.01', currency: 'USD' },
    bands: { rounding: { low: '2126.78', high: '2141.30' }, withinYear: null },
    basis: 'As the server says.',
  });
  await settle();
  expect(text()).toContain('$2,134.01');
  expect(text()).toContain('As the server says.');
});

it('asks the server for what was typed last, and carries it in the address', async () => {
  await open('/then-and-now?amount=169.95&from=1941&to=2024&series=us-cpi-u');
  (await asked()).forEach(answer);
  for (const typed of ['3', '39', '39.95']) type('amount', typed);
  await settle();
  expect(text()).toContain('$39.95');
  expect((await asked()).map(({ request }) => request.params.get('amount'))).toEqual(['39.95']);
  await until(() => address().includes('39.95'));
  expect(address()).toBe('/then-and-now?amount=39.95&from=1941&to=2024&series=us-cpi-u');
});

it('names what would do for a price that is none, and keeps the last result', async () => {
  await open('/then-and-now?amount=169.95&from=1941&to=2024&series=us-cpi-u');
  type('amount', '1,250');
  page.querySelector('[formControlName="amount"]')!.dispatchEvent(new Event('blur'));
  await settle(300);
  expect(text()).toContain('Use a plain number such as 39.95');
  expect(text()).toContain('$169.95');
  expect(address()).toContain('amount=169.95');
});

it('refuses a month never published and offers its neighbours', async () => {
  await open('/then-and-now?amount=39.95&from=1941&to=2025-10&series=us-cpi-u');
  expect(text()).toContain('No figure was ever published for Oct 2025.');
  expect(page.querySelector('tw-the-sum')).toBeNull();
  const buttons = [...page.querySelectorAll<HTMLButtonElement>('tw-refusal button')];
  expect(buttons.map((button) => button.textContent?.trim())).toEqual(['Use Sep 2025', 'Use Nov 2025']);
  buttons[1]!.click();
  await until(() => address().includes('2025-11'));
  expect(text()).toContain('Restated to Nov 2025');
  expect(address()).toContain('to=2025-11');
});

it('shows a refusal of the server where the figures are not there to tell', async () => {
  await open('/then-and-now?amount=39.95&from=1911&to=2024&series=us-cpi-u', false);
  (await asked())[0]!.flush(
    {
      type: '/problems/period-not-published',
      title: 'The index has no published figure for this period',
      status: 422,
      detail: 'The index begins after 1911.',
      fields: [{ field: 'from', value: '1911', message: 'The index begins after 1911.' }],
      neighbours: ['1913'],
    },
    { status: 422, statusText: 'Unprocessable Content' },
  );
  await settle();
  expect(text()).toContain('The index begins after 1911.');
  page.querySelector<HTMLButtonElement>('tw-refusal button')!.click();
  expect((await asked()).map(({ request }) => request.params.get('from'))).toEqual(['1913']);
});

it('says that the server cannot be reached, goes on from the figures at hand, and tries again', async () => {
  await open('/then-and-now?amount=100&from=1929&to=1933&series=us-cpi-u');
  (await asked())[0]!.error(new ProgressEvent('error'));
  await settle();
  expect(text()).toContain('The server cannot be reached.');
  expect(text()).toContain('$76.02');
  page.querySelector<HTMLButtonElement>('.again')!.click();
  (await asked()).forEach(answer);
  await settle();
  expect(text()).not.toContain('cannot be reached');
});

it('offers to try again when the series did not load', async () => {
  TestBed.configureTestingModule({
    providers: [
      provideIcons(),
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([{ path: 'then-and-now', component: ThenAndNowPage }]),
    ],
  });
  http = TestBed.inject(HttpTestingController);
  harness = await RouterTestingHarness.create();
  await harness.navigateByUrl('/then-and-now');
  page = harness.routeNativeElement!;
  http.expectOne('/api/series').error(new ProgressEvent('error'));
  await settle();
  expect(page.querySelector('tw-failed')).not.toBeNull();
});

it('moves the needle with the keys and begins one entry of the history for it', async () => {
  await open('/then-and-now?amount=169.95&from=1940&to=2024&series=us-cpi-u');
  (await asked()).forEach(answer);
  const navigate = jest.spyOn(TestBed.inject(Router), 'navigate');
  const slider = page.querySelector<HTMLElement>('[role="slider"]')!;
  const press = async (times: number) => {
    slider.dispatchEvent(new KeyboardEvent('keydown', { key: 'ArrowRight', cancelable: true }));
    await until(() => navigate.mock.calls.length === times);
  };
  await press(1);
  await press(2);
  expect(navigate.mock.calls.map(([, extras]) => [extras?.queryParams?.['from'], extras?.replaceUrl])).toEqual([
    ['1941', false],
    ['2007', true],
  ]);
});

it('takes what an address of the history asks', async () => {
  await open('/then-and-now?amount=169.95&from=1941&to=2024&series=us-cpi-u');
  await harness.navigateByUrl('/then-and-now?amount=100&from=1929&to=1933&series=us-cpi-u');
  await settle();
  expect(page.querySelector<HTMLInputElement>('[formControlName="toYear"]')?.value).toBe('1933');
  expect(text()).toContain('$76.02');
});
