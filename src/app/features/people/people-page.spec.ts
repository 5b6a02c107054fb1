import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatDialog } from '@angular/material/dialog';
import { MatDialogHarness } from '@angular/material/dialog/testing';
import { MatMenuHarness } from '@angular/material/menu/testing';
import { MatSelectHarness } from '@angular/material/select/testing';
import { firstValueFrom } from 'rxjs';
import type { User } from '../../../contracts/users';
import { SessionStore } from '../../core/session';
import { provideIcons } from '../../ui/provide-icons';
import { PeoplePage } from './people-page';

const person = (id: number, name: string, more: Partial<User> = {}): User => ({
  id,
  name,
  email: `${id}@quayside.example`,
  role: 'restorer',
  state: 'active',
  lastSeenAt: null,
  invitationExpiresAt: null,
  ...more,
});
const admin = person(1, 'Tess Aldworth', { role: 'administrator' });
const nell = person(2, 'Nell Harrow');

let fixture: ComponentFixture<PeoplePage>;
let http: HttpTestingController;
let page: HTMLElement;

const settle = async () => {
  await fixture.whenStable();
  fixture.detectChanges();
};
const loader = () => TestbedHarnessEnvironment.loader(fixture);
const rowOf = (name: string) =>
  [...page.querySelectorAll('tw-person-row')].find((row) => row.textContent?.includes(name))!;
const chooseFromMenu = async (label: string) => (await loader().getHarness(MatMenuHarness)).clickItem({ text: label });
const press = async (label: string) => {
  const dialog = await TestbedHarnessEnvironment.documentRootLoader(fixture).getHarness(MatDialogHarness);
  const button = await dialog.getHarness(MatButtonHarness.with({ text: label }));
  await button.click();
};

/** A dialog answers when it has closed, which takes its leaving animation. */
async function dialogsGone() {
  const { openDialogs } = TestBed.inject(MatDialog);
  await Promise.all(openDialogs.map((dialog) => firstValueFrom(dialog.afterClosed(), { defaultValue: null })));
  await settle();
}

async function open(people: User[]) {
  TestBed.configureTestingModule({ providers: [provideHttpClient(), provideHttpClientTesting(), provideIcons()] });
  http = TestBed.inject(HttpTestingController);
  TestBed.inject(SessionStore).load().subscribe();
  http.expectOne('/api/session').flush({ user: admin, needsSetup: false, demo: false, practiceName: 'Quayside' });
  fixture = TestBed.createComponent(PeoplePage);
  page = fixture.nativeElement as HTMLElement;
  fixture.detectChanges();
  http.expectOne('/api/users').flush({ items: people, total: people.length });
  await settle();
}

describe('PeoplePage', () => {
  it('offers nobody to change their own role or to disable themselves', async () => {
    await open([admin, nell]);
    expect(rowOf('Tess Aldworth').querySelector('mat-select, button')).toBeNull();
    expect(rowOf('Nell Harrow').querySelector('mat-select')).not.toBeNull();
  });

  it('changes a role, and shows the old one again when the server refuses', async () => {
    await open([admin, nell]);
    const select = await loader().getHarness(MatSelectHarness);
    await select.open();
    await select.clickOptions({ text: 'Appraiser' });
    const request = http.expectOne({ method: 'PATCH', url: '/api/users/2' });
    expect(request.request.body).toEqual({ role: 'appraiser' });
    request.flush(
      { type: '/problems/not-allowed-now', title: 'x', status: 409, detail: 'Name another one first.' },
      { status: 409, statusText: 'Conflict' },
    );
    await settle();
    expect(await select.getValueText()).toBe('Restorer');
    expect(document.body.textContent).toContain('Name another one first.');
  });

  it('disables nobody when one thinks better of it', async () => {
    await open([admin, nell]);
    await chooseFromMenu('Disable');
    http.expectNone('/api/users/2');
    await press('Cancel');
    await dialogsGone();
    http.expectNone('/api/users/2');
  });

  it('disables once that is confirmed', async () => {
    await open([admin, nell]);
    await chooseFromMenu('Disable');
    await press('Disable');
    await dialogsGone();
    const request = http.expectOne({ method: 'PATCH', url: '/api/users/2' });
    expect(request.request.body).toEqual({ disabled: true });
    request.flush({ ...nell, state: 'disabled' });
    await settle();
    expect(rowOf('Nell Harrow').textContent).toContain('Disabled');
  });

  it('shows a renewed invitation’s address, whole', async () => {
    await open([admin, person(3, 'Ada Quill', { state: 'invited', invitationExpiresAt: '2020-01-01T00:00:00.000Z' })]);
    expect(rowOf('Ada Quill').textContent).toContain('Invitation ran out');
    await chooseFromMenu('New invitation address');
    http
      .expectOne({ method: 'POST', url: '/api/users/3/invitation' })
      .flush({ user: person(3, 'Ada Quill'), token: 'a-token-of-some-length', expiresAt: '2026-12-08T12:00:00.000Z' });
    TestBed.tick();
    http.expectOne('/api/users').flush({ items: [admin], total: 1 });
    await settle();
    expect(document.querySelector('tw-invitation-dialog .address')?.textContent).toBe(
      'http://localhost/invitation/a-token-of-some-length',
    );
  });
});
