import { HttpErrorResponse, provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { getPractice } from '../../contracts/practice';
import { getRestatement } from '../../contracts/restatements';
import { inviteUser, updateUser } from '../../contracts/users';
import { addressOf, ApiClient, ApiProblem, problemOf, toApiProblem } from './api-client';

describe('ApiClient', () => {
  let api: ApiClient;
  let http: HttpTestingController;

  beforeEach(() => {
    TestBed.configureTestingModule({ providers: [provideHttpClient(), provideHttpClientTesting()] });
    api = TestBed.inject(ApiClient);
    http = TestBed.inject(HttpTestingController);
  });
  afterEach(() => http.verify());

  const problemFrom = (answer: (url: string) => void) => {
    let caught: unknown;
    api.call(getPractice).subscribe({ error: (error: unknown) => (caught = error) });
    answer('/api/practice');
    return caught as ApiProblem;
  };

  it('fills parameters into the address and sends the body', () => {
    api.call(updateUser, { params: { id: 12 }, body: { disabled: true } }).subscribe();
    const { request } = http.expectOne('/api/users/12');
    expect(request.method).toBe('PATCH');
    expect(request.body).toEqual({ disabled: true });
  });

  it('keeps what stands in a parameter inside it', () => {
    expect(addressOf({ ...updateUser, path: '/api/things/:name/part' }, { name: 'a/b ?' })).toBe(
      '/api/things/a%2Fb%20%3F/part',
    );
  });

  it('leaves empty values out of the query', () => {
    api
      .call(getRestatement, { query: { series: 'us-cpi-u', amount: '0', from: '', to: undefined, x: null } })
      .subscribe();
    const { request } = http.expectOne(({ url }) => url === '/api/restatements');
    expect(request.params.toString()).toBe('series=us-cpi-u&amount=0');
  });

  it('answers what the server answers', () => {
    let reply: unknown;
    api
      .call(inviteUser, { body: { name: 'Ada Quill', email: 'ada@quayside.example', role: 'restorer' } })
      .subscribe((value) => (reply = value));
    http.expectOne('/api/users').flush({ token: 'abc' });
    expect(reply).toEqual({ token: 'abc' });
  });

  it('tells the problem of the server, with a message fit to show', () => {
    const problem = problemFrom((url) =>
      http
        .expectOne(url)
        .flush(
          { type: '/problems/forbidden', title: 'Your role does not allow this', status: 403 },
          { status: 403, statusText: 'Forbidden' },
        ),
    );
    expect(problem).toBeInstanceOf(ApiProblem);
    expect(problem.code).toBe('forbidden');
    expect(problem.message).toBe('Your role does not allow this');
  });

  it('says that the server does not answer when the network fails', () => {
    const problem = problemFrom((url) => http.expectOne(url).error(new ProgressEvent('error')));
    expect(problem.code).toBe('unreachable');
  });

  it('takes a page of a proxy in between as unreachable, and other bodies as a failure of the server', () => {
    expect(problemOf(503, '<html>').code).toBe('unreachable');
    expect(problemOf(500, '<html>').code).toBe('server-error');
    expect(problemOf(400, { type: '/problems/unheard-of', title: 'x', status: 400 }).code).toBe('server-error');
  });

  it('reads a problem that came as text', () => {
    const body = JSON.stringify({ type: '/problems/too-large', title: 'Too large', status: 413 });
    expect(toApiProblem(new HttpErrorResponse({ status: 413, error: body })).code).toBe('too-large');
  });

  it('throws on what is not a failure of a request', () => {
    expect(() => toApiProblem(new TypeError('a bug'))).toThrow('a bug');
  });
});
