import { inject, Injectable } from '@angular/core';
import { DOCUMENT } from '@angular/core';
import type { NewPartForm } from './new-part-form';

const KEY = 'lw-new-part';

/** What is typed on the page outlives a reload; it ends with the browser tab or when the part is made. */
@Injectable({ providedIn: 'root' })
export class KeptDraft {
  private readonly storage = inject(DOCUMENT).defaultView?.sessionStorage;

  keep(form: NewPartForm): void {
    try {
      this.storage?.setItem(KEY, JSON.stringify(form.getRawValue()));
    } catch {
      // Storage is full or closed to us: the page still holds everything.
    }
  }

  /** Takes over the texts that fit this form; anything else in the storage is left out. */
  restoreInto(form: NewPartForm): void {
    try {
      const kept: unknown = JSON.parse(this.storage?.getItem(KEY) ?? 'null');
      if (typeof kept === 'object' && kept !== null) form.patchValue(matching(kept, form.getRawValue()));
    } catch {
      this.forget();
    }
  }

  forget(): void {
    try {
      this.storage?.removeItem(KEY);
    } catch {
      // Nothing was kept then.
    }
  }
}

function matching<T extends object>(kept: object, shape: T): Partial<T> {
  const taken: Record<string, unknown> = {};
  const offered = new Map<string, unknown>(Object.entries(kept));
  for (const [key, value] of Object.entries(shape)) {
    const other = offered.get(key);
    if (typeof other !== typeof value || other === null) continue;
    taken[key] = typeof value === 'object' && value !== null ? matching(other as object, value as object) : other;
  }
  return taken as Partial<T>;
}
