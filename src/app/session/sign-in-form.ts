import {
  ChangeDetectionStrategy,
  Component,
  effect,
  type ElementRef,
  inject,
  input,
  output,
  signal,
  viewChild,
} from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { type MatButton, MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { Icon } from '../ui/icon';
import { Notice } from '../ui/notice';
import { SessionStore } from './session-store';
import { signInWords } from './sign-in-words';

/** E-mail address and password; used by the sign-in page and by the dialog over an open page. */
@Component({
  selector: 'lw-sign-in-form',
  imports: [ReactiveFormsModule, MatButtonModule, MatFormFieldModule, MatInputModule, Icon, Notice],
  templateUrl: './sign-in-form.html',
  styleUrl: './sign-in-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignInForm {
  private readonly session = inject(SessionStore);

  /** Set when only this person may sign in here. */
  readonly email = input<string | null>(null);
  readonly signedIn = output();

  protected readonly form = inject(NonNullableFormBuilder).group({
    email: ['', [Validators.required, Validators.maxLength(254)]],
    password: ['', [Validators.required, Validators.maxLength(1000)]],
  });
  protected readonly shown = signal(false);
  protected readonly busy = signal(false);
  protected readonly trouble = signal<string | null>(null);
  private readonly emailBox = viewChild<ElementRef<HTMLInputElement>>('emailBox');
  private readonly passwordBox = viewChild.required<ElementRef<HTMLInputElement>>('passwordBox');
  private readonly submitButton = viewChild.required<MatButton>('submitButton');

  constructor() {
    effect(() => {
      const email = this.email();
      if (email !== null) this.form.controls.email.setValue(email);
    });
  }

  /** For the demo shop's list: fills both fields in and leaves the sign-in to one more press. */
  fill(email: string, password: string): void {
    this.form.setValue({ email, password });
    this.trouble.set(null);
    this.submitButton().focus();
  }

  protected async submit(): Promise<void> {
    if (this.busy()) return;
    this.form.markAllAsTouched();
    this.trouble.set(null);
    if (this.form.invalid) {
      this.focusFirstWrong();
      return;
    }
    this.busy.set(true);
    try {
      const { email, password } = this.form.getRawValue();
      await this.session.signIn({ email: email.trim(), password });
      this.signedIn.emit();
    } catch (error) {
      this.trouble.set(signInWords(error));
      this.passwordBox().nativeElement.focus();
    } finally {
      this.busy.set(false);
    }
  }

  private focusFirstWrong(): void {
    const box = this.form.controls.email.invalid ? this.emailBox() : this.passwordBox();
    box?.nativeElement.focus();
  }
}
