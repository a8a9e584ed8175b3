import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { SignInForm } from './sign-in-form';

export interface WhoWas {
  readonly email: string;
  readonly name: string;
}

/** Over an open page whose session has ended. The page under it stays as it is. */
@Component({
  selector: 'lw-sign-in-again',
  imports: [MatButtonModule, MatDialogModule, SignInForm],
  template: `
    <h2 mat-dialog-title id="sign-in-again-title">Sign in again</h2>
    <mat-dialog-content>
      <p class="why">
        Your session has ended, {{ who.name }}. Sign in and go on where you were: the page is still open and nothing on
        it is lost.
      </p>
      <p class="who">{{ who.email }}</p>
      <lw-sign-in-form [email]="who.email" (signedIn)="close(true)" />
    </mat-dialog-content>
    <mat-dialog-actions>
      <button matButton type="button" (click)="close(false)">Leave this page instead</button>
    </mat-dialog-actions>
  `,
  styles: `
    .why {
      margin-bottom: 14px;
    }

    .who {
      margin-bottom: 12px;
      color: var(--lw-ink);
      font-weight: 600;
      overflow-wrap: anywhere;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignInAgain {
  protected readonly who = inject<WhoWas>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<SignInAgain, boolean>>(MatDialogRef);

  protected close(back: boolean): void {
    this.dialog.close(back);
  }
}
