import { TestBed } from '@angular/core/testing';
import { Router } from '@angular/router';
import { SetFormPage } from './set-form-page';
import { DETAIL, PageUnderTest } from './testing';

const OWNER = { id: 2, name: 'Wren Okafor', email: '', phone: '', userId: null, setCount: 1 };

async function open(address: string) {
  const path = address === '/sets/new' ? 'sets/new' : 'sets/:id/edit';
  const page = await PageUnderTest.open({ path, component: SetFormPage, role: 'restorer', address });
  await page.answer(page.request('/api/owners'), { items: [OWNER], total: 1 });
  return page;
}

async function openStored() {
  const page = await open('/sets/7/edit');
  await page.answer(page.request('/api/sets/7'), DETAIL);
  return page;
}

const errors = (page: PageUnderTest) =>
  [...page.element.querySelectorAll('mat-error')].map((error) => error.textContent?.trim()).filter(Boolean);

it('sends nothing that the contract refuses, and says what is wrong at its field', async () => {
  const page = await open('/sets/new');
  await page.type('year', '19x1');
  await page.press('Register the set');
  page.http.expectNone(({ method }) => method === 'POST');
  expect(errors(page)).toEqual(['This is needed.', 'This is needed.', 'This is needed.', 'Use a year such as 1941.']);
  expect(page.text).toContain('Some of this cannot be saved yet');
});

it('a price needs its amount, its date and its source together', async () => {
  const page = await open('/sets/new');
  await page.type('kind', 'radio');
  await page.type('maker', 'Halloway');
  await page.type('model', '41-X');
  await page.type('amount', '169.95');
  await page.press('Register the set');
  page.http.expectNone(({ method }) => method === 'POST');
  expect(errors(page)).toEqual(['This is needed.', 'This is needed.']);
  await page.type('amount', '');
  await page.press('Register the set');
  const request = page.request('/api/sets', 'POST');
  expect(request.request.body).toMatchObject({ kind: 'radio', year: null, ownerId: null, priceWhenNew: null });
});

it('sends numbers as numbers and only the hazards ticked', async () => {
  const page = await openStored();
  await page.type('year', '1940');
  await page.press('Save');
  expect(page.request('/api/sets/7', 'PUT').request.body).toMatchObject({
    version: 3,
    year: 1940,
    ownerId: 2,
    priceWhenNew: { amount: '169.95', currency: 'USD', period: '1941', source: 'Dealer sheet' },
    hazards: [{ hazard: 'stored-charge', volts: 385, note: 'Filter cans' }],
  });
});

it('what the server refuses lands on its field, a hazard’s too', async () => {
  const page = await openStored();
  await page.press('Save');
  await page.refuse(page.request('/api/sets/7', 'PUT'), 400, 'invalid-input', {
    fields: [
      { field: 'serial', message: 'This serial is taken.' },
      { field: 'hazards.0.volts', message: 'Too many volts.' },
    ],
  });
  expect(errors(page)).toEqual(['This serial is taken.', 'Too many volts.']);
  expect(page.control('serial').value).toBe('41X-20877');
});

it('shows what the price typed comes to', async () => {
  const page = await open('/sets/new');
  await page.type('amount', '169.95');
  await page.type('period', '1941');
  await page.settle(350);
  const request = page.request('/api/restatements');
  expect(request.request.params.get('from')).toBe('1941');
  await page.answer(request, {
    restated: { amount: '3861.20', currency: 'USD' },
    to: { period: '2026-07', index: '333.918' },
    release: '2026-07',
  });
  expect(page.text).toContain('That is $3,861 in the money of Jul 2026');
  expect(page.text).toContain('It is not what the set is worth.');
});

describe('when somebody else has saved first', () => {
  const THEIRS = { ...DETAIL, version: 4, model: '41-X “Meridian”', updatedAt: '2026-04-15T10:00:00.000Z' };

  async function conflict() {
    const page = await openStored();
    await page.type('serial', 'my-serial');
    await page.press('Save');
    await page.refuse(page.request('/api/sets/7', 'PUT'), 409, 'edit-conflict', { current: THEIRS });
    return page;
  }

  it('says what they changed and keeps what is typed', async () => {
    const page = await conflict();
    const row = [...page.element.querySelectorAll('tw-edit-conflict tbody tr')].map((tr) =>
      [...tr.children].map((cell) => cell.textContent?.trim()),
    );
    expect(row).toEqual([['Model', '41-X', '41-X “Meridian”']]);
    expect(page.control('serial').value).toBe('my-serial');
    expect(page.button('Save').disabled).toBe(true);
  });

  it('saves over the new version when asked', async () => {
    const page = await conflict();
    await page.press('Save mine over theirs');
    const request = page.request('/api/sets/7', 'PUT');
    expect(request.request.body).toMatchObject({ version: 4, serial: 'my-serial', model: '41-X' });
    await page.answer(request, { ...THEIRS, version: 5 });
    expect(TestBed.inject(Router).url).toBe('/sets/7');
  });

  it('loads theirs when asked', async () => {
    const page = await conflict();
    await page.press('Load theirs, drop mine');
    expect(page.control('model').value).toBe('41-X “Meridian”');
    expect(page.control('serial').value).toBe('41X-20877');
    expect(page.element.querySelector('tw-edit-conflict')).toBeNull();
  });
});

it('holds unsaved typing until it is saved', async () => {
  const page = await openStored();
  const form = page.harness.routeDebugElement!.componentInstance as SetFormPage;
  expect(form.hasUnsaved()).toBe(false);
  await page.type('model', 'other');
  expect(form.hasUnsaved()).toBe(true);
  const leaving = new Event('beforeunload', { cancelable: true });
  window.dispatchEvent(leaving);
  expect(leaving.defaultPrevented).toBe(true);
  await page.press('Save');
  await page.answer(page.request('/api/sets/7', 'PUT'), DETAIL);
  expect(form.hasUnsaved()).toBe(false);
});

it('a new owner is put on record and chosen', async () => {
  const page = await open('/sets/new');
  const owner = page.element.querySelector<HTMLInputElement>('tw-owner-field input')!;
  owner.dispatchEvent(new Event('focusin'));
  owner.value = 'Ines Valcourt';
  owner.dispatchEvent(new Event('input'));
  await page.settle();
  const option = [...document.querySelectorAll<HTMLElement>('mat-option')].at(-1)!;
  option.click();
  await page.settle();
  expect(page.control('name').value).toBe('Ines Valcourt');
  await page.press('Add the owner');
  await page.answer(page.request('/api/owners', 'POST'), { ...OWNER, id: 9, name: 'Ines Valcourt' });
  expect(owner.value).toBe('Ines Valcourt');
  await page.type('kind', 'radio');
  await page.type('maker', 'Lyndmoor');
  await page.type('model', '330');
  await page.press('Register the set');
  expect(page.request('/api/sets', 'POST').request.body).toMatchObject({ ownerId: 9 });
});
