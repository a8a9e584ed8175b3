import { ChangeDetectionStrategy, Component } from '@angular/core';
@Component({ selector: 'lw-new-part-page', template: '', changeDetection: ChangeDetectionStrategy.OnPush })
export class NewPartPage {}
