import type { AbstractControl } from '@angular/forms';
import type { ErrorStateMatcher } from '@angular/material/core';

/** Marks a field when its own check, the engine or the server has something to say, once somebody has been at the field. */
export class FieldMatcher implements ErrorStateMatcher {
  constructor(private readonly words: () => string | null) {}

  isErrorState(control: AbstractControl | null): boolean {
    if (control === null || !(control.touched || control.dirty)) return false;
    return control.invalid || this.words() !== null;
  }
}
