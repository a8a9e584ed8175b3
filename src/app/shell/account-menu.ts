import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatMenuModule } from '@angular/material/menu';
import { MatSnackBar } from '@angular/material/snack-bar';
import { Router } from '@angular/router';
import type { Person } from '@shared/contracts/session';
import { roleNames } from '../session/role-words';
import { SessionStore } from '../session/session-store';
import { type Theme, ThemeChoice, THEMES } from '../theme/theme-choice';
import { Icon } from '../ui/icon';

const THEME_WORDS: Readonly<Record<Theme, string>> = { system: 'As the system', light: 'Light', dark: 'Dark' };

@Component({
  selector: 'lw-account-menu',
  imports: [MatButtonModule, MatMenuModule, Icon],
  templateUrl: './account-menu.html',
  styleUrl: './account-menu.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AccountMenu {
  private readonly session = inject(SessionStore);
  private readonly router = inject(Router);
  private readonly snackBar = inject(MatSnackBar);
  protected readonly choice = inject(ThemeChoice);

  readonly person = input.required<Person>();
  protected readonly roles = computed(() => roleNames(this.person().roles));
  protected readonly initials = computed(() => initialsOf(this.person().name));
  protected readonly leaving = signal(false);
  protected readonly themes = THEMES.map((theme) => ({ theme, words: THEME_WORDS[theme] }));

  protected async signOut(): Promise<void> {
    this.leaving.set(true);
    try {
      await this.session.signOut();
      await this.router.navigateByUrl('/sign-in');
    } catch {
      this.snackBar.open("Not signed out: the server can't be reached. Try again.", 'Close', { duration: 8000 });
    } finally {
      this.leaving.set(false);
    }
  }
}

export function initialsOf(name: string): string {
  const words = name.split(/\s+/).filter((word) => word !== '');
  const first = words.at(0) ?? '';
  const last = words.length > 1 ? (words.at(-1) ?? '') : '';
  return [first, last].map((word) => [...word][0]?.toUpperCase() ?? '').join('') || '?';
}
