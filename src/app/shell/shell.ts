import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  type ElementRef,
  inject,
  viewChild,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import { Reachability } from '../server/reachability';
import { SessionStore } from '../session/session-store';
import { Mark } from '../ui/mark';
import { AccountMenu } from './account-menu';
import { LostServer } from './lost-server';
import { OutageBar } from './outage-bar';
import { OutageWatch } from './outage-watch';

/** Top bar and the page under it. */
@Component({
  selector: 'lw-shell',
  imports: [MatButtonModule, RouterLink, RouterLinkActive, RouterOutlet, Mark, AccountMenu, LostServer, OutageBar],
  templateUrl: './shell.html',
  styleUrl: './shell.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Shell {
  protected readonly session = inject(SessionStore);
  private readonly reachability = inject(Reachability);
  private readonly router = inject(Router);
  private readonly content = viewChild.required<ElementRef<HTMLElement>>('content');
  protected readonly shopName = computed(() => {
    const shop = this.session.shop();
    return shop === null ? '' : shop.demo ? `${shop.name} · demo shop` : shop.name;
  });

  constructor() {
    inject(OutageWatch);
    if (this.session.state().is === 'loading') void this.session.load();
    effect(() => {
      if (this.reachability.reachable() && this.session.state().is === 'unreachable') void this.askAgain();
    });
  }

  /** Not a plain `#content` link: with a base href that would leave the page. */
  protected skip(event: Event): void {
    event.preventDefault();
    this.content().nativeElement.focus();
  }

  protected async askAgain(): Promise<void> {
    const state = await this.session.load();
    if (state.is === 'signed-out') await this.router.navigate(['/sign-in'], { queryParams: { to: this.router.url } });
  }
}
