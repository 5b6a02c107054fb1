import { HttpClient, provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import type { Session } from '../../contracts/session';
import type { Role } from '../../domain/access/policy';
import { allowed, notYetSetUp, setUpFirst, signedIn, signedOut, startPage } from './guards';
import { SessionStore } from './session';
import { sessionExpiry } from './session-expiry';

@Component({ template: 'page', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

const session = (role: Role | null, more: Partial<Session> = {}): Session => ({
  user: role && { id: 1, name: 'Nell Harrow', email: 'nell@quayside.example', role },
  needsSetup: false,
  demo: false,
  practiceName: 'Quayside Set Works',
  ...more,
});

let store: SessionStore;
let http: HttpTestingController;

function start(of: Session) {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(withInterceptors([sessionExpiry])),
      provideHttpClientTesting(),
      provideRouter([
        {
          path: '',
          canActivateChild: [setUpFirst],
          children: [
            { path: '', pathMatch: 'full', redirectTo: startPage },
            { path: 'people', canActivate: [allowed('user.manage')], component: Page },
            { path: 'account', canActivate: [signedIn], component: Page },
            { path: 'sign-in', canActivate: [signedOut], component: Page },
            { path: 'set-up', canActivate: [notYetSetUp], component: Page },
            { path: '**', component: Page },
          ],
        },
      ]),
    ],
  });
  store = TestBed.inject(SessionStore);
  http = TestBed.inject(HttpTestingController);
  store.load().subscribe();
  http.expectOne('/api/session').flush(of);
}

const landsOn = async (address: string) => {
  const harness = await RouterTestingHarness.create();
  await harness.navigateByUrl(address);
  return TestBed.inject(Router).url;
};

describe('SessionStore', () => {
  it('answers by the policy for whoever is signed in', () => {
    start(session('restorer'));
    expect(store.role()).toBe('restorer');
    expect(store.can('estimate.edit')).toBe(true);
    expect(store.can('user.manage')).toBe(false);
  });

  it('allows nobody anything', () => {
    start(session(null));
    expect(store.can('set.view')).toBe(false);
  });

  it('keeps who signs in, and forgets who signs out', () => {
    start(session(null));
    store.signIn({ email: 'nell@quayside.example', password: 'a few long words' }).subscribe();
    http.expectOne({ method: 'POST', url: '/api/session' }).flush(session('appraiser'));
    expect(store.role()).toBe('appraiser');
    store.signOut().subscribe();
    http.expectOne({ method: 'DELETE', url: '/api/session' }).flush(null, { status: 204, statusText: 'No Content' });
    expect(store.user()).toBeNull();
    expect(store.session()?.practiceName).toBe('Quayside Set Works');
  });

  it('is still signed in when signing out failed', () => {
    start(session('restorer'));
    store.signOut().subscribe({ error: () => undefined });
    http.expectOne({ method: 'DELETE', url: '/api/session' }).error(new ProgressEvent('error'));
    expect(store.role()).toBe('restorer');
  });
});

describe('a session that ran out', () => {
  it('is forgotten, and the person asked to sign in and come back', async () => {
    start(session('administrator'));
    expect(await landsOn('/people?page=2')).toBe('/people?page=2');
    TestBed.inject(HttpClient)
      .get('/api/users')
      .subscribe({ error: () => undefined });
    http.expectOne('/api/users').flush({}, { status: 401, statusText: 'Unauthorized' });
    await new Promise((resolve) => setTimeout(resolve));
    expect(store.user()).toBeNull();
    expect(TestBed.inject(Router).url).toBe('/sign-in?then=%2Fpeople%3Fpage%3D2');
  });

  it('is not what a wrong password means', async () => {
    start(session(null));
    expect(await landsOn('/sign-in')).toBe('/sign-in');
    store.signIn({ email: 'nell@quayside.example', password: 'wrong' }).subscribe({ error: () => undefined });
    http.expectOne('/api/session').flush({}, { status: 401, statusText: 'Unauthorized' });
    await new Promise((resolve) => setTimeout(resolve));
    expect(TestBed.inject(Router).url).toBe('/sign-in');
  });
});

describe('guards', () => {
  it('send nobody to sign in, keeping the address', async () => {
    start(session(null));
    expect(await landsOn('/people')).toBe('/sign-in?then=%2Fpeople');
    expect(await landsOnAgain('/account')).toBe('/sign-in?then=%2Faccount');
  });

  it('tell a person whose role does not reach', async () => {
    start(session('collector'));
    expect(await landsOn('/people')).toBe('/not-allowed');
    expect(await landsOnAgain('/account')).toBe('/account');
  });

  it('let in whom the policy allows', async () => {
    start(session('administrator'));
    expect(await landsOn('/people')).toBe('/people');
  });

  it('keep signing in for those who are not', async () => {
    start(session('collector'));
    expect(await landsOn('/sign-in')).toBe('/sets');
  });

  it('send everybody to name the first administrator, but leave the public page open', async () => {
    start(session(null, { needsSetup: true }));
    expect(await landsOn('/sign-in')).toBe('/set-up');
    expect(await landsOnAgain('/then-and-now')).toBe('/then-and-now');
    expect(await landsOnAgain('/')).toBe('/set-up');
  });

  it('lead from the bare address to the public page', async () => {
    start(session(null));
    expect(await landsOn('/')).toBe('/then-and-now');
  });

  it('close setting up once it is done', async () => {
    start(session(null));
    expect(await landsOn('/set-up')).toBe('/sign-in');
  });

  const landsOnAgain = async (address: string) => {
    await TestBed.inject(Router).navigateByUrl(address);
    return TestBed.inject(Router).url;
  };
});
