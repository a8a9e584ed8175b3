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

const ASIDE = '/before';

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

  /** The newest copy, also one that was set aside. */
  read(person: string, part: string, letter: string): LocalCopy | null {
    const name = key(person, part, letter);
    return this.at(name) ?? this.at(`${name}${ASIDE}`);
  }

  /** Makes way for new work while nobody has said what becomes of the old. */
  setAside(person: string, part: string, letter: string, copy: LocalCopy): void {
    try {
      this.storage?.localStorage.setItem(`${key(person, part, letter)}${ASIDE}`, JSON.stringify(copy));
    } catch {
      // The first copy still stands until new work replaces it.
    }
  }

  drop(person: string, part: string, letter: string): void {
    this.remove(key(person, part, letter));
  }

  dropAside(person: string, part: string, letter: string): void {
    this.remove(`${key(person, part, letter)}${ASIDE}`);
  }

  private at(name: string): LocalCopy | null {
    try {
      const text = this.storage?.localStorage.getItem(name) ?? null;
      const copy: unknown = text === null ? null : JSON.parse(text);
      return isCopy(copy) ? copy : null;
    } catch {
      return null;
    }
  }

  private remove(name: string): void {
    try {
      this.storage?.localStorage.removeItem(name);
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
