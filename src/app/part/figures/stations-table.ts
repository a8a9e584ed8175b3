import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { formatAngle, nearest64Of } from '@shared/units/format';
import { PartEditor } from '../editing/part-editor';
import { bendName, faceUp, UNIT_WORDS } from '../words';

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
      const thousandths = Math.abs(error).toFixed(4);
      const sign = Number(thousandths) === 0 ? '' : error < 0 ? '−' : '+';
      return { figure: figure(value), sixtyfourth: text, miss: `${sign}${thousandths}` };
    };
    return solved.bends.map((bend, index) => ({
      chain: bend.chain,
      name: bendName(index),
      note: `${faceUp(bend)} · ${formatAngle(bend.angle)}`,
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
