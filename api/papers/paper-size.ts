import type { PaperSize } from '../../shared/contracts/papers';
import type { Box } from './sheet';

interface Size {
  readonly name: string;
  /** Landscape, mm. */
  readonly width: number;
  readonly height: number;
}

export const PAPERS: Readonly<Record<PaperSize, Size>> = {
  a4: { name: 'A4', width: 297, height: 210 },
  letter: { name: 'Letter', width: 279.4, height: 215.9 },
};

/** Printers in offices don't reach the edge; nothing is drawn nearer to it than this. */
const MARGIN = 10;

export const frameOf = (size: PaperSize): Box => ({
  x: MARGIN,
  y: MARGIN,
  width: PAPERS[size].width - 2 * MARGIN,
  height: PAPERS[size].height - 2 * MARGIN,
});

/** Sizes of type in mm. Stations have capitals of 2.5 mm, to be read at arm's length. */
export const TYPE = { station: 3.6, heading: 3.4, body: 2.8, small: 2.5, caption: 2.1 } as const;
