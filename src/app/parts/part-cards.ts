import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { PartRow } from '@shared/contracts/parts';
import { SectionDrawing } from '../ui/section-drawing';
import { StateChip } from '../ui/state-chip';
import { momentWords, sinceWords } from '../ui/when';
import { blankWords, thicknessWords } from './part-sizes';
import { Stops } from './stops';

/** The register on a phone: the same facts as the table, one under the other. */
@Component({
  selector: 'lw-part-cards',
  imports: [RouterLink, SectionDrawing, StateChip, Stops],
  templateUrl: './part-cards.html',
  styleUrl: './part-cards.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PartCards {
  readonly rows = input.required<readonly PartRow[]>();

  protected readonly blank = blankWords;
  protected readonly thickness = thicknessWords;
  protected readonly since = sinceWords;
  protected readonly moment = momentWords;
}
