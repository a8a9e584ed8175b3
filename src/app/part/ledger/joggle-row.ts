import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { isJoggle, type Joggle } from '@shared/part/document';
import { removeBend, whyBendStays } from '@shared/part/edits/remove-bend';
import { setJoggle } from '@shared/part/edits/set-joggle';
import { setRadius } from '@shared/part/edits/set-radius';
import { setTurn } from '@shared/part/edits/set-turn';
import { PartEditor } from '../editing/part-editor';
import { typedExpression } from '../../ui/typed-expression';
import { ExpressionField } from '../../ui/expression-field';

@Component({
  selector: 'lw-joggle-row',
  imports: [ExpressionField, MatButtonModule],
  templateUrl: './joggle-row.html',
  styleUrl: './row.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class JoggleRow {
  readonly index = input.required<number>();
  readonly number = input.required<number>();
  /** Another row is to be gone on with. */
  readonly goOn = output();

  protected readonly editor = inject(PartEditor);
  protected readonly fields = [
    { key: 'joggle', words: 'depth' },
    { key: 'run', words: 'run' },
    { key: 'radius', words: 'radius' },
  ] as const;

  protected readonly joggle = computed((): Joggle => {
    const entry = this.editor.document().chain[this.index()];
    return entry && isJoggle(entry) ? entry : { joggle: '', run: '', turn: 'up', radius: '' };
  });
  protected readonly selected = computed(() => this.editor.selection() === this.index());
  protected readonly stays = computed(() => whyBendStays(this.editor.document(), this.index()));

  protected message(field: string): string | null {
    return this.editor.messages().get(`chain/${this.index()}/${field}`) ?? null;
  }

  protected type(field: 'joggle' | 'run' | 'radius', text: string): void {
    const index = this.index();
    const value = typedExpression(text);
    this.editor.apply(
      (document) => (field === 'radius' ? setRadius(document, index, value) : setJoggle(document, index, field, value)),
      `${field} ${index}`,
    );
  }

  protected turn(value: string): void {
    const index = this.index();
    this.editor.apply((document) => setTurn(document, index, value === 'down' ? 'down' : 'up'));
  }

  protected remove(event: Event): void {
    event.stopPropagation();
    const index = this.index();
    this.editor.apply((document) => removeBend(document, index));
    this.editor.select(index - 1);
    this.goOn.emit();
  }
}
