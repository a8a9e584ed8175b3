import { ChangeDetectionStrategy, Component, input } from '@angular/core';

@Component({ selector: 'lw-part-page', template: '', changeDetection: ChangeDetectionStrategy.OnPush })
export class PartPage {
  readonly id = input.required<string>();
}
