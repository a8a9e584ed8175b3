import { DOCUMENT, inject, Injectable, signal } from '@angular/core';

export const THEMES = ['system', 'light', 'dark'] as const;
export type Theme = (typeof THEMES)[number];

const KEY = 'lw-theme';

/** Light, dark or as the system, kept on this computer. The palette itself follows `color-scheme` (styles.scss). */
@Injectable({ providedIn: 'root' })
export class ThemeChoice {
  private readonly document = inject(DOCUMENT);
  private readonly chosen = signal<Theme>(this.kept());
  readonly theme = this.chosen.asReadonly();

  choose(theme: Theme): void {
    this.chosen.set(theme);
    try {
      this.document.defaultView?.localStorage.setItem(KEY, theme);
    } catch {
      // Storage is closed to us: the choice holds until the page is left.
    }
    this.apply();
  }

  apply(): void {
    const theme = this.chosen();
    this.document.documentElement.style.colorScheme = theme === 'system' ? '' : theme;
  }

  private kept(): Theme {
    try {
      const kept = this.document.defaultView?.localStorage.getItem(KEY);
      return THEMES.find((theme) => theme === kept) ?? 'system';
    } catch {
      return 'system';
    }
  }
}
