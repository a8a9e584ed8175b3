import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatSortModule, type Sort } from '@angular/material/sort';
import { MatTableModule } from '@angular/material/table';
import { RouterLink } from '@angular/router';
import type { PartRow } from '@shared/contracts/parts';
import { SectionDrawing } from '../ui/section-drawing';
import { StateChip } from '../ui/state-chip';
import { momentWords, sinceWords } from '../ui/when';
import { blankWords, thicknessWords } from './part-sizes';
import { sortFrom, type SortOrder } from './sort-order';
import { Stops } from './stops';

@Component({
  selector: 'lw-part-table',
  imports: [MatSortModule, MatTableModule, RouterLink, SectionDrawing, StateChip, Stops],
  templateUrl: './part-table.html',
  styleUrl: './part-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PartTable {
  readonly rows = input.required<readonly PartRow[]>();
  readonly order = input.required<SortOrder>();
  readonly sorted = output<SortOrder>();

  protected readonly columns = ['section', 'number', 'title', 'revision', 'blank', 'material', 'changed'];
  protected readonly active = computed(() => this.order().replace('-', ''));
  protected readonly direction = computed(() => (this.order().startsWith('-') ? 'desc' : 'asc'));

  protected readonly blank = blankWords;
  protected readonly thickness = thicknessWords;
  protected readonly since = sinceWords;
  protected readonly moment = momentWords;
  protected readonly byId = (_index: number, row: PartRow): string => row.id;

  protected sort({ active, direction }: Sort): void {
    this.sorted.emit(sortFrom(direction === 'desc' ? `-${active}` : active));
  }
}
