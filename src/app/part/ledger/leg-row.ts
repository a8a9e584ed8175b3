import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { type ChainEntry, isLeg, type Leg, type Measure } from '@shared/part/document';
import { setLegDimension } from '@shared/part/edits/set-leg-dimension';
import { setMeasure } from '@shared/part/edits/set-measure';
import { setName } from '@shared/part/edits/set-name';
import { measureEnds, MEASURES } from '@shared/part/measure';
import { MEASURE_WORDS } from '@shared/part/words';
import { commandOf } from '../editing/commands';
import { PartEditor } from '../editing/part-editor';
import { needsReading, typedExpression } from '../../ui/typed-expression';
import { ExpressionField } from '../../ui/expression-field';
import { NameBox } from './name-box';

@Component({
  selector: 'lw-leg-row',
  imports: [ExpressionField, MatButtonModule, NameBox],
  templateUrl: './leg-row.html',
  styleUrl: './row.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LegRow {
  readonly index = input.required<number>();
  readonly number = input.required<number>();
  /** Another row is to be gone on with. */
  readonly goOn = output();

  protected readonly editor = inject(PartEditor);
  protected readonly measures = MEASURES;
  protected readonly measureWords = MEASURE_WORDS;
  protected readonly insert = commandOf('add-after');

  protected readonly leg = computed((): Leg => {
    const entry: ChainEntry | undefined = this.editor.document().chain[this.index()];
    return entry && isLeg(entry) ? entry : { leg: '' };
  });
  protected readonly ends = computed(() => measureEnds(this.leg()));
  protected readonly sameEnds = computed(() => this.ends()[0] === this.ends()[1]);
  protected readonly selected = computed(() => this.editor.selection() === this.index());
  /** Only a leg between two bends has two ends that can differ. */
  protected readonly between = computed(() => {
    const { chain } = this.editor.document();
    return this.index() > 0 && this.index() < chain.length - 1;
  });
  protected readonly message = computed(() => this.editor.messages().get(`chain/${this.index()}/leg`) ?? null);
  protected readonly measureMessage = computed(() => {
    const path = `chain/${this.index()}/measure`;
    const messages = this.editor.messages();
    return messages.get(path) ?? messages.get(`${path}/0`) ?? messages.get(`${path}/1`) ?? null;
  });
  protected readonly understood = computed(() => {
    const result = this.editor.result();
    if (!result.ok || !needsReading(this.leg().leg)) return null;
    const dimension = result.legs.find((leg) => leg.chain === this.index())?.dimension;
    return dimension === undefined ? null : String(Number(dimension.toFixed(5)));
  });

  protected type(text: string): void {
    const index = this.index();
    this.editor.apply((document) => setLegDimension(document, index, typedExpression(text)), `leg ${index}`);
  }

  protected rename(name: string): void {
    const index = this.index();
    this.editor.apply((document) => setName(document, index, name), `name ${index}`);
  }

  protected insertAfter(): void {
    this.insert.run(this.editor);
    this.goOn.emit();
  }

  protected measure(value: string): void {
    const chosen = MEASURES.find((one) => one === value);
    const index = this.index();
    if (chosen) this.editor.apply((document) => setMeasure(document, index, chosen));
  }

  protected measureEnd(end: 0 | 1, value: string): void {
    const chosen = MEASURES.find((one) => one === value);
    const index = this.index();
    const [start, last] = this.ends();
    if (!chosen) return;
    const both: readonly [Measure, Measure] = end === 0 ? [chosen, last] : [start, chosen];
    this.editor.apply((document) => setMeasure(document, index, both));
  }
}
