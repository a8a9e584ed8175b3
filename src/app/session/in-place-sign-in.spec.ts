import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MATERIAL_ANIMATIONS } from '@angular/material/core';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatDialogHarness } from '@angular/material/dialog/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { provideRouter, Router } from '@angular/router';
import { problems } from '../server/problems';
import { InPlaceSignIn } from './in-place-sign-in';
import { sampleSession } from './sample-session';
import { SessionStore } from './session-store';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

describe('InPlaceSignIn', () => {
  let backend: HttpTestingController;
  let signIn: InPlaceSignIn;

  beforeEach(async () => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([problems])),
        provideHttpClientTesting(),
        provideRouter([{ path: '**', component: Page }]),
        { provide: MATERIAL_ANIMATIONS, useValue: { animationsDisabled: true } },
      ],
    });
    backend = TestBed.inject(HttpTestingController);
    signIn = TestBed.inject(InPlaceSignIn);
    await TestBed.inject(Router).navigateByUrl('/parts/7');
    const loaded = TestBed.inject(SessionStore).load();
    asked().flush(sampleSession(['designer']));
    await loaded;
  });

  afterEach(() => backend.verify());

  const asked = () => backend.expectOne({ method: 'GET', url: '/api/session' });
  /** The dialog is a chunk of its own; its arrival takes more than a turn. */
  const opened = async (): Promise<MatDialogHarness> => {
    const loader = TestbedHarnessEnvironment.documentRootLoader(TestBed.createComponent(Page));
    await import('./sign-in-again');
    await new Promise((resolve) => setTimeout(resolve));
    return loader.getHarness(MatDialogHarness);
  };
  const closed = async (): Promise<boolean> =>
    (
      await TestbedHarnessEnvironment.documentRootLoader(TestBed.createComponent(Page)).getAllHarnesses(
        MatDialogHarness,
      )
    ).length === 0;

  it('opens nothing when the server still knows the person and only the token was stale', async () => {
    const again = signIn.again();
    asked().flush(sampleSession(['designer'], 'token-2'));
    expect(await again).toBeTrue();
    expect(await closed()).toBeTrue();
  });

  it('opens one dialog for all who ask, and goes on once the password is given', async () => {
    const both = Promise.all([signIn.again(), signIn.again()]);
    asked().flush(sampleSession(null));
    const dialog = await opened();
    expect(await dialog.getText()).toContain('designer@shop.example');
    await (
      await dialog.getHarness(MatInputHarness.with({ selector: '[autocomplete=current-password]' }))
    ).setValue('secret');
    await (await dialog.getHarness(MatButtonHarness.with({ text: 'Sign in' }))).click();
    const request = backend.expectOne({ method: 'POST', url: '/api/session' });
    expect(request.request.body).toEqual({ email: 'designer@shop.example', password: 'secret' });
    request.flush(sampleSession(['designer'], 'token-3'));
    expect(await both).toEqual([true, true]);
    expect(TestBed.inject(Router).url).toBe('/parts/7');
  });

  it('lets the person leave, and remembers the page', async () => {
    const again = signIn.again();
    asked().flush(sampleSession(null));
    const dialog = await opened();
    await (await dialog.getHarness(MatButtonHarness.with({ text: 'Leave this page instead' }))).click();
    await new Promise((resolve) => setTimeout(resolve));
    asked().flush(sampleSession(null));
    expect(await again).toBeFalse();
    expect(TestBed.inject(Router).url).toBe('/sign-in?to=%2Fparts%2F7');
  });

  it('passes an outage on: that is no reason to sign in', async () => {
    const again = signIn.again().catch((error: unknown) => error);
    asked().error(new ProgressEvent('error'));
    expect(await again).toBeInstanceOf(Error);
    expect(await closed()).toBeTrue();
  });
});
