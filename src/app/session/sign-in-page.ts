import { ChangeDetectionStrategy, Component, computed, inject, input, viewChild } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Router } from '@angular/router';
import type { Role } from '@shared/contracts/session';
import { Mark } from '../ui/mark';
import { Notice } from '../ui/notice';
import { BendPicture } from './bend-picture';
import { ROLE_WORDS, roleNames } from './role-words';
import { SessionStore } from './session-store';
import { SignInForm } from './sign-in-form';

@Component({
  selector: 'lw-sign-in-page',
  imports: [MatButtonModule, Mark, Notice, BendPicture, SignInForm],
  templateUrl: './sign-in-page.html',
  styleUrl: './sign-in-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignInPage {
  protected readonly session = inject(SessionStore);
  private readonly router = inject(Router);

  /** The address that was asked for before sign-in. */
  readonly to = input<string>();

  private readonly form = viewChild(SignInForm);
  protected readonly demo = computed(() => {
    const shop = this.session.shop();
    return shop?.demo && shop.demoSignIns ? { people: shop.demoSignIns, password: shop.demoPassword ?? '' } : null;
  });

  constructor() {
    void this.ask();
  }

  protected async ask(): Promise<void> {
    const state = await this.session.load();
    if (state.is === 'signed-in') await this.goOn();
  }

  protected async goOn(): Promise<void> {
    const to = this.to();
    // Only addresses of this app: anything else in the address bar is not ours to follow.
    await this.router.navigateByUrl(to?.startsWith('/') && !to.startsWith('//') ? to : '/parts', { replaceUrl: true });
  }

  protected fill(email: string, password: string): void {
    this.form()?.fill(email, password);
  }

  protected names(roles: readonly Role[]): string {
    return roleNames(roles);
  }

  protected does(roles: readonly Role[]): string {
    return roles.map((role) => ROLE_WORDS[role].does).join(', ');
  }
}
