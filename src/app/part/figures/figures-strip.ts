import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { METHOD_WORDS } from '@shared/part/allowance-words';
import type { Solved } from '@shared/result';
import { convertMass, formatMass, MASS_UNIT } from '@shared/section/mass';
import { NotCurrent } from '../../ui/not-current';
import { PartEditor } from '../editing/part-editor';

interface Figure {
  readonly words: string;
  readonly figure: string;
  readonly more: string;
  readonly inWords?: boolean;
}

const NONE = '—';

/** The figures that a part is asked for, larger than their labels. */
@Component({
  selector: 'lw-figures-strip',
  imports: [NotCurrent],
  template: `
    @if (!editor.isCurrent()) {
      <lw-not-current [why]="editor.whyNotCurrent()" />
    }
    <dl [class.old]="!editor.isCurrent()">
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
        more: blank.width === null ? '× width not stated' : `× ${figure(blank.width)}`,
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
    const unit = MASS_UNIT[this.editor.shownUnit()];
    if (!mass) {
      const material = this.editor.document().material === undefined ? 'material not stated' : 'density not known';
      const more = length === null ? '' : width === null ? 'width not stated' : material;
      return { words: 'Mass', figure: NONE, more };
    }
    return { words: 'Mass', figure: formatMass(convertMass(mass.value, mass.unit, unit)), more: unit };
  }

  /** The K that was used or is implied; a span when the bends differ. */
  private allowance(solved: Solved): Figure {
    const method = METHOD_WORDS[this.editor.document().allowance.method];
    const ks = solved.bends.map((bend) => bend.kFactor);
    if (ks.length === 0) return { words: 'Bend allowance', figure: method, more: 'no bends', inWords: true };
    const [low, high] = [Math.min(...ks).toFixed(3), Math.max(...ks).toFixed(3)];
    const others = new Set(solved.bends.map((bend) => bend.method)).size > 1 ? ', some bends by others' : '';
    const k = low === high ? low : `${low}–${high}`;
    return { words: 'Bend allowance', figure: method, more: `K ${k}${others}`, inWords: true };
  }
}
