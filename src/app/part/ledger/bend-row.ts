import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { type Bend, isBend } from '@shared/part/document';
import { removeBend, whyBendStays } from '@shared/part/edits/remove-bend';
import { setBendAngle } from '@shared/part/edits/set-bend-angle';
import { setName } from '@shared/part/edits/set-name';
import { setRadius } from '@shared/part/edits/set-radius';
import { setTurn } from '@shared/part/edits/set-turn';
import { between, betweenLegs } from '@shared/part/words';
import { PartEditor } from '../editing/part-editor';
import { needsReading, typedExpression } from '../../ui/typed-expression';
import { ExpressionField } from '../../ui/expression-field';
import { NameBox } from './name-box';
import { TurnGlyph } from './turn-glyph';

@Component({
  selector: 'lw-bend-row',
  imports: [ExpressionField, MatButtonModule, NameBox, TurnGlyph],
  templateUrl: './bend-row.html',
  styleUrl: './row.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BendRow {
  readonly index = input.required<number>();
  readonly number = input.required<number>();
  /** Another row is to be gone on with. */
  readonly goOn = output();

  protected readonly editor = inject(PartEditor);

  protected readonly bend = computed((): Bend => {
    const entry = this.editor.document().chain[this.index()];
    return entry && isBend(entry) ? entry : { bend: '', turn: 'up', radius: '' };
  });
  protected readonly selected = computed(() => this.editor.selection() === this.index());
  protected readonly stays = computed(() => whyBendStays(this.editor.document(), this.index()));
  protected readonly angleMessage = this.messageAt('bend');
  protected readonly radiusMessage = this.messageAt('radius');

  private readonly solved = computed(() => {
    const result = this.editor.result();
    return result.ok ? (result.bends.find((bend) => bend.chain === this.index()) ?? null) : null;
  });
  protected readonly between = computed(() => {
    const solved = this.solved();
    return solved ? between(solved.angle) : '';
  });
  protected readonly says = computed(() => {
    const solved = this.solved();
    return [this.bend().name ?? '', solved ? betweenLegs(solved.angle) : ''].filter((words) => words !== '').join(', ');
  });
  protected readonly angleRead = computed(() => this.read(this.bend().bend, this.solved()?.angle, '°'));
  protected readonly radiusRead = computed(() => this.read(this.bend().radius, this.solved()?.radius, ''));

  protected typeAngle(text: string): void {
    const index = this.index();
    const angle = typedExpression(text.replace('°', ''));
    this.editor.apply((document) => setBendAngle(document, index, angle), `angle ${index}`);
  }

  protected typeRadius(text: string): void {
    const index = this.index();
    this.editor.apply((document) => setRadius(document, index, typedExpression(text)), `radius ${index}`);
  }

  protected turn(value: string): void {
    const index = this.index();
    this.editor.apply((document) => setTurn(document, index, value === 'down' ? 'down' : 'up'));
  }

  protected rename(name: string): void {
    const index = this.index();
    this.editor.apply((document) => setName(document, index, name), `name ${index}`);
  }

  protected remove(event: Event): void {
    // The row is gone afterwards; a click that went on would select what has moved into its place.
    event.stopPropagation();
    const index = this.index();
    this.editor.apply((document) => removeBend(document, index));
    this.editor.select(index - 1);
    this.goOn.emit();
  }

  private messageAt(field: string) {
    return computed(() => this.editor.messages().get(`chain/${this.index()}/${field}`) ?? null);
  }

  private read(typed: Bend['bend'], value: number | undefined, sign: string): string | null {
    return value === undefined || !needsReading(typed) ? null : `${Number(value.toFixed(5))}${sign}`;
  }
}
