import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatMenuModule } from '@angular/material/menu';
import { PAPER_SIZES, type PaperSize } from '@shared/contracts/papers';
import { firstValueFrom } from 'rxjs';
import { Server } from '../server/server';
import { ServerProblem } from '../server/server-problem';
import { FileHandover } from '../ui/file-handover';
import { Notice } from '../ui/notice';
import { commandOf } from './editing/commands';
import { PartEditor } from './editing/part-editor';
import { Autosave } from './saving/autosave';
import { saveWords } from './saving/save-state';

const PAPER_WORDS: Readonly<Record<PaperSize, string>> = { a4: 'A4', letter: 'Letter' };

/** Which part this is, how it stands, and what can be done with the whole of it. */
@Component({
  selector: 'lw-part-header',
  imports: [MatButtonModule, MatMenuModule, Notice],
  templateUrl: './part-header.html',
  styleUrl: './part-header.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PartHeader {
  private readonly server = inject(Server);
  private readonly autosave = inject(Autosave);
  private readonly handover = inject(FileHandover);
  protected readonly editor = inject(PartEditor);

  protected readonly commands = [commandOf('undo'), commandOf('redo')];
  protected readonly saving = computed(() => saveWords(this.autosave.state(), this.autosave.untaken() !== null));
  protected readonly isSaved = computed(() => this.autosave.state().is === 'saved' && this.autosave.untaken() === null);
  protected readonly isLate = computed(
    () => this.autosave.untaken() !== null || !['saved', 'waiting', 'saving'].includes(this.autosave.state().is),
  );
  protected readonly papers = PAPER_SIZES.map((size) => ({ size, words: PAPER_WORDS[size] }));
  /** Size of the paper that is being made. */
  protected readonly making = signal<PaperSize | null>(null);
  protected readonly trouble = signal<string | null>(null);
  protected readonly whyNoPaper = computed(() => {
    if (this.making() !== null) return 'The paper is being made.';
    return this.isSaved()
      ? ''
      : 'The paper is made from the saved draft; it can be had once everything typed is taken and saved.';
  });

  /** By a request of the app and not by a link: a session that has ended is renewed in place, a failure told in words. */
  protected async makePaper(size: PaperSize): Promise<void> {
    const part = this.editor.part();
    if (!part || this.making() !== null) return;
    this.making.set(size);
    this.trouble.set(null);
    try {
      this.handover.give(await firstValueFrom(this.server.blankPaper(part.id, part.revision.letter, size)));
    } catch (error) {
      this.trouble.set(error instanceof ServerProblem ? error.message : 'Something went wrong here in the app.');
    } finally {
      this.making.set(null);
    }
  }
}
