import { ChangeDetectionStrategy, Component, computed, type ElementRef, inject, viewChild } from '@angular/core';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { inOneLine, legName, lineNote } from '@shared/part/words';
import { DrawingView } from '../../drawing/drawing-view';
import { elementSize } from '../../drawing/element-size';
import { formedDrawing } from '../../drawing/formed-drawing';
import { NO_OVERLAY } from '../../drawing/marks';
import { PartEditor } from '../editing/part-editor';
import { bendSentence } from '../words';

/** The part as it will be: true faces, dimensions, mold points. */
@Component({
  selector: 'lw-formed-deck',
  imports: [DrawingView, MatButtonToggleModule],
  templateUrl: './formed-deck.html',
  styleUrl: './deck.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FormedDeck {
  protected readonly editor = inject(PartEditor);
  private readonly room = viewChild<ElementRef<HTMLElement>>('room');
  private readonly size = elementSize(this.room);

  protected readonly drawing = computed(() => {
    const solved = this.editor.drawn();
    const { width, height } = this.size();
    if (!solved || width === 0) return null;
    const figureOf = this.editor.figureOf();
    return formedDrawing(solved, {
      width,
      height,
      figureOf,
      notesOf: (index) => {
        const bend = solved.bends[index];
        if (!bend) return [];
        const setback = bend.setback === null ? '—' : figureOf(bend.setback);
        const lower = `BA ${figureOf(bend.allowance)} · SB ${setback}`;
        const note = lineNote(bend, index);
        return [
          { upper: inOneLine(note), lower },
          { upper: `${note.line} · ${note.face} · ${note.angle}`, lower },
        ];
      },
    });
  });
  protected readonly note = computed(() => this.drawing()?.noteOn(this.editor.selection()) ?? NO_OVERLAY);
  protected readonly level = computed(() => {
    const solved = this.editor.drawn();
    const seat = solved?.formed?.envelope?.seat;
    if (!solved || seat === undefined) return '';
    return `${legName(solved.legs[seat]?.name ?? null, seat)} level`;
  });
  /** Why there is no drawing: the stops that stand in its way, in the engine's words. */
  protected readonly why = computed(() => {
    const solved = this.editor.drawn();
    if (!solved || solved.formed?.faces) return [];
    return solved.findings.filter((finding) => finding.level === 'stop').map((finding) => finding.message);
  });
  protected readonly sentences = computed(() => {
    const solved = this.editor.drawn();
    return solved ? solved.bends.map((_, index) => bendSentence(solved, index, this.editor.figureOf())) : [];
  });
  protected readonly label = computed(() => {
    const solved = this.editor.drawn();
    if (!solved) return 'Formed part';
    const envelope = solved.formed?.envelope;
    const figure = this.editor.figureOf();
    const size = envelope ? `, ${figure(envelope.width)} by ${figure(envelope.height)} overall` : '';
    return `Formed part seen from the side: ${solved.legs.length} legs, ${solved.bends.length} bends${size}.`;
  });
}
