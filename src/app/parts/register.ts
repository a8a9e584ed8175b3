import { BreakpointObserver } from '@angular/cdk/layout';
import { ChangeDetectionStrategy, Component, computed, effect, inject, input, untracked } from '@angular/core';
import { takeUntilDestroyed, toSignal } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatProgressBarModule } from '@angular/material/progress-bar';
import { MatSelectModule } from '@angular/material/select';
import { MatTooltipModule } from '@angular/material/tooltip';
import { Router, RouterLink } from '@angular/router';
import { debounceTime, filter, map } from 'rxjs';
import type { PartQuery } from '../server/server';
import { SessionStore } from '../session/session-store';
import { Icon } from '../ui/icon';
import { Notice } from '../ui/notice';
import { PartCards } from './part-cards';
import { PartTable } from './part-table';
import { PartsList } from './parts-list';
import { Reached } from './reached';
import { SORT_ORDERS, SORT_WORDS, sortFrom } from './sort-order';

/** The register of parts. What is searched for, filtered and sorted by stands in the address bar. */
@Component({
  selector: 'lw-register',
  imports: [
    ReactiveFormsModule,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    MatProgressBarModule,
    MatSelectModule,
    MatTooltipModule,
    RouterLink,
    Icon,
    Notice,
    PartCards,
    PartTable,
    Reached,
  ],
  providers: [PartsList],
  templateUrl: './register.html',
  styleUrl: './register.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Register {
  private readonly router = inject(Router);
  protected readonly list = inject(PartsList);
  protected readonly session = inject(SessionStore);

  readonly search = input<string>();
  readonly material = input<string>();
  readonly unit = input<string>();
  readonly sort = input<string>();

  protected readonly order = computed(() => sortFrom(this.sort()));
  protected readonly chosenUnit = computed(() => {
    const unit = this.unit();
    return unit === 'in' || unit === 'mm' ? unit : undefined;
  });
  /** A material from the address bar stays in the list of choices even when no part has it. */
  protected readonly materials = computed(() => {
    const known = this.list.materials();
    const chosen = this.material();
    return chosen && !known.includes(chosen) ? [chosen, ...known] : known;
  });
  protected readonly narrowed = computed(() => Boolean(this.search() || this.material() || this.chosenUnit()));
  protected readonly narrow = toSignal(
    inject(BreakpointObserver)
      .observe('(max-width: 899px)')
      .pipe(map((state) => state.matches)),
    { initialValue: false },
  );
  protected readonly orders = SORT_ORDERS;
  protected readonly orderWords = SORT_WORDS;
  protected readonly skeleton = [1, 2, 3, 4, 5, 6, 7, 8];
  protected readonly box = new FormControl('', { nonNullable: true });

  constructor() {
    effect(() => {
      const query: PartQuery = {
        search: this.search(),
        material: this.material(),
        unit: this.chosenUnit(),
        sort: this.order(),
      };
      untracked(() => this.list.show(query));
    });
    // Back and forward change the box too; what is being typed is never overwritten by its own echo.
    effect(() => {
      const search = this.search() ?? '';
      if (search !== this.box.value.trim()) this.box.setValue(search, { emitEvent: false });
    });
    this.box.valueChanges
      .pipe(
        debounceTime(250),
        map((text) => text.trim()),
        filter((search) => search !== (this.search() ?? '')),
        takeUntilDestroyed(),
      )
      .subscribe((search) => void this.go({ search: search || null }, true));
  }

  /** `null` takes a filter out of the address. */
  protected go(queryParams: Record<string, string | null>, replaceUrl = false): Promise<boolean> {
    return this.router.navigate([], { queryParams, queryParamsHandling: 'merge', replaceUrl });
  }

  protected showAll(): void {
    this.box.setValue('', { emitEvent: false });
    void this.go({ search: null, material: null, unit: null });
  }
}
