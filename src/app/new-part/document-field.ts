import { ChangeDetectionStrategy, Component, input, output, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Notice } from '../ui/notice';
import { type DocumentFile, readDocumentFile } from './read-document-file';

/** Picks a part document from this computer, by button or by dropping it. */
@Component({
  selector: 'lw-document-field',
  imports: [MatButtonModule, Notice],
  templateUrl: './document-field.html',
  styleUrl: './document-field.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DocumentField {
  readonly file = input.required<DocumentFile | null>();
  /** From the engine, for a document that is well formed but can't be laid out. */
  readonly message = input<string>();
  readonly picked = output<DocumentFile>();

  protected readonly over = signal(false);

  protected async pick(files: FileList | null | undefined): Promise<void> {
    const file = files?.item(0);
    if (file) this.picked.emit(await readDocumentFile(file));
  }

  protected async pickFrom(box: HTMLInputElement): Promise<void> {
    await this.pick(box.files);
    // The same file, mended, can be picked again.
    box.value = '';
  }

  protected async drop(event: DragEvent): Promise<void> {
    event.preventDefault();
    this.over.set(false);
    await this.pick(event.dataTransfer?.files);
  }

  protected drag(event: DragEvent, over: boolean): void {
    event.preventDefault();
    this.over.set(over);
  }
}
