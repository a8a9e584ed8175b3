import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { PROBLEM } from '@shared/contracts/problem-types';
import { CsrfToken } from '../server/csrf-token';
import { problems } from '../server/problems';
import type { ServerProblem } from '../server/server-problem';
import { sampleSession } from './sample-session';
import { SessionStore } from './session-store';

describe('SessionStore', () => {
  let store: SessionStore;
  let backend: HttpTestingController;
  const who = { email: 'designer@shop.example', password: 'secret' };

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [provideHttpClient(withInterceptors([problems])), provideHttpClientTesting()],
    });
    store = TestBed.inject(SessionStore);
    backend = TestBed.inject(HttpTestingController);
  });

  afterEach(() => backend.verify());

  const turn = (): Promise<void> => new Promise((resolve) => setTimeout(resolve));
  const lose = (): void => backend.expectOne('/api/session').error(new ProgressEvent('error'));
  const load = async (session = sampleSession(['designer'])): Promise<void> => {
    const loaded = store.load();
    backend.expectOne('/api/session').flush(session);
    await loaded;
  };

  it('starts by not knowing', () => {
    expect(store.state().is).toBe('loading');
    expect(store.hasRole('designer')).toBeFalse();
  });

  it('knows the person, the roles and the token', async () => {
    await load();
    expect(store.state().is).toBe('signed-in');
    expect(store.person()?.name).toBe('Wren Adler');
    expect(store.hasRole('designer')).toBeTrue();
    expect(store.hasRole('supervisor')).toBeFalse();
    expect(TestBed.inject(CsrfToken).value).toBe('token-1');
  });

  it('asks once for several callers', async () => {
    const both = Promise.all([store.load(), store.load()]);
    backend.expectOne('/api/session').flush(sampleSession(null));
    expect((await both).map((state) => state.is)).toEqual(['signed-out', 'signed-out']);
  });

  it('is unreachable, not signed out, when the first question gets no answer', async () => {
    const loaded = store.load();
    lose();
    expect((await loaded).is).toBe('unreachable');
    await load();
    expect(store.state().is).toBe('signed-in');
  });

  it('keeps the person through an outage', async () => {
    await load();
    const loaded = store.load();
    lose();
    expect((await loaded).is).toBe('signed-in');
    expect(store.person()).not.toBeNull();
  });

  it('signs in, and takes the new token', async () => {
    await load(sampleSession(null));
    const signedIn = store.signIn(who);
    const request = backend.expectOne({ method: 'POST', url: '/api/session' });
    expect(request.request.body).toEqual(who);
    request.flush(sampleSession(['designer'], 'token-2'));
    await signedIn;
    expect(store.state().is).toBe('signed-in');
    expect(TestBed.inject(CsrfToken).value).toBe('token-2');
  });

  it('changes nothing on a wrong password', async () => {
    await load(sampleSession(null));
    const tried = store.signIn(who).catch((error: unknown) => error);
    backend
      .expectOne({ method: 'POST', url: '/api/session' })
      .flush({ type: PROBLEM.wrongCredentials, title: 'Wrong', status: 401 }, { status: 401, statusText: '' });
    expect(((await tried) as ServerProblem).is('wrongCredentials')).toBeTrue();
    expect(store.state().is).toBe('signed-out');
  });

  it('fetches a new token and tries again when the old one had ended', async () => {
    await load(sampleSession(null));
    const signedIn = store.signIn(who);
    backend
      .expectOne({ method: 'POST', url: '/api/session' })
      .flush({ type: PROBLEM.csrf, title: 'Token', status: 403 }, { status: 403, statusText: '' });
    await turn();
    backend.expectOne({ method: 'GET', url: '/api/session' }).flush(sampleSession(null, 'token-3'));
    await turn();
    backend.expectOne({ method: 'POST', url: '/api/session' }).flush(sampleSession(['designer'], 'token-4'));
    await signedIn;
    expect(store.state().is).toBe('signed-in');
  });

  it('renews the token without touching who is on the screen', async () => {
    await load();
    const renewed = store.renewToken('p1');
    backend.expectOne('/api/session').flush(sampleSession(null, 'token-5'));
    expect(await renewed).toBeFalse();
    expect(store.state().is).toBe('signed-in');
    expect(TestBed.inject(CsrfToken).value).toBe('token-5');
  });

  it('signs out', async () => {
    await load();
    const out = store.signOut();
    backend.expectOne({ method: 'DELETE', url: '/api/session' }).flush(sampleSession(null, 'token-6'));
    await out;
    expect(store.state().is).toBe('signed-out');
  });
});
