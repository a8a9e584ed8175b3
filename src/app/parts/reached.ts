import { afterNextRender, DestroyRef, Directive, ElementRef, inject, output } from '@angular/core';

/** Tells when its element comes near the visible part of the page. */
@Directive({ selector: '[lwReached]' })
export class Reached {
  readonly lwReached = output();

  constructor() {
    const element = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    const destroy = inject(DestroyRef);
    afterNextRender(() => {
      const watcher = new IntersectionObserver(
        (entries) => {
          if (entries.some((entry) => entry.isIntersecting)) this.lwReached.emit();
        },
        { rootMargin: '400px' },
      );
      watcher.observe(element);
      destroy.onDestroy(() => watcher.disconnect());
    });
  }
}
