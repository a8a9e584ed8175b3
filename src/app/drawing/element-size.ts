import { DestroyRef, effect, type ElementRef, inject, type Signal, signal } from '@angular/core';

export interface Size {
  readonly width: number;
  readonly height: number;
}

/** The inner size of an element, kept up to date; 0 × 0 until it stands on the page. To be called where `inject` may be. */
export function elementSize(element: Signal<ElementRef<HTMLElement> | undefined>): Signal<Size> {
  const size = signal<Size>({ width: 0, height: 0 });
  const observer = new ResizeObserver(([entry]) => {
    if (!entry) return;
    const width = Math.floor(entry.contentRect.width);
    const height = Math.floor(entry.contentRect.height);
    size.update((former) => (former.width === width && former.height === height ? former : { width, height }));
  });
  effect(() => {
    observer.disconnect();
    const host = element();
    if (host) observer.observe(host.nativeElement);
  });
  inject(DestroyRef).onDestroy(() => observer.disconnect());
  return size.asReadonly();
}
