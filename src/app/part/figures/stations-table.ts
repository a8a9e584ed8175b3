import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { angleWords, faceUp, lineName, UNIT_WORDS } from '@shared/part/words';
import { missText, nearest64Of } from '@shared/units/format';
import { NotCurrent } from '../../ui/not-current';
import { PartEditor } from '../editing/part-editor';

interface Station {
  readonly figure: string;
  readonly sixtyfourth: string;
  readonly miss: string;
}

const COLUMNS = [
  'Tangent, datum side',
  'Centre',
  'Tangent, far side',
  'Sight line, datum side under the nose',
  'Sight line, far side under the nose',
] as const;

/** Every station of every bend in figures: decimal, and the nearest 1/64 in with what it misses by. */
@Component({
  selector: 'lw-stations-table',
  imports: [NotCurrent],
  templateUrl: './stations-table.html',
  styleUrl: './stations-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationsTable {
  protected readonly editor = inject(PartEditor);
  protected readonly columns = COLUMNS;
  protected readonly unitWords = UNIT_WORDS;

  protected readonly rows = computed(() => {
    const solved = this.editor.drawn();
    if (!solved) return [];
    const figure = this.editor.figureOf();
    const station = (value: number | null | undefined): Station | null => {
      if (value === null || value === undefined) return null;
      const { text, error } = nearest64Of(value, solved.unit);
      return { figure: figure(value), sixtyfourth: text, miss: missText(error) };
    };
    return solved.bends.map((bend, index) => ({
      chain: bend.chain,
      name: lineName(index),
      note: `${faceUp(bend)} · ${angleWords(bend.angle)}`,
      allowance: figure(bend.allowance),
      stations: [
        station(bend.tangentStart),
        station(bend.centre),
        station(bend.tangentEnd),
        station(bend.sightLine?.startUnderNose),
        station(bend.sightLine?.endUnderNose),
      ],
    }));
  });
}
