import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';
import type { Unit } from '@shared/part/document';
import { MATERIALS } from '@shared/reference/materials';
import { startWith, switchMap } from 'rxjs';
import { ALLOWANCE_CHOICES, HARDNESS_CHOICES } from './allowance-words';
import { changeUnit } from './change-unit';
import type { Messages } from './draft-document';
import type { NewPartForm } from './new-part-form';
import { TextField } from './text-field';

/** Unit, thickness, material, radius and allowance: what holds for the whole part. */
@Component({
  selector: 'lw-sheet-fields',
  imports: [ReactiveFormsModule, MatButtonToggleModule, MatFormFieldModule, MatSelectModule, TextField],
  templateUrl: './sheet-fields.html',
  styleUrl: './sheet-fields.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SheetFields {
  readonly form = input.required<NewPartForm>();
  readonly messages = input.required<Messages>();

  private readonly changed = toSignal(
    toObservable(this.form).pipe(switchMap((form) => form.valueChanges.pipe(startWith(null)))),
  );
  protected readonly values = computed(() => {
    this.changed();
    return this.form().getRawValue();
  });
  protected readonly methods = ALLOWANCE_CHOICES;
  protected readonly hardnesses = HARDNESS_CHOICES;
  protected readonly method = computed(() => this.methods.find((choice) => choice.method === this.values().method));
  /** Everything before something is typed, then what holds it. */
  protected readonly materials = computed(() => {
    const typed = this.values().material.trim().toLowerCase();
    const names = MATERIALS.map((material) => material.name);
    return names.filter((name) => name.toLowerCase().includes(typed) && name.toLowerCase() !== typed);
  });

  protected setUnit(unit: Unit): void {
    const form = this.form();
    changeUnit(form, form.controls.unit.value, unit);
  }
}
