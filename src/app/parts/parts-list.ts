import { computed, effect, inject, Injectable, signal, untracked } from '@angular/core';
import { takeUntilDestroyed, toObservable } from '@angular/core/rxjs-interop';
import type { PartList, PartRow } from '@shared/contracts/parts';
import { catchError, map, type Observable, of, startWith, Subject, switchMap, takeUntil } from 'rxjs';
import { Reachability } from '../server/reachability';
import { type PartQuery, Server } from '../server/server';
import { ServerProblem } from '../server/server-problem';

type Answer =
  | { readonly is: 'loading' }
  | { readonly is: 'ready'; readonly list: PartList }
  | { readonly is: 'failed'; readonly message: string };

interface Asked {
  readonly query: PartQuery;
  /** Rises with every "try again". */
  readonly attempt: number;
}

/** The rows of the register for one query, page after page. A new query drops whatever the old one still waits for. */
@Injectable()
export class PartsList {
  private readonly server = inject(Server);
  private readonly reachability = inject(Reachability);
  private readonly asked = signal<Asked | null>(null);
  private readonly dropped = new Subject<void>();
  private readonly next = signal<string | null>(null);

  readonly rows = signal<readonly PartRow[]>([]);
  readonly total = signal<number | null>(null);
  readonly materials = signal<readonly string[]>([]);
  readonly status = signal<Answer['is']>('loading');
  readonly trouble = signal<string | null>(null);
  readonly moreStatus = signal<'idle' | 'loading' | 'failed'>('idle');
  readonly hasMore = computed(() => this.next() !== null);

  constructor() {
    toObservable(this.asked)
      .pipe(
        switchMap((asked) => (asked === null ? of({ is: 'loading' } as const) : this.answer(asked.query))),
        takeUntilDestroyed(),
      )
      .subscribe((answer) => this.take(answer));
    effect(() => {
      if (!this.reachability.reachable()) return;
      untracked(() => {
        if (this.status() === 'failed') this.again();
      });
    });
  }

  show(query: PartQuery): void {
    this.dropped.next();
    // The place where the old list ended means nothing in the new one.
    this.next.set(null);
    this.asked.update((asked) => ({ query, attempt: asked?.attempt ?? 0 }));
  }

  again(): void {
    this.asked.update((asked) => asked && { ...asked, attempt: asked.attempt + 1 });
  }

  more(): void {
    const after = this.next();
    const query = this.asked()?.query;
    if (after === null || query === undefined || this.moreStatus() === 'loading') return;
    this.moreStatus.set('loading');
    this.server
      .parts({ ...query, after })
      .pipe(takeUntil(this.dropped))
      .subscribe({
        next: (list) => {
          this.rows.update((rows) => [...rows, ...list.parts]);
          this.next.set(list.next);
          this.total.set(list.total);
          this.moreStatus.set('idle');
        },
        error: () => this.moreStatus.set('failed'),
      });
  }

  private answer(query: PartQuery): Observable<Answer> {
    return this.server.parts(query).pipe(
      map((list): Answer => ({ is: 'ready', list })),
      catchError((error: unknown) =>
        of<Answer>({
          is: 'failed',
          message: error instanceof ServerProblem ? error.message : 'The list could not be read.',
        }),
      ),
      startWith<Answer>({ is: 'loading' }),
    );
  }

  private take(answer: Answer): void {
    this.status.set(answer.is);
    this.trouble.set(answer.is === 'failed' ? answer.message : null);
    this.moreStatus.set('idle');
    if (answer.is !== 'ready') return;
    this.rows.set(answer.list.parts);
    this.next.set(answer.list.next);
    this.total.set(answer.list.total);
    this.materials.set(answer.list.materials);
  }
}
