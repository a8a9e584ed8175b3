import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatMenuModule } from '@angular/material/menu';
import { PAPER_SIZES, type PaperSize } from '@shared/contracts/papers';
import { Server } from '../server/server';
import { commandOf } from './editing/commands';
import { PartEditor } from './editing/part-editor';
import { Autosave } from './saving/autosave';
import { saveWords } from './saving/save-state';

const PAPER_WORDS: Readonly<Record<PaperSize, string>> = { a4: 'A4', letter: 'Letter' };

/** Which part this is, how it stands, and what can be done with the whole of it. */
@Component({
  selector: 'lw-part-header',
  imports: [MatButtonModule, MatMenuModule],
  templateUrl: './part-header.html',
  styleUrl: './part-header.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PartHeader {
  private readonly server = inject(Server);
  private readonly autosave = inject(Autosave);
  protected readonly editor = inject(PartEditor);

  protected readonly commands = [commandOf('undo'), commandOf('redo')];
  protected readonly saving = computed(() => saveWords(this.autosave.state()));
  protected readonly isSaved = computed(() => this.autosave.state().is === 'saved');
  protected readonly isLate = computed(() => !['saved', 'waiting', 'saving'].includes(this.autosave.state().is));
  protected readonly papers = computed(() => {
    const part = this.editor.part();
    if (!part) return [];
    return PAPER_SIZES.map((size) => ({
      words: PAPER_WORDS[size],
      address: this.server.blankPaper(part.id, part.revision.letter, size),
    }));
  });
}
