import { DOCUMENT, inject, Injectable } from '@angular/core';

/** Hands a file to the browser, which asks or knows where to put it. */
@Injectable({ providedIn: 'root' })
export class FileHandover {
  private readonly document = inject(DOCUMENT);

  give({ name, content }: { readonly name: string; readonly content: Blob }): void {
    const address = URL.createObjectURL(content);
    const link = this.document.createElement('a');
    link.href = address;
    link.download = name;
    link.click();
    // The browser has begun to read by the next turn; until then the address must stand.
    setTimeout(() => URL.revokeObjectURL(address));
  }
}
