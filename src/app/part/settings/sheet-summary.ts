import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { METHOD_WORDS } from '@shared/part/allowance-words';
import { PartEditor } from '../editing/part-editor';

/** The sheet in a line: "0.040 in 2024-T3 · 6 in wide · grain across · handbook". */
@Component({
  selector: 'lw-sheet-summary',
  template: '<b>Sheet</b> {{ words() }}',
  styles: `
    b {
      font-weight: 600;
      color: var(--lw-ink);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SheetSummary {
  private readonly editor = inject(PartEditor);

  protected readonly words = computed(() => {
    const { unit, thickness, material, width, grain, allowance } = this.editor.document();
    const name = typeof material === 'object' ? material.name : (material ?? 'material not stated');
    return [
      `${thickness} ${unit} ${name}`,
      width === undefined ? 'width not stated' : `${width} ${unit} wide`,
      grain === undefined ? 'grain not stated' : `grain ${grain}`,
      METHOD_WORDS[allowance.method],
    ].join(' · ');
  });
}
