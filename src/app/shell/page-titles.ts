import { inject, Injectable } from '@angular/core';
import { Title } from '@angular/platform-browser';
import { type RouterStateSnapshot, TitleStrategy } from '@angular/router';

/** "Parts · Leafwright": the page first, so that tabs tell each other apart. A page may set a better title by `Title`. */
@Injectable()
export class PageTitles extends TitleStrategy {
  private readonly title = inject(Title);

  override updateTitle(state: RouterStateSnapshot): void {
    const page = this.buildTitle(state);
    this.title.setTitle(page ? `${page} · Leafwright` : 'Leafwright');
  }
}
