import { inject, Injectable } from '@angular/core';
import { MatDialog } from '@angular/material/dialog';
import { Router } from '@angular/router';
import { firstValueFrom } from 'rxjs';
import { SessionStore } from './session-store';
import type { SignInAgain, WhoWas } from './sign-in-again';

/** The sign-in dialog over an open page. Many requests may find out at once that the session has ended; one dialog opens. */
@Injectable({ providedIn: 'root' })
export class InPlaceSignIn {
  private readonly dialog = inject(MatDialog);
  private readonly session = inject(SessionStore);
  private readonly router = inject(Router);
  private open: Promise<boolean> | null = null;

  /** True once the same person is signed in again, false when they left instead. */
  again(): Promise<boolean> {
    this.open ??= this.ask().finally(() => (this.open = null));
    return this.open;
  }

  private async ask(): Promise<boolean> {
    const person = this.session.person();
    // Perhaps only the token was stale, or another tab has signed in again already.
    if (person !== null && (await this.session.renewToken(person.id))) return true;
    if (person === null) return false;
    const again = await import('./sign-in-again');
    const dialog = this.dialog.open<SignInAgain, WhoWas, boolean>(again.SignInAgain, {
      data: person,
      disableClose: true,
      width: '420px',
      maxWidth: 'calc(100vw - 32px)',
      ariaLabelledBy: 'sign-in-again-title',
    });
    const back = (await firstValueFrom(dialog.afterClosed())) === true;
    if (!back) await this.leave();
    return back;
  }

  private async leave(): Promise<void> {
    await this.session.load();
    await this.router.navigate(['/sign-in'], { queryParams: { to: this.router.url } });
  }
}
