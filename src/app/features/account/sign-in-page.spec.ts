import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { DeferBlockBehavior, TestBed } from '@angular/core/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { SessionStore } from '../../core/session';
import { provideIcons } from '../../ui/provide-icons';
import { SignInPage } from './sign-in-page';

@Component({ template: 'elsewhere', changeDetection: ChangeDetectionStrategy.OnPush })
class Elsewhere {}

let http: HttpTestingController;
let harness: RouterTestingHarness;
let page: HTMLElement;

async function open(address: string, demo = false) {
  TestBed.configureTestingModule({
    deferBlockBehavior: DeferBlockBehavior.Manual, // the year scale beside the form stays away
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideIcons(),
      provideRouter(
        [
          { path: 'sign-in', component: SignInPage },
          { path: '**', component: Elsewhere },
        ],
        withComponentInputBinding(),
      ),
    ],
  });
  http = TestBed.inject(HttpTestingController);
  TestBed.inject(SessionStore).load().subscribe();
  http
    .expectOne('/api/session')
    .flush({ user: null, needsSetup: false, demo, practiceName: demo ? 'Quayside Set Works' : 'Elm Street Radio' });
  harness = await RouterTestingHarness.create(address);
  page = harness.routeNativeElement!;
}

const settle = async () => {
  await harness.fixture.whenStable();
  harness.detectChanges();
};
const field = (name: string) => page.querySelector<HTMLInputElement>(`[formControlName="${name}"]`)!;
const type = (name: string, value: string) => {
  field(name).value = value;
  field(name).dispatchEvent(new Event('input'));
};
const submit = async () => {
  page.querySelector('form')!.dispatchEvent(new Event('submit'));
  await settle();
};
const text = () => page.textContent?.replace(/\s+/g, ' ') ?? '';
const signedInSession = {
  user: { id: 1, name: 'Nell Harrow', email: 'nell@quayside.example', role: 'restorer' },
  needsSetup: false,
  demo: false,
  practiceName: 'Elm Street Radio',
};

describe('SignInPage', () => {
  it('asks for what is missing and sends nothing', async () => {
    await open('/sign-in');
    await submit();
    expect(text().match(/This is needed\./g)).toHaveLength(2);
    expect(document.activeElement).toBe(field('email'));
    http.expectNone('/api/session');
  });

  it('says what is wrong with an address before sending it', async () => {
    await open('/sign-in');
    type('email', 'nell@quayside');
    type('password', 'a few long words');
    await submit();
    expect(text()).toContain('Use an e-mail address such as name@example.org.');
    http.expectNone('/api/session');
  });

  it('sends what was typed', async () => {
    await open('/sign-in');
    type('email', 'nell@quayside.example');
    type('password', 'a few long words');
    await submit();
    const { request } = http.expectOne({ method: 'POST', url: '/api/session' });
    expect(request.body).toEqual({ email: 'nell@quayside.example', password: 'a few long words' });
  });

  it.each([
    ['/sign-in?then=%2Fsets%2F12', '/sets/12'],
    ['/sign-in', '/sets'],
  ])('from %s a person signed in lands on %s', async (address, expected) => {
    await open(address);
    type('email', 'nell@quayside.example');
    type('password', 'a few long words');
    await submit();
    http.expectOne({ method: 'POST', url: '/api/session' }).flush(signedInSession);
    await settle();
    expect(TestBed.inject(Router).url).toBe(expected);
  });

  it('keeps what was typed when the password is not right', async () => {
    await open('/sign-in');
    type('email', 'nell@quayside.example');
    type('password', 'not the one');
    await submit();
    http.expectOne({ method: 'POST', url: '/api/session' }).flush(
      {
        type: '/problems/wrong-credentials',
        title: 'E-mail address or password is not right',
        status: 401,
      },
      { status: 401, statusText: 'Unauthorized' },
    );
    await settle();
    expect(page.querySelector('[role="alert"]')?.textContent).toContain('E-mail address or password is not right');
    expect(field('email').value).toBe('nell@quayside.example');
    expect(field('password').value).toBe('not the one');
  });

  it('fills in an account of the demo practice', async () => {
    await open('/sign-in', true);
    [...page.querySelectorAll('button')].find((button) => button.textContent?.includes('Collector'))!.click();
    expect(field('email').value).toBe('collector@quayside.example');
    expect(field('password').value).toBe('thenworth-demo');
  });

  it('names no demo account in a practice of one’s own', async () => {
    await open('/sign-in');
    expect(text()).toContain('Elm Street Radio');
    expect(text()).not.toContain('quayside.example');
  });

  it('shows the password on request', async () => {
    await open('/sign-in');
    const reveal = page.querySelector<HTMLButtonElement>('[aria-label="Show the password"]')!;
    expect(field('password').type).toBe('password');
    reveal.click();
    await settle();
    expect(field('password').type).toBe('text');
    expect(reveal.getAttribute('aria-pressed')).toBe('true');
  });
});
