import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import type { Solved } from '@shared/result';
import { PartEditor } from '../editing/part-editor';
import { METHOD_WORDS } from '../words';

interface Figure {
  readonly words: string;
  readonly figure: string;
  readonly more: string;
  readonly inWords?: boolean;
}

const NONE = '—';
const POUNDS_PER_KILOGRAM = 1 / 0.45359237;

/** The figures that a part is asked for, larger than their labels. */
@Component({
  selector: 'lw-figures-strip',
  template: `
    <dl [class.dimmed]="!editor.isCurrent()">
      @for (one of figures(); track one.words) {
        <div>
          <dt>{{ one.words }}</dt>
          <dd>
            <b [class.words]="one.inWords">{{ one.figure }}</b>
            @if (one.more) {
              <span>{{ one.more }}</span>
            }
          </dd>
        </div>
      }
    </dl>
  `,
  styleUrl: './figures-strip.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FiguresStrip {
  protected readonly editor = inject(PartEditor);

  protected readonly figures = computed((): Figure[] => {
    const solved = this.editor.drawn();
    if (!solved) return [];
    const figure = this.editor.figureOf();
    const unit = this.editor.shownUnit();
    const { blank } = solved;
    const envelope = solved.formed?.envelope ?? null;
    const figures: Figure[] = [
      {
        words: `Blank, net, ${unit}`,
        figure: blank.length === null ? NONE : figure(blank.length),
        more: blank.width === null ? '× width not said' : `× ${figure(blank.width)}`,
      },
    ];
    if (blank.trim.start + blank.trim.end > 0) {
      const rough = blank.roughLength === null ? NONE : figure(blank.roughLength);
      figures.push({ words: `Blank, rough, ${unit}`, figure: rough, more: 'until trimmed' });
    }
    figures.push(
      this.mass(solved),
      {
        words: `Envelope, ${unit}`,
        figure: envelope ? figure(envelope.width) : NONE,
        more: envelope ? `× ${figure(envelope.height)}` : '',
      },
      this.allowance(solved),
    );
    return figures;
  });

  private mass({ blank: { mass, width, length } }: Solved): Figure {
    const unit = this.editor.shownUnit() === 'in' ? 'lb' : 'kg';
    if (!mass) {
      const more = length === null ? '' : width === null ? 'width not said' : 'material not known';
      return { words: 'Mass', figure: NONE, more };
    }
    const pounds = mass.unit === 'lb' ? mass.value : mass.value * POUNDS_PER_KILOGRAM;
    const value = unit === mass.unit ? mass.value : unit === 'lb' ? pounds : mass.value / POUNDS_PER_KILOGRAM;
    return { words: 'Mass', figure: value.toFixed(3), more: unit };
  }

  /** The K that was used or is implied; a span when the bends differ. */
  private allowance(solved: Solved): Figure {
    const method = METHOD_WORDS[this.editor.document().allowance.method];
    const ks = solved.bends.map((bend) => bend.kFactor);
    if (ks.length === 0) return { words: 'Allowance by', figure: method, more: 'no bends', inWords: true };
    const [low, high] = [Math.min(...ks).toFixed(3), Math.max(...ks).toFixed(3)];
    const others = new Set(solved.bends.map((bend) => bend.method)).size > 1 ? ', some bends by others' : '';
    const k = low === high ? low : `${low}–${high}`;
    return { words: 'Allowance by', figure: method, more: `K ${k}${others}`, inWords: true };
  }
}
