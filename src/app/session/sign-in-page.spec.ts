import { ChangeDetectionStrategy, Component } from '@angular/core';
import type { HarnessLoader } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatFormFieldHarness } from '@angular/material/form-field/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { PROBLEM } from '@shared/contracts/problem-types';
import { problems } from '../server/problems';
import { sampleSession } from './sample-session';
import { SignInPage } from './sign-in-page';
import { signedIn } from './signed-in';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class AskedFor {}

describe('SignInPage', () => {
  let backend: HttpTestingController;
  let router: RouterTestingHarness;
  let loader: HarnessLoader;

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([problems])),
        provideHttpClientTesting(),
        provideRouter(
          [
            { path: 'sign-in', component: SignInPage },
            { path: 'parts', component: AskedFor, canActivate: [signedIn] },
            { path: 'parts/:id', component: AskedFor, canActivate: [signedIn] },
          ],
          withComponentInputBinding(),
        ),
      ],
    });
    backend = TestBed.inject(HttpTestingController);
  });

  const answer = (roles: ['designer'] | null): void => backend.expectOne({ method: 'GET' }).flush(sampleSession(roles));

  const turn = (): Promise<void> => new Promise((resolve) => setTimeout(resolve));
  /** Lets promises run on, then the page follow them; not to be used while an answer is awaited. */
  const settle = async (): Promise<void> => {
    await turn();
    await router.fixture.whenStable();
  };

  /** Asks for a page while signed out, and ends on the sign-in page. */
  const arrive = async (address: string): Promise<void> => {
    const created = RouterTestingHarness.create(address);
    await turn();
    if (!address.startsWith('/sign-in')) {
      answer(null);
      await turn();
    }
    router = await created;
    answer(null);
    await settle();
    loader = TestbedHarnessEnvironment.loader(router.fixture);
  };

  const text = (): string => (router.fixture.nativeElement as HTMLElement).textContent ?? '';
  const boxes = (): Promise<MatInputHarness[]> => loader.getAllHarnesses(MatInputHarness);
  const press = async (): Promise<void> =>
    (await loader.getHarness(MatButtonHarness.with({ text: 'Sign in' }))).click();
  const refuse = (type: string, status: number, headers: Record<string, string> = {}): void =>
    backend.expectOne({ method: 'POST' }).flush({ type, title: 'No', status }, { status, statusText: '', headers });

  it('says that it is a demo shop and fills a demo person in with one press', async () => {
    await arrive('/sign-in');
    expect(text()).toContain('This is a demo shop');
    expect(text()).toContain('test-shop-demo');
    const person = [...(router.fixture.nativeElement as HTMLElement).querySelectorAll('li button')][1] as HTMLElement;
    person.click();
    const [email, password] = await boxes();
    expect(await email!.getValue()).toBe('supervisor@shop.example');
    expect(await password!.getValue()).toBe('test-shop-demo');
  });

  it('goes back to the address that was asked for', async () => {
    await arrive('/parts/42?view=blank');
    expect(TestBed.inject(Router).url).toContain('/sign-in?to=');
    const [email, password] = await boxes();
    await email!.setValue(' designer@shop.example ');
    await password!.setValue('secret');
    await press();
    const request = backend.expectOne({ method: 'POST' });
    expect(request.request.body).toEqual({ email: 'designer@shop.example', password: 'secret' });
    request.flush(sampleSession(['designer']));
    await settle();
    expect(TestBed.inject(Router).url).toBe('/parts/42?view=blank');
  });

  it('follows no address outside the app', async () => {
    await arrive('/sign-in?to=//elsewhere.example');
    const [email, password] = await boxes();
    await email!.setValue('designer@shop.example');
    await password!.setValue('secret');
    await press();
    backend.expectOne({ method: 'POST' }).flush(sampleSession(['designer']));
    await settle();
    expect(TestBed.inject(Router).url).toBe('/parts');
  });

  it('says what went wrong and keeps what was typed', async () => {
    await arrive('/sign-in');
    const [email, password] = await boxes();
    await email!.setValue('designer@shop.example');
    await password!.setValue('wrong');

    await press();
    refuse(PROBLEM.wrongCredentials, 401);
    await settle();
    expect(text()).toContain('password is wrong');

    await press();
    refuse(PROBLEM.tooManyAttempts, 429, { 'Retry-After': '300' });
    await settle();
    expect(text()).toContain('Wait 5 minutes');

    await press();
    backend.expectOne({ method: 'POST' }).error(new ProgressEvent('error'));
    await settle();
    expect(text()).toContain("can't be reached");
    expect(await password!.getValue()).toBe('wrong');
  });

  it('asks for what is missing at the field and sends nothing', async () => {
    await arrive('/sign-in');
    await press();
    const [email, password] = await loader.getAllHarnesses(MatFormFieldHarness);
    expect(await email!.getTextErrors()).toEqual(['Enter your e-mail address.']);
    expect(await password!.getTextErrors()).toEqual(['Enter your password.']);
    backend.expectNone({ method: 'POST' });
  });

  it('shows and hides the password', async () => {
    await arrive('/sign-in');
    const [, password] = await boxes();
    expect(await password!.getType()).toBe('password');
    const shown = (router.fixture.nativeElement as HTMLElement).querySelector<HTMLElement>(
      '[aria-label="Show the password"]',
    );
    shown?.click();
    expect(await password!.getType()).toBe('text');
  });

  it('offers to try again when the server is lost', async () => {
    const created = RouterTestingHarness.create('/sign-in');
    await turn();
    backend.expectOne({ method: 'GET' }).error(new ProgressEvent('error'));
    router = await created;
    await settle();
    loader = TestbedHarnessEnvironment.loader(router.fixture);
    expect(text()).toContain('No answer from the server');
    await (await loader.getHarness(MatButtonHarness.with({ text: 'Try again' }))).click();
    answer(null);
    await settle();
    expect(await boxes()).toHaveSize(2);
  });
});
