import { NgTemplateOutlet } from '@angular/common';
import { afterNextRender, ChangeDetectionStrategy, Component, computed, inject, Injector } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { PartEditor } from '../editing/part-editor';
import { sameDocument } from '@shared/part/same-document';
import { momentWords } from '../../ui/when';
import { Reachability } from '../../server/reachability';
import { SessionStore } from '../../session/session-store';
import { Autosave } from './autosave';
import type { LocalCopy } from './local-copies';

/** What somebody has to decide or know about saving, over the page until it is settled. */
@Component({
  selector: 'lw-saving-notices',
  imports: [MatButtonModule, NgTemplateOutlet],
  templateUrl: './saving-notices.html',
  styleUrl: './saving-notices.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '(click)': 'keepFocus()' },
})
export class SavingNotices {
  private readonly injector = inject(Injector);
  private readonly autosave = inject(Autosave);
  private readonly session = inject(SessionStore);
  protected readonly editor = inject(PartEditor);
  protected readonly reachability = inject(Reachability);

  protected readonly state = this.autosave.state;
  protected readonly keepsCopy = this.autosave.keepsCopy;
  protected readonly leftBehind = computed(() => (this.editor.mayEdit() ? this.autosave.leftBehind() : null));
  /** The server has moved on since the work was left. */
  protected readonly outdated = computed(() => {
    const copy = this.leftBehind();
    const part = this.editor.part();
    return copy !== null && copy.document !== null && part !== null && copy.version < part.revision.version;
  });

  protected when(copy: LocalCopy): string {
    return momentWords(copy.keptAt);
  }

  /** The one who saved in between may be the same person in another window. */
  protected isMe(name: string): boolean {
    return this.session.person()?.name === name;
  }

  protected takeUp({ document, typed }: LocalCopy): void {
    if (document !== null) this.editor.apply((now) => (sameDocument(now, document) ? now : document));
    if (typed !== null) this.editor.typeChain(typed);
    this.autosave.settleCopy();
  }

  protected discard(): void {
    this.autosave.settleCopy();
  }

  /** A button that settles its notice goes away with it; the keyboard goes on in the chain and not at the top of the page. */
  protected keepFocus(): void {
    const read = (): void => {
      if (document.activeElement === document.body) document.getElementById('lw-typed-chain')?.focus();
    };
    afterNextRender({ read }, { injector: this.injector });
  }

  protected retry(): void {
    this.autosave.retry();
  }
}
