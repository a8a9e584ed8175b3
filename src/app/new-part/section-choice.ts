import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { type FormControl, ReactiveFormsModule } from '@angular/forms';
import { STARTING_SECTIONS } from '@shared/part/starting-sections';
import { DOCUMENT_FORMAT } from '@shared/part/document';
import { outlineOf } from '@shared/formed/outline';
import { seated } from '@shared/formed/seated';
import { solve } from '@shared/solve';
import { type Outline, SectionDrawing } from '../ui/section-drawing';
import { SHEET_STARTS } from './new-part-form';

/** The starting sections, each drawn by the engine at the sizes it starts with. */
@Component({
  selector: 'lw-section-choice',
  imports: [ReactiveFormsModule, SectionDrawing],
  template: `
    <fieldset>
      <legend class="cdk-visually-hidden">Starting section</legend>
      @for (section of sections; track section.id) {
        <label [title]="section.says">
          <input class="cdk-visually-hidden" type="radio" [value]="section.id" [formControl]="control()" />
          <lw-section-drawing [outline]="section.outline" />
          <span>{{ section.name }}</span>
        </label>
      }
    </fieldset>
  `,
  styleUrl: './section-choice.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SectionChoice {
  readonly control = input.required<FormControl<string>>();
  protected readonly sections = PICTURED;
}

/** Thick enough to be seen in a picture of this size. */
const PICTURE_THICKNESS = '0.06';

const PICTURED = STARTING_SECTIONS.map((section) => {
  const sizes = Object.fromEntries(section.sizes.map((size) => [size.key, size.initial.in]));
  const result = solve({
    format: DOCUMENT_FORMAT,
    unit: 'in',
    thickness: PICTURE_THICKNESS,
    allowance: { method: 'handbook' },
    chain: section.make(sizes, SHEET_STARTS.radius.in),
    seat: section.seat,
  });
  const faces = result.ok ? seated(result) : null;
  const outline: Outline | null = faces ? outlineOf(faces) : null;
  return { id: section.id, name: section.name, says: section.says, outline };
});
