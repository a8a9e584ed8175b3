import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { Icon, type IconName } from './icon';

export type NoticeLevel = 'stop' | 'caution' | 'note';

/** A boxed message in the page. The glyph and the words carry the level; the colour only repeats it. */
@Component({
  selector: 'lw-notice',
  imports: [Icon],
  template: `
    <lw-icon [name]="icon()" />
    <div class="text"><ng-content /></div>
  `,
  styles: `
    :host {
      display: flex;
      gap: 10px;
      align-items: flex-start;
      padding: 10px 14px;
      border: 1px solid var(--edge);
      border-radius: var(--lw-radius-small);
      background: var(--wash);
      color: var(--lw-ink);
      --edge: var(--lw-line);
      --wash: var(--lw-hair);
      --glyph: var(--lw-ink-2);
    }

    :host(.stop) {
      --edge: color-mix(in srgb, var(--lw-red) 45%, transparent);
      --wash: var(--lw-red-wash);
      --glyph: var(--lw-red);
    }

    :host(.caution) {
      --edge: color-mix(in srgb, var(--lw-amber) 45%, transparent);
      --wash: var(--lw-amber-wash);
      --glyph: var(--lw-amber);
    }

    lw-icon {
      color: var(--glyph);
    }

    .text {
      flex: 1;
      min-width: 0;
      overflow-wrap: anywhere;
    }
  `,
  host: { '[class]': 'level()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Notice {
  readonly level = input<NoticeLevel>('note');
  protected readonly icon = computed<IconName>(() => this.level());
}
