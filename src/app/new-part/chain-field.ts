import { CdkTextareaAutosize } from '@angular/cdk/text-field';
import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { type FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { startWith, switchMap } from 'rxjs';
import type { ChainError } from './draft-document';
import { FieldMatcher } from './field-matcher';

/** The typed chain; a message points at the words it is about. */
@Component({
  selector: 'lw-chain-field',
  imports: [CdkTextareaAutosize, ReactiveFormsModule, MatFormFieldModule, MatInputModule],
  templateUrl: './chain-field.html',
  styles: `
    mat-form-field {
      display: block;
    }

    .echo {
      margin: 8px 0 0;
      padding: 8px 12px;
      border-radius: var(--lw-radius-small);
      background: var(--lw-hair);
      white-space: pre-wrap;
      overflow-wrap: anywhere;
    }

    mark {
      background: none;
      color: var(--lw-red);
      font-weight: 500;
      text-decoration: underline wavy 1px;
      text-underline-offset: 3px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChainField {
  readonly control = input.required<FormControl<string>>();
  readonly errors = input.required<readonly ChainError[]>();
  readonly message = input<string>();

  private readonly events = toSignal(
    toObservable(this.control).pipe(switchMap((control) => control.events.pipe(startWith(null)))),
  );
  /** A new object with every event of the control, so that the box also follows being touched. */
  protected readonly said = computed(() => {
    this.events();
    return { words: this.message() ?? null };
  });
  protected readonly matcher = new FieldMatcher(() => this.said().words);
  /** The first wrong place with the text before and after it. */
  protected readonly wrong = computed(() => {
    this.events();
    const error = this.errors()[0];
    const text = this.control().value;
    if (error === undefined || text.trim() === '') return null;
    return {
      before: text.slice(0, error.start),
      at: text.slice(error.start, error.end) || ' ',
      after: text.slice(error.end),
    };
  });
}
