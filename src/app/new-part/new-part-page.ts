import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  ElementRef,
  inject,
  linkedSignal,
  signal,
} from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { Router, RouterLink } from '@angular/router';
import type { CreatePart, Part } from '@shared/contracts/parts';
import { sameDocument } from '@shared/part/same-document';
import { STARTING_SECTIONS } from '@shared/part/starting-sections';
import type { Solved } from '@shared/result';
import { firstValueFrom, map, startWith } from 'rxjs';
import { Server } from '../server/server';
import { ServerProblem } from '../server/server-problem';
import { SessionStore } from '../session/session-store';
import { Icon } from '../ui/icon';
import { Notice } from '../ui/notice';
import { ChainField } from './chain-field';
import { DocumentField } from './document-field';
import { draftFrom, type Messages } from './draft-document';
import { KeptDraft } from './kept-draft';
import { LiveSection } from './live-section';
import { partMadeBy, sameNumber } from './made-part';
import { newPartForm } from './new-part-form';
import type { DocumentFile } from './read-document-file';
import { SectionChoice } from './section-choice';
import { SheetFields } from './sheet-fields';
import { TextField } from './text-field';

@Component({
  selector: 'lw-new-part-page',
  imports: [
    ReactiveFormsModule,
    MatButtonModule,
    MatButtonToggleModule,
    RouterLink,
    Icon,
    Notice,
    ChainField,
    DocumentField,
    LiveSection,
    SectionChoice,
    SheetFields,
    TextField,
  ],
  templateUrl: './new-part-page.html',
  styleUrl: './new-part-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NewPartPage {
  private readonly server = inject(Server);
  private readonly router = inject(Router);
  private readonly kept = inject(KeptDraft);
  private readonly page = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  protected readonly session = inject(SessionStore);

  protected readonly form = newPartForm();
  protected readonly file = signal<DocumentFile | null>(null);
  protected readonly busy = signal(false);
  protected readonly trouble = signal<string | null>(null);
  /** The part that an earlier try has made, with something else than what is typed now. */
  protected readonly made = signal<Part | null>(null);
  /** What was sent without an answer. */
  private unanswered: CreatePart | null = null;
  /** From the server, until the field is changed. */
  private readonly refused = signal<Messages>({});

  private readonly values = toSignal(
    this.form.valueChanges.pipe(
      startWith(null),
      map(() => this.form.getRawValue()),
    ),
    { requireSync: true },
  );
  protected readonly way = computed(() => this.values().way);
  protected readonly unit = computed(() => this.values().unit);
  protected readonly section = computed(() => STARTING_SECTIONS.find((entry) => entry.id === this.values().section));
  protected readonly draft = computed(() => {
    const file = this.file();
    return draftFrom(this.values(), file?.ok ? file.document : null);
  });
  protected readonly messages = computed<Messages>(() => ({ ...this.refused(), ...this.draft().messages }));
  protected readonly lastGood = linkedSignal<Solved | null, Solved | null>({
    source: () => this.draft().solved,
    computation: (solved, previous) => solved ?? previous?.value ?? null,
  });

  constructor() {
    this.kept.restoreInto(this.form);
    effect(() => {
      this.values();
      this.refused.set({});
      this.kept.keep(this.form);
    });
  }

  protected async create(): Promise<void> {
    if (this.busy()) return;
    this.form.markAllAsTouched();
    this.trouble.set(null);
    this.made.set(null);
    const { document } = this.draft();
    if (this.form.invalid || document === null) {
      this.trouble.set(this.whyNot());
      setTimeout(() => this.page.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus());
      return;
    }
    this.busy.set(true);
    const { number, title } = this.form.getRawValue();
    try {
      await this.make({ number: number.trim(), title: title.trim(), document });
    } catch (error) {
      this.explain(error);
    } finally {
      this.busy.set(false);
    }
  }

  private async make(wanted: CreatePart): Promise<void> {
    try {
      await this.goTo(await firstValueFrom(this.server.createPart(wanted)));
    } catch (error) {
      if (!(error instanceof ServerProblem)) throw error;
      const tried = sameNumber(this.unanswered, wanted);
      if (error.kind === 'unreachable' || error.status >= 500) this.unanswered = wanted;
      const made = tried && error.is('taken') ? await this.lookUp(wanted) : null;
      if (made === null) throw error;
      if (made.title === wanted.title && sameDocument(made.revision.document, wanted.document)) await this.goTo(made);
      else this.made.set(made);
    }
  }

  /** The number is taken: perhaps by the very try whose answer was lost. */
  private lookUp({ number }: CreatePart): Promise<Part | null> {
    return partMadeBy(this.server, number, this.session.person()?.name);
  }

  private async goTo(part: Part): Promise<void> {
    this.kept.forget();
    await this.router.navigate(['/parts', part.id]);
  }

  private whyNot(): string {
    if (this.way() === 'document' && !this.file()?.ok) return 'Choose a part document first.';
    return 'Some fields need mending first; they are marked.';
  }

  private explain(error: unknown): void {
    if (!(error instanceof ServerProblem)) {
      this.trouble.set('Something went wrong here in the app. What you typed is still here.');
      return;
    }
    if (error.kind === 'unreachable') {
      this.trouble.set(
        "The server can't be reached, so the part may have been made or not. What you typed is still here; try again: " +
          'a part that was made is found then, not made twice.',
      );
      return;
    }
    const fields = error.errors.map(({ path, message }) => [path, message] as const);
    this.refused.set(Object.fromEntries(fields));
    this.form.markAllAsTouched();
    this.trouble.set(fields.length === 0 ? error.message : fields.map(([, message]) => message).join(' '));
  }
}
