import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { PartEditor } from '../editing/part-editor';
import { Autosave } from './autosave';
import type { LocalCopy } from './local-copies';

/** What somebody has to decide or know about saving, over the page until it is settled. */
@Component({
  selector: 'lw-saving-notices',
  imports: [MatButtonModule],
  templateUrl: './saving-notices.html',
  styleUrl: './saving-notices.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SavingNotices {
  private readonly autosave = inject(Autosave);
  protected readonly editor = inject(PartEditor);

  protected readonly state = this.autosave.state;
  protected readonly leftBehind = computed(() => (this.editor.mayEdit() ? this.autosave.leftBehind() : null));
  /** The server has moved on since the work was left. */
  protected readonly outdated = computed(() => {
    const copy = this.leftBehind();
    const part = this.editor.part();
    return copy !== null && part !== null && copy.version < part.revision.version;
  });

  protected when(copy: LocalCopy): string {
    return new Date(copy.keptAt).toLocaleString();
  }

  protected takeUp(copy: LocalCopy): void {
    this.editor.apply(() => copy.document);
    this.autosave.settleCopy();
  }

  protected discard(): void {
    this.autosave.settleCopy();
  }

  protected retry(): void {
    this.autosave.retry();
  }
}
