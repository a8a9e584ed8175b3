import type { HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { catchError, from, switchMap, throwError } from 'rxjs';
import { ServerProblem } from '../server/server-problem';
import { InPlaceSignIn } from './in-place-sign-in';

/**
 * A session that ends while a page is open: sign in again in place, then send the same request again, so that nothing
 * on the screen is lost. Requests about the session itself are left alone; their callers deal with the answer.
 */
export const expiry: HttpInterceptorFn = (request, next) => {
  if (request.url.startsWith('/api/session')) return next(request);
  const signIn = inject(InPlaceSignIn);
  return next(request).pipe(
    catchError((error: unknown) => {
      const ended = error instanceof ServerProblem && (error.status === 401 || error.is('csrf'));
      if (!ended) return throwError(() => error);
      return from(signIn.again()).pipe(switchMap((back) => (back ? next(request) : throwError(() => error))));
    }),
  );
};
