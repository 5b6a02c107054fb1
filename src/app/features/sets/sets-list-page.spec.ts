import { TestBed } from '@angular/core/testing';
import { Router } from '@angular/router';
import type { Role } from '../../../domain/access/policy';
import { SetsListPage } from './sets-list-page';
import { PageUnderTest, SUMMARY } from './testing';

beforeEach(() => localStorage.clear());

const address = () => TestBed.inject(Router).url;
const MAKERS = ['Corvane', 'Halloway'];

async function open(path = '/sets', role: Role = 'restorer') {
  const page = await PageUnderTest.open({ path: 'sets', component: SetsListPage, role, address: path });
  if (role !== 'collector')
    await page.answer(page.request('/api/owners'), {
      items: [{ id: 2, name: 'Wren Okafor', email: '', phone: '', userId: null, setCount: 1 }],
      total: 1,
    });
  return page;
}

async function openWith(reply: object, path = '/sets', role: Role = 'restorer') {
  const page = await open(path, role);
  await page.answer(page.request('/api/sets'), { makers: MAKERS, ...reply });
  return page;
}

it('shows skeleton rows until the sets come, then the rows', async () => {
  const page = await open();
  expect(page.element.querySelector('tw-skeleton-rows')).not.toBeNull();
  await page.answer(page.request('/api/sets'), { items: [SUMMARY], total: 1, makers: MAKERS });
  expect(page.element.querySelector('tw-skeleton-rows')).toBeNull();
  const cells = [...page.element.querySelectorAll('tbody tr > *')].map((cell) => cell.textContent?.trim());
  expect(cells.slice(1)).toEqual([
    'S-0007',
    '1941',
    'Wren Okafor',
    '$169.95',
    '$3,861',
    '$650',
    'Not known', // never $0
  ]);
  expect(page.text).toContain('One set');
});

it('says when the sets did not load, and tries again', async () => {
  const page = await open();
  await page.refuse(page.request('/api/sets'), 500, 'server-error');
  expect(page.text).toContain('The sets did not load');
  await page.press('Try again');
  await page.answer(page.request('/api/sets'), { items: [SUMMARY], total: 1, makers: MAKERS });
  expect(page.text).toContain('Halloway 41-X');
});

it('an empty practice offers the first step to those who may take it', async () => {
  const page = await openWith({ items: [], total: 0 });
  expect(page.button('Register the first set').getAttribute('href')).toBe('/sets/new');
});

it('a collector without sets is offered nothing to register', async () => {
  const page = await openWith({ items: [], total: 0 }, '/sets', 'collector');
  expect(page.text).toContain('No sets yet');
  expect(page.element.querySelector('a[href="/sets/new"]')).toBeNull();
});

it('no matches: filters can be cleared', async () => {
  const page = await openWith({ items: [], total: 0 }, '/sets?q=zither&kind=radio&sort=maker');
  expect(page.text).toContain('No set matches');
  await page.press('Clear filters');
  expect(address()).toBe('/sets?sort=maker');
  expect(page.request('/api/sets').request.params.get('q')).toBeNull();
});

it('asks the server for what the address says, and ignores what cannot be used', async () => {
  const page = await open('/sets?q=walnut&kind=gramophone&maker=Corvane&state=all&ownerId=x&sort=-year&page=2');
  const { params } = page.request('/api/sets').request;
  expect(Object.fromEntries(params.keys().map((key) => [key, params.get(key)]))).toEqual({
    q: 'walnut',
    maker: 'Corvane',
    state: 'all',
    sort: '-year',
    page: '2',
    pageSize: '25',
  });
});

it('filters and order go into the address, and begin at the first page', async () => {
  const page = await openWith({ items: [SUMMARY], total: 60 }, '/sets?page=2');
  const kind = page.element.querySelectorAll('select')[0]!;
  kind.value = 'radio';
  kind.dispatchEvent(new Event('change'));
  await page.settle();
  expect(address()).toBe('/sets?kind=radio');
  await page.answer(page.request('/api/sets'), { items: [SUMMARY], total: 60, makers: MAKERS });
  await page.press('Year');
  expect(address()).toBe('/sets?kind=radio&sort=year');
  await page.answer(page.request('/api/sets'), { items: [SUMMARY], total: 60, makers: MAKERS });
  await page.press('Year');
  expect(address()).toBe('/sets?kind=radio&sort=-year');
  expect(page.element.querySelector('th[aria-sort=descending]')?.textContent).toContain('Year');
});

it('typing searches after a pause, once', async () => {
  const page = await openWith({ items: [SUMMARY], total: 1 });
  const search = page.element.querySelector<HTMLInputElement>('input[type=search]')!;
  for (const typed of ['c', 'co', 'cor ']) {
    search.value = typed;
    search.dispatchEvent(new Event('input'));
  }
  await page.settle(350);
  expect(page.request('/api/sets').request.params.get('q')).toBe('cor');
  expect(address()).toBe('/sets?q=cor');
});

it('keeps the rows while the next page is on its way', async () => {
  const page = await openWith({ items: [SUMMARY], total: 60 });
  await page.press('Next page');
  expect(address()).toBe('/sets?page=2');
  expect(page.text).toContain('Halloway 41-X');
  expect(page.element.querySelector('[aria-busy=true]')).not.toBeNull();
});

it('a page past the end gives way to the last one', async () => {
  await openWith({ items: [], total: 30 }, '/sets?page=9');
  expect(address()).toBe('/sets?page=2');
});

it('remembers the last filter for the same person, without its page', async () => {
  const first = await openWith({ items: [SUMMARY], total: 60 }, '/sets?kind=radio');
  await first.press('Next page');
  TestBed.resetTestingModule();
  await open('/sets');
  expect(address()).toBe('/sets?kind=radio');
});

it('an address with a query of its own is not overruled by what is remembered', async () => {
  const first = await openWith({ items: [SUMMARY], total: 60 }, '/sets?kind=radio');
  await first.press('Next page');
  TestBed.resetTestingModule();
  await open('/sets?q=meridian');
  expect(address()).toBe('/sets?q=meridian');
});
