import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import type { Practice } from '../../../contracts/practice';
import { provideIcons } from '../../ui/provide-icons';
import { PracticePage } from './practice-page';

const practice: Practice = {
  name: 'Quayside Set Works',
  address: '',
  phone: '',
  email: '',
  currency: 'USD',
  labourRate: '68.00',
  partsMarkupPercent: '35',
  outsideMarkupPercent: '15',
  taxTreatment: 'parts',
  taxRatePercent: '7.375',
  taxNote: '',
  depositPercent: '40',
  paperSize: 'letter',
  version: 3,
};

let fixture: ComponentFixture<PracticePage>;
let http: HttpTestingController;
let page: HTMLElement;

const settle = async () => {
  await fixture.whenStable();
  fixture.detectChanges();
};
const field = (name: string) => page.querySelector<HTMLInputElement>(`[formControlName="${name}"]`)!;
const type = (name: string, value: string) => {
  field(name).value = value;
  field(name).dispatchEvent(new Event('input'));
};
const submit = () => page.querySelector('form')!.dispatchEvent(new Event('submit'));
const save = () => {
  submit();
  return http.expectOne({ method: 'PUT', url: '/api/practice' });
};
const text = () => page.textContent?.replace(/\s+/g, ' ') ?? '';

beforeEach(async () => {
  TestBed.configureTestingModule({ providers: [provideHttpClient(), provideHttpClientTesting(), provideIcons()] });
  fixture = TestBed.createComponent(PracticePage);
  http = TestBed.inject(HttpTestingController);
  page = fixture.nativeElement as HTMLElement;
  fixture.detectChanges();
  http.expectOne('/api/practice').flush(practice);
  await settle();
});

describe('PracticePage', () => {
  it('saves what is typed, over the version it was read at', async () => {
    type('labourRate', '72.50');
    expect(fixture.componentInstance.hasUnsaved()).toBe(true);
    const request = save();
    expect(request.request.body).toEqual({ ...practice, labourRate: '72.50' });
    request.flush({ ...practice, labourRate: '72.50', version: 4 });
    await settle();
    expect(fixture.componentInstance.hasUnsaved()).toBe(false);
  });

  it('works the settings out as they are typed, and not from what cannot be used', async () => {
    type('partsMarkupPercent', '50');
    await settle();
    expect(text()).toContain('billed at $15.00');
    type('partsMarkupPercent', '5,0');
    await settle();
    expect(text()).not.toContain('billed at $15.00');
    submit();
    await settle();
    expect(text()).toContain('Use a percentage such as 7.25');
    http.expectNone('/api/practice');
  });

  it('puts what the server refuses on its field', async () => {
    const request = save();
    request.flush(
      {
        type: '/problems/invalid-input',
        title: 'Some of what was sent cannot be used',
        status: 400,
        fields: [{ field: 'taxNote', message: 'Keep it to 200 characters.' }],
      },
      { status: 400, statusText: 'Bad Request' },
    );
    await settle();
    expect(page.querySelector('mat-error')?.textContent).toContain('Keep it to 200 characters.');
  });

  it('loses nothing when somebody else saved first, and saves over theirs only knowingly', async () => {
    type('labourRate', '72.50');
    save().flush(
      {
        type: '/problems/edit-conflict',
        title: 'Somebody else has changed this since you opened it',
        status: 409,
        current: { ...practice, labourRate: '70.00', phone: '(218) 555-0142', version: 4 },
      },
      { status: 409, statusText: 'Conflict' },
    );
    await settle();
    expect(field('labourRate').value).toBe('72.50');
    expect(field('phone').value).toBe('(218) 555-0142');
    expect(page.querySelector('tw-settings-conflict')?.textContent).toContain('70.00');

    const again = save();
    expect(again.request.body).toMatchObject({ labourRate: '72.50', phone: '(218) 555-0142', version: 4 });
    again.flush({ ...practice, labourRate: '72.50', phone: '(218) 555-0142', version: 5 });
    await settle();
    expect(page.querySelector('tw-settings-conflict')).toBeNull();
  });

  it('takes theirs where one says so', async () => {
    type('labourRate', '72.50');
    save().flush(
      {
        type: '/problems/edit-conflict',
        title: 'x',
        status: 409,
        current: { ...practice, labourRate: '70.00', version: 4 },
      },
      { status: 409, statusText: 'Conflict' },
    );
    await settle();
    page.querySelector<HTMLButtonElement>('tw-settings-conflict button')!.click();
    await settle();
    expect(field('labourRate').value).toBe('70.00');
    expect(fixture.componentInstance.hasUnsaved()).toBe(false);
  });
});
