import {
  ChangeDetectionStrategy,
  Component,
  computed,
  type ElementRef,
  inject,
  signal,
  viewChild,
} from '@angular/core';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { GRAIN_WORDS, UNIT_WORDS } from '@shared/part/words';
import { BLANK_LINES, blankDrawing, type BlankLines, SIDE_LETTERS } from '../../drawing/blank-drawing';
import { DrawingView } from '../../drawing/drawing-view';
import { elementSize } from '../../drawing/element-size';
import { PartEditor } from '../editing/part-editor';
import { bendSentence } from '../words';

/** The blank with everything that is marked on it. */
@Component({
  selector: 'lw-blank-deck',
  imports: [DrawingView, MatButtonToggleModule],
  templateUrl: './blank-deck.html',
  styleUrl: './deck.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BlankDeck {
  protected readonly editor = inject(PartEditor);
  private readonly room = viewChild<ElementRef<HTMLElement>>('room');
  private readonly size = elementSize(this.room);

  protected readonly unitWords = UNIT_WORDS;
  protected readonly choices = BLANK_LINES;
  protected readonly letters = SIDE_LETTERS;
  protected readonly lines = signal<BlankLines>('tangents');

  protected readonly grain = computed(() => this.editor.document().grain ?? null);
  protected readonly grainWords = GRAIN_WORDS;

  protected readonly drawing = computed(() => {
    const solved = this.editor.drawn();
    const { width } = this.size();
    if (!solved || width === 0) return null;
    return blankDrawing(solved, {
      width,
      lines: this.lines(),
      figureOf: this.editor.figureOf(),
      grain: this.grain(),
    });
  });
  protected readonly says = computed(() => {
    const words = this.lines() === 'tangents' ? 'bend tangent lines' : this.lines();
    return this.lines() === 'both' ? 'tangent lines above, sight lines below' : words;
  });
  protected readonly sentences = computed(() => {
    const solved = this.editor.drawn();
    return solved ? solved.bends.map((_, index) => bendSentence(solved, index, this.editor.figureOf())) : [];
  });
  protected readonly label = computed(() => {
    const solved = this.editor.drawn();
    const length = solved?.developedLength ?? null;
    if (!solved || length === null) return 'Flat blank';
    return `Flat blank, ${this.editor.figureOf()(length)} long, with ${solved.bends.length} bends; stations from the datum end.`;
  });

  protected show(value: string): void {
    const chosen = BLANK_LINES.find((one) => one === value);
    if (chosen) this.lines.set(chosen);
  }
}
