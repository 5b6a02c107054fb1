import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting, type TestRequest } from '@angular/common/http/testing';
import type { Type } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MAT_FORM_FIELD_DEFAULT_OPTIONS } from '@angular/material/form-field';
import { provideRouter } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import type { Session } from '../../../contracts/session';
import type { SetDetail, SetSummary } from '../../../contracts/sets';
import type { Role } from '../../../domain/access/policy';
import type { Period } from '../../../domain/calendar/period';
import { SessionStore } from '../../core/session';
import { provideIcons } from '../../ui/provide-icons';

export const SUMMARY: SetSummary = {
  id: 7,
  number: 'S-0007',
  kind: 'radio',
  maker: 'Halloway',
  model: '41-X',
  year: 1941,
  ownerName: 'Wren Okafor',
  photo: null,
  priceWhenNew: { amount: '169.95', currency: 'USD', period: '1941' as Period, source: 'Dealer sheet' },
  restated: { amount: '3861.20', currency: 'USD' },
  worthAsFound: { amount: '650.00', currency: 'USD' },
  worthRestored: null,
  archived: false,
  updatedAt: '2026-04-14T09:00:00.000Z',
};

export const DETAIL: SetDetail = {
  id: 7,
  number: 'S-0007',
  version: 3,
  kind: 'radio',
  maker: 'Halloway',
  model: '41-X',
  description: 'Eleven tubes',
  chassis: '',
  serial: '41X-20877',
  year: 1941,
  ownerId: 2,
  ownerName: 'Wren Okafor',
  priceWhenNew: SUMMARY.priceWhenNew,
  priceIsPublic: false,
  provenance: '',
  alterations: '',
  notes: '',
  hazards: [{ hazard: 'stored-charge', volts: 385, note: 'Filter cans' }],
  archived: false,
  updatedAt: '2026-04-14T09:00:00.000Z',
  restated: null,
  condition: [],
  worths: [],
  photos: [],
};

const person = (role: Role) => ({ id: 1, name: 'Nell Harrow', email: 'nell@quayside.example', role });

/** A page on its address, signed in with a role, over a server that the spec plays. */
export class PageUnderTest {
  private constructor(
    readonly http: HttpTestingController,
    readonly harness: RouterTestingHarness,
  ) {}

  static async open(options: { path: string; component: Type<unknown>; role: Role; address: string }) {
    TestBed.configureTestingModule({
      providers: [
        provideIcons(),
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([
          { path: options.path, component: options.component },
          { path: 'elsewhere', children: [] },
          { path: 'sets/:id', children: [] },
        ]),
        { provide: MAT_FORM_FIELD_DEFAULT_OPTIONS, useValue: { appearance: 'outline', floatLabel: 'always' } },
      ],
    });
    const http = TestBed.inject(HttpTestingController);
    TestBed.inject(SessionStore).load().subscribe();
    const session: Session = {
      user: person(options.role),
      needsSetup: false,
      demo: true,
      practiceName: 'Quayside Set Works',
    };
    http.expectOne('/api/session').flush(session);
    const page = new PageUnderTest(http, await RouterTestingHarness.create());
    await page.harness.navigateByUrl(options.address);
    await page.settle();
    return page;
  }

  get element(): HTMLElement {
    return this.harness.fixture.nativeElement as HTMLElement;
  }

  get text(): string {
    return (this.element.textContent ?? '').replace(/\s+/g, ' ');
  }

  /** Lets what is due happen. Not `whenStable`: that waits for answers which the spec has yet to give. */
  async settle(ms = 0): Promise<void> {
    for (const pause of [ms, 0, 0]) {
      await new Promise((resolve) => setTimeout(resolve, pause));
      this.harness.detectChanges();
    }
  }

  /** The one request to a path that waits for its answer. */
  request(path: string, method = 'GET'): TestRequest {
    return this.http.expectOne(({ url, method: used }) => url === path && used === method);
  }

  async answer(request: TestRequest, body: object): Promise<void> {
    request.flush(body);
    await this.settle();
  }

  async refuse(request: TestRequest, status: number, code: string, more: object = {}): Promise<void> {
    request.flush({ type: `/problems/${code}`, title: 'Refused', status, ...more }, { status, statusText: 'Refused' });
    await this.settle();
  }

  button(name: string): HTMLButtonElement {
    const found = [...this.element.querySelectorAll<HTMLButtonElement>('button, a')].find(
      (button) => (button.getAttribute('aria-label') ?? button.textContent ?? '').trim() === name,
    );
    if (found === undefined) throw new Error(`no button «${name}» in: ${this.text}`);
    return found;
  }

  async press(name: string): Promise<void> {
    this.button(name).click();
    await this.settle();
  }

  control(name: string): HTMLInputElement {
    const found = this.element.querySelector<HTMLInputElement>(`[formControlName="${name}"]`);
    if (found === null) throw new Error(`no field «${name}»`);
    return found;
  }

  async type(name: string, value: string): Promise<void> {
    const field = this.control(name);
    field.value = value;
    field.dispatchEvent(new Event(field.tagName === 'SELECT' ? 'change' : 'input'));
    field.dispatchEvent(new Event('blur'));
    await this.settle();
  }
}
