import { inject } from '@angular/core';
import { type CanActivateFn, RedirectCommand, Router } from '@angular/router';
import { SessionStore } from './session-store';

/** Lets people in who are signed in; others sign in first and come back to the address they asked for. */
export const signedIn: CanActivateFn = async (_route, target) => {
  const session = inject(SessionStore);
  const router = inject(Router);
  const known = session.state();
  const state = known.is === 'signed-in' ? known : await session.load();
  // An outage is no sign-out: the address stays, and the shell says in its place that the server is lost.
  if (state.is !== 'signed-out') return true;
  const queryParams = target.url === '/' || target.url === '/parts' ? {} : { to: target.url };
  return new RedirectCommand(router.createUrlTree(['/sign-in'], { queryParams }), { replaceUrl: true });
};
