import { HttpClient, provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { PROBLEM } from '@shared/contracts/problem-types';
import { expiry } from '../session/expiry';
import { InPlaceSignIn } from '../session/in-place-sign-in';
import { csrf } from './csrf';
import { CsrfToken } from './csrf-token';
import { problems } from './problems';
import { Reachability } from './reachability';
import { ServerProblem } from './server-problem';

describe('the interceptors', () => {
  let http: HttpClient;
  let backend: HttpTestingController;
  let again: jasmine.Spy<() => Promise<boolean>>;

  beforeEach(() => {
    again = jasmine.createSpy('again').and.resolveTo(true);
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([expiry, problems, csrf])),
        provideHttpClientTesting(),
        { provide: InPlaceSignIn, useValue: { again } },
      ],
    });
    http = TestBed.inject(HttpClient);
    backend = TestBed.inject(HttpTestingController);
  });

  afterEach(() => backend.verify());

  const outcome = (url: string, method = 'GET'): Promise<unknown> =>
    new Promise((resolve) => http.request(method, url).subscribe({ next: resolve, error: resolve }));

  const signedOut = { type: PROBLEM.signedOut, title: 'Signed out', status: 401 };

  it('send the token with changing requests to our own API, and with no other', () => {
    TestBed.inject(CsrfToken).value = 'abc';
    void outcome('/api/parts', 'POST');
    void outcome('/api/parts');
    void outcome('/elsewhere', 'POST');
    expect(backend.expectOne({ method: 'POST', url: '/api/parts' }).request.headers.get('X-CSRF-Token')).toBe('abc');
    expect(backend.expectOne({ method: 'GET', url: '/api/parts' }).request.headers.has('X-CSRF-Token')).toBeFalse();
    expect(backend.expectOne('/elsewhere').request.headers.has('X-CSRF-Token')).toBeFalse();
  });

  it('throw a ServerProblem and note a lost server until it answers again', async () => {
    const reachability = TestBed.inject(Reachability);
    const lost = outcome('/api/parts');
    backend.expectOne('/api/parts').error(new ProgressEvent('error'));
    expect((await lost) as ServerProblem).toBeInstanceOf(ServerProblem);
    expect(reachability.reachable()).toBeFalse();

    const refused = outcome('/api/parts');
    backend
      .expectOne('/api/parts')
      .flush({ type: PROBLEM.notFound, title: 'Gone', status: 404 }, { status: 404, statusText: '' });
    expect(((await refused) as ServerProblem).is('notFound')).toBeTrue();
    expect(reachability.reachable()).toBeTrue();
  });

  it('read the words of a refusal also where a file was asked for', async () => {
    const refused = new Promise((resolve) =>
      http.get('/api/file', { responseType: 'blob' }).subscribe({ next: resolve, error: resolve }),
    );
    const body = JSON.stringify({ type: PROBLEM.notFound, title: 'There is nothing here.', status: 404 });
    backend
      .expectOne('/api/file')
      .flush(new Blob([body], { type: 'application/problem+json' }), { status: 404, statusText: '' });
    const problem = (await refused) as ServerProblem;
    expect(problem.is('notFound')).toBeTrue();
    expect(problem.message).toBe('There is nothing here.');
  });

  it('sign in again in place and repeat the request with the new token', async () => {
    TestBed.inject(CsrfToken).value = 'old';
    again.and.callFake(() => {
      TestBed.inject(CsrfToken).value = 'new';
      return Promise.resolve(true);
    });
    const saved = outcome('/api/parts/1', 'PUT');
    backend.expectOne('/api/parts/1').flush(signedOut, { status: 401, statusText: '' });
    await new Promise((resolve) => setTimeout(resolve));
    const second = backend.expectOne('/api/parts/1');
    expect(second.request.headers.get('X-CSRF-Token')).toBe('new');
    second.flush({ saved: true });
    expect(await saved).toEqual({ saved: true });
  });

  it('repeat only once', async () => {
    const saved = outcome('/api/parts/1');
    backend.expectOne('/api/parts/1').flush(signedOut, { status: 401, statusText: '' });
    await new Promise((resolve) => setTimeout(resolve));
    backend.expectOne('/api/parts/1').flush(signedOut, { status: 401, statusText: '' });
    expect(((await saved) as ServerProblem).status).toBe(401);
    expect(again).toHaveBeenCalledTimes(1);
  });

  it('give the refusal on when the person leaves instead', async () => {
    again.and.resolveTo(false);
    const saved = outcome('/api/parts/1');
    backend.expectOne('/api/parts/1').flush(signedOut, { status: 401, statusText: '' });
    expect(((await saved) as ServerProblem).is('signedOut')).toBeTrue();
  });

  it('leave a wrong password to the sign-in form', async () => {
    const tried = outcome('/api/session', 'POST');
    backend
      .expectOne('/api/session')
      .flush({ type: PROBLEM.wrongCredentials, title: 'Wrong', status: 401 }, { status: 401, statusText: '' });
    expect(((await tried) as ServerProblem).is('wrongCredentials')).toBeTrue();
    expect(again).not.toHaveBeenCalled();
  });
});
