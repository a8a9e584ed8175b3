import { HttpErrorResponse, type HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { catchError, from, type Observable, of, switchMap, tap, throwError } from 'rxjs';
import { Reachability } from './reachability';
import { ServerProblem } from './server-problem';

/** Turns every failed request into a `ServerProblem` and notes whether the server answers at all. */
export const problems: HttpInterceptorFn = (request, next) => {
  const reachability = inject(Reachability);
  return next(request).pipe(
    tap(() => reachability.answered()),
    catchError((error: unknown) => {
      if (!(error instanceof HttpErrorResponse)) return throwError(() => error);
      return bodyOf(error).pipe(
        switchMap((body) => {
          const problem = ServerProblem.of(error, body);
          if (problem.kind === 'unreachable') reachability.lost();
          else reachability.answered();
          return throwError(() => problem);
        }),
      );
    }),
  );
};

/** Where a file was asked for, the words of a refusal come as a file too. */
function bodyOf({ error }: HttpErrorResponse): Observable<unknown> {
  return error instanceof Blob ? from(error.text().then(parsed)) : of<unknown>(error);
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return text;
  }
}
