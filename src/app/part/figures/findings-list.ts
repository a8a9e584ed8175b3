import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { UNIT_WORDS } from '@shared/part/words';
import { NotCurrent } from '../../ui/not-current';
import { PartEditor } from '../editing/part-editor';
import { gatheredFindings } from './gathered-findings';

/** Paths that have a box of their own on the page; a message about any other is shown here. */
const HAS_A_BOX =
  /^(chain\/\d+\/(leg|bend|radius|joggle|run|measure(\/\d)?)|thickness|width|material|allowance(\/k)?)$/;

/** What is to be said about the part; a click on a place shows it. */
@Component({
  selector: 'lw-findings-list',
  imports: [NotCurrent],
  templateUrl: './findings-list.html',
  styleUrl: './findings-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FindingsList {
  protected readonly editor = inject(PartEditor);

  protected readonly findings = computed(() => {
    const solved = this.editor.drawn();
    return solved ? gatheredFindings(solved) : [];
  });
  /** Sentences come from the engine in the part's own unit; said only where the other one is shown. */
  protected readonly ownUnit = computed(() => {
    const unit = this.editor.drawn()?.unit;
    return unit === undefined || unit === this.editor.shownUnit() ? null : UNIT_WORDS[unit];
  });
  protected readonly elsewhere = computed(() =>
    [...this.editor.messages()].filter(([path]) => !HAS_A_BOX.test(path)).map(([path, message]) => ({ path, message })),
  );
}
