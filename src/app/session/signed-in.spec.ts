import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { type SessionState, SessionStore } from './session-store';
import { signedIn } from './signed-in';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

describe('signedIn', () => {
  const go = async (is: SessionState['is'], address: string): Promise<string> => {
    const state = { is } as SessionState;
    TestBed.configureTestingModule({
      providers: [
        { provide: SessionStore, useValue: { state: () => state, load: () => Promise.resolve(state) } },
        provideRouter([
          { path: 'sign-in', component: Page },
          { path: '**', component: Page, canActivate: [signedIn] },
        ]),
      ],
    });
    await RouterTestingHarness.create(address);
    return TestBed.inject(Router).url;
  };

  it('lets a signed-in person in', async () => {
    expect(await go('signed-in', '/parts/7')).toBe('/parts/7');
  });

  it('sends others to sign in, with the address they asked for', async () => {
    expect(await go('signed-out', '/parts/7?a=1')).toBe('/sign-in?to=%2Fparts%2F7%3Fa%3D1');
  });

  it('needs no address for the register, which is where sign-in leads anyway', async () => {
    expect(await go('signed-out', '/parts')).toBe('/sign-in');
  });

  it('stays at the address when the server is lost: the shell says so there', async () => {
    expect(await go('unreachable', '/parts/7')).toBe('/parts/7');
  });
});
