import { Injectable } from '@angular/core';

/** The token of the present session; a new one comes with every answer of `/api/session`. */
@Injectable({ providedIn: 'root' })
export class CsrfToken {
  value: string | null = null;
}
