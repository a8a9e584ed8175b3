import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

/** Line drawings on a 20 × 20 field, one stroke width, drawn for this app. */
const ICONS = {
  search: 'M8.5 3.5a5 5 0 1 1 0 10 5 5 0 0 1 0-10M12.2 12.2 16.5 16.5',
  plus: 'M10 4v12M4 10h12',
  close: 'M5 5l10 10M15 5 5 15',
  down: 'M5.5 8 10 12.5 14.5 8',
  back: 'M11.5 5 6.5 10l5 5M7 10h9',
  eye: 'M2.5 10S5.5 5 10 5s7.5 5 7.5 5-3 5-7.5 5-7.5-5-7.5-5M10 8a2 2 0 1 1 0 4 2 2 0 0 1 0-4',
  'eye-off': 'M2.5 10S5.5 5 10 5s7.5 5 7.5 5-3 5-7.5 5-7.5-5-7.5-5M3.5 16.5l13-13',
  check: 'M4.5 10.5l3.5 3.5 7.5-8',
  stop: 'M7 3h6l4 4v6l-4 4H7l-4-4V7zM10 6.5v4.5M10 13.2v.6',
  caution: 'M10 3.5 17.5 16.5h-15zM10 8.5v3.5M10 13.8v.6',
  note: 'M10 3a7 7 0 1 1 0 14 7 7 0 0 1 0-14M10 9.5v4.5M10 6.2v.6',
  lost: 'M3 8.5a10 10 0 0 1 14 0M5.7 11.3a6 6 0 0 1 8.6 0M10 14.8v.4M4 17 16 3',
} as const;

export type IconName = keyof typeof ICONS;

@Component({
  selector: 'lw-icon',
  template: `
    <svg viewBox="0 0 20 20" width="100%" height="100%" aria-hidden="true">
      <path [attr.d]="path()" />
    </svg>
  `,
  styles: `
    :host {
      display: inline-block;
      flex: none;
      width: 20px;
      height: 20px;
      vertical-align: middle;
    }

    svg {
      display: block;
    }

    path {
      fill: none;
      stroke: currentcolor;
      stroke-width: 1.6;
      stroke-linecap: round;
      stroke-linejoin: round;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Icon {
  readonly name = input.required<IconName>();
  protected readonly path = computed(() => ICONS[this.name()]);
}
