import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { outlineOf } from '@shared/formed/outline';
import { seated } from '@shared/formed/seated';
import type { Solved } from '@shared/result';
import { formatLength } from '@shared/units/format';
import { Icon } from '../ui/icon';
import { SectionDrawing } from '../ui/section-drawing';

/** The formed section of what is typed so far, with the figures that matter before the part exists. */
@Component({
  selector: 'lw-live-section',
  imports: [Icon, SectionDrawing],
  templateUrl: './live-section.html',
  styleUrl: './live-section.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LiveSection {
  /** Null while something typed is broken. */
  readonly solved = input.required<Solved | null>();
  /** What was last good: it stays, dimmed, and says that it is not current. */
  readonly last = input.required<Solved | null>();

  protected readonly shown = computed(() => this.solved() ?? this.last());
  protected readonly outline = computed(() => {
    const shown = this.shown();
    const faces = shown === null ? null : seated(shown);
    return faces ? outlineOf(faces) : null;
  });
  protected readonly figures = computed(() => {
    const solved = this.shown();
    if (solved === null) return [];
    const { unit, blank, formed, bends } = solved;
    const say = (value: number | null | undefined): string =>
      value === null || value === undefined ? '—' : formatLength(value, unit);
    const envelope = formed?.envelope;
    return [
      { label: 'Blank length', value: say(blank.length), unit: blank.length === null ? '' : unit },
      { label: 'Bends', value: String(bends.length), unit: '' },
      {
        label: 'Envelope, width × height',
        value: envelope ? `${say(envelope.width)} × ${say(envelope.height)}` : '—',
        unit: envelope ? unit : '',
      },
    ];
  });
  protected readonly findings = computed(
    () => this.shown()?.findings.filter((finding) => finding.level !== 'note') ?? [],
  );
}
