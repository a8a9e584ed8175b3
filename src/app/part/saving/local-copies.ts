import { DOCUMENT, inject, Injectable } from '@angular/core';
import type { PartDocument } from '@shared/part/document';

/** Work that the server has not confirmed, kept in this browser. */
export interface LocalCopy {
  readonly document: PartDocument;
  /** Version of the revision that the work started from. */
  readonly version: number;
  readonly keptAt: string;
}

const key = (person: string, part: string, letter: string): string => `lw-draft/${person}/${part}/${letter}`;

@Injectable({ providedIn: 'root' })
export class LocalCopies {
  private readonly storage = inject(DOCUMENT).defaultView;

  /** False when the browser keeps nothing for us; the caller should say so. */
  keep(person: string, part: string, letter: string, copy: LocalCopy): boolean {
    try {
      this.storage?.localStorage.setItem(key(person, part, letter), JSON.stringify(copy));
      return this.storage !== null;
    } catch {
      return false;
    }
  }

  read(person: string, part: string, letter: string): LocalCopy | null {
    try {
      const text = this.storage?.localStorage.getItem(key(person, part, letter)) ?? null;
      const copy: unknown = text === null ? null : JSON.parse(text);
      return isCopy(copy) ? copy : null;
    } catch {
      return null;
    }
  }

  drop(person: string, part: string, letter: string): void {
    try {
      this.storage?.localStorage.removeItem(key(person, part, letter));
    } catch {
      // What could not be written need not be removed.
    }
  }
}

/** Only the frame is judged here; broken fields in the document are what the copy is for. */
function isCopy(value: unknown): value is LocalCopy {
  if (typeof value !== 'object' || value === null) return false;
  const { document, version, keptAt } = value as Partial<Record<keyof LocalCopy, unknown>>;
  const chain = typeof document === 'object' && document !== null && 'chain' in document ? document.chain : null;
  return Array.isArray(chain) && typeof version === 'number' && typeof keptAt === 'string';
}
