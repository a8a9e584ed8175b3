import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { type FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatAutocompleteModule } from '@angular/material/autocomplete';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { startWith, switchMap } from 'rxjs';
import { FieldMatcher } from './field-matcher';

/** One labelled box with its unit, a hint, and the message of whoever refuses what stands in it. */
@Component({
  selector: 'lw-text-field',
  imports: [ReactiveFormsModule, MatAutocompleteModule, MatFormFieldModule, MatInputModule],
  template: `
    <mat-form-field appearance="outline" hideRequiredMarker>
      <mat-label>{{ label() }}</mat-label>
      <input
        matInput
        autocomplete="off"
        spellcheck="false"
        [formControl]="control()"
        [errorStateMatcher]="matcher"
        [required]="required()"
        [matAutocomplete]="choices"
        [matAutocompleteDisabled]="suggestions().length === 0"
      />
      @if (unit(); as unit) {
        <span matTextSuffix>{{ unit }}</span>
      }
      @if (hint(); as hint) {
        <mat-hint>{{ hint }}</mat-hint>
      }
      <mat-error>{{ said().words }}</mat-error>
    </mat-form-field>
    <mat-autocomplete #choices="matAutocomplete">
      @for (choice of suggestions(); track choice) {
        <mat-option [value]="choice">{{ choice }}</mat-option>
      }
    </mat-autocomplete>
  `,
  styles: `
    :host,
    mat-form-field {
      display: block;
      min-width: 0;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TextField {
  readonly control = input.required<FormControl<string>>();
  readonly label = input.required<string>();
  readonly unit = input<string>();
  readonly hint = input<string>();
  readonly required = input(false);
  /** From the engine or the server; the control's own check comes before it. */
  readonly message = input<string>();
  readonly suggestions = input<readonly string[]>([]);

  private readonly events = toSignal(
    toObservable(this.control).pipe(switchMap((control) => control.events.pipe(startWith(null)))),
  );
  /**
   * A new object with every event of the control: touched is no signal, and without this the box would not show its
   * message when the button is pressed before anything was typed.
   */
  protected readonly said = computed(() => {
    this.events();
    const own: unknown = this.control().errors?.['words'];
    return { words: typeof own === 'string' ? own : (this.message() ?? null) };
  });
  protected readonly matcher = new FieldMatcher(() => this.said().words);
}
