import type { HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { CsrfToken } from './csrf-token';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Adds the session's token to every changing request to our own API. */
export const csrf: HttpInterceptorFn = (request, next) => {
  const token = inject(CsrfToken).value;
  if (token === null || SAFE.has(request.method) || !request.url.startsWith('/api/')) return next(request);
  return next(request.clone({ setHeaders: { 'X-CSRF-Token': token } }));
};
