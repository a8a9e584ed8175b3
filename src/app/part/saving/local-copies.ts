import { DOCUMENT, inject, Injectable } from '@angular/core';
import type { PartDocument } from '@shared/part/document';

/** Work that the server has not confirmed, kept in this browser. */
export interface LocalCopy {
  /** Null when only a typed chain was not taken. */
  readonly document: PartDocument | null;
  /** Typed chain that stood in its box and was not taken. */
  readonly typed: string | null;
  /** Version of the revision that the work started from. */
  readonly version: number;
  readonly keptAt: string;
}

/** One stay of one person with one draft. Every stay keeps its own copy, so that two tabs never take each other's. */
export interface Stay {
  readonly person: string;
  readonly part: string;
  readonly letter: string;
  readonly visit: string;
}

const prefix = (person: string, part: string, letter: string): string => `lw-draft/${person}/${part}/${letter}/`;
const key = ({ person, part, letter, visit }: Stay): string => `${prefix(person, part, letter)}${visit}`;

@Injectable({ providedIn: 'root' })
export class LocalCopies {
  private readonly window = inject(DOCUMENT).defaultView;

  /** False when the browser keeps nothing for us; the caller should say so. */
  keep(stay: Stay, copy: LocalCopy): boolean {
    try {
      this.window?.localStorage.setItem(key(stay), JSON.stringify(copy));
      return this.window !== null;
    } catch {
      return false;
    }
  }

  /** All copies of one draft by the visit that left them, the newest first. */
  all(person: string, part: string, letter: string): { readonly visit: string; readonly copy: LocalCopy }[] {
    const start = prefix(person, part, letter);
    const found = this.keys()
      .filter((name) => name.startsWith(start))
      .map((name) => ({ visit: name.slice(start.length), copy: this.at(name) }));
    return found
      .flatMap(({ visit, copy }) => (copy ? [{ visit, copy }] : []))
      .sort((one, other) => other.copy.keptAt.localeCompare(one.copy.keptAt));
  }

  drop(stay: Stay): void {
    try {
      this.window?.localStorage.removeItem(key(stay));
    } catch {
      // What could not be written need not be removed.
    }
  }

  private keys(): string[] {
    try {
      return Object.keys(this.window?.localStorage ?? {});
    } catch {
      return [];
    }
  }

  private at(name: string): LocalCopy | null {
    try {
      const text = this.window?.localStorage.getItem(name) ?? null;
      return text === null ? null : readCopy(JSON.parse(text));
    } catch {
      return null;
    }
  }
}

/** Only the frame is judged here; broken fields in the document are what the copy is for. */
function readCopy(value: unknown): LocalCopy | null {
  if (typeof value !== 'object' || value === null) return null;
  const { document = null, typed = null, version, keptAt } = value as Partial<Record<keyof LocalCopy, unknown>>;
  if (typeof version !== 'number' || typeof keptAt !== 'string') return null;
  if (document !== null && !isChained(document)) return null;
  if (typed !== null && typeof typed !== 'string') return null;
  return document === null && typed === null ? null : { document, typed, version, keptAt };
}

const isChained = (value: unknown): value is PartDocument =>
  typeof value === 'object' && value !== null && 'chain' in value && Array.isArray(value.chain);
