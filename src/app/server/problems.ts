import { HttpErrorResponse, type HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { catchError, tap, throwError } from 'rxjs';
import { Reachability } from './reachability';
import { ServerProblem } from './server-problem';

/** Turns every failed request into a `ServerProblem` and notes whether the server answers at all. */
export const problems: HttpInterceptorFn = (request, next) => {
  const reachability = inject(Reachability);
  return next(request).pipe(
    tap(() => reachability.answered()),
    catchError((error: unknown) => {
      if (!(error instanceof HttpErrorResponse)) return throwError(() => error);
      const problem = ServerProblem.of(error);
      if (problem.kind === 'unreachable') reachability.lost();
      else reachability.answered();
      return throwError(() => problem);
    }),
  );
};
