import { seated } from '../../shared/formed/seated';
import { arcPoint } from '../../shared/geometry/curve';
import type { FaceElement, Solved, XY } from '../../shared/result';
import { lengthFigure } from './figures';
import { text } from './lettering';
import { TYPE } from './paper-size';
import { BEND_LINE, QUIET } from './pens';
import type { Box, Mark, Point } from './sheet';

/** An arc as chords this short can't be told from it on paper. */
const STEP = 4;

function points(element: FaceElement): readonly XY[] {
  if ('line' in element) return element.line;
  const { from, sweep } = element.arc;
  const steps = Math.max(1, Math.ceil(Math.abs(sweep) / STEP));
  return Array.from({ length: steps + 1 }, (_, index) => arcPoint(element.arc, from + (sweep * index) / steps));
}

/** The outline of the formed section, y up, with its seat leg level; null when there is no section. */
export function formedOutline(result: Solved): XY[] | null {
  const faces = seated(result);
  if (!faces) return null;
  const ring = [...faces.upper.flatMap(points), ...faces.lower.flatMap(points).reverse()];
  return ring.length < 3 ? null : ring;
}

/** A small picture of the formed section, not to a standard scale, with its envelope under it. */
export function drawFormed(result: Solved, box: Box): Mark[] {
  const middle = box.x + box.width / 2;
  const ring = formedOutline(result);
  if (!ring) {
    const words = 'No formed section: see the findings.';
    return [text(words, middle, box.y + box.height / 2, { size: TYPE.body, align: 'centre', shade: QUIET })];
  }
  const xs = ring.map(([x]) => x);
  const ys = ring.map(([, y]) => y);
  const [left, right, low, high] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const words = captionLines(result);
  const room = { width: box.width - 4, height: box.height - words.length * 3.6 - 3 };
  const factor = Math.min(room.width / (right - left), room.height / Math.max(high - low, 1e-9));
  const place = ([x, y]: XY): Point => ({
    x: middle + (x - (left + right) / 2) * factor,
    y: box.y + 1 + room.height / 2 - (y - (low + high) / 2) * factor,
  });
  return [
    { kind: 'shape', points: ring.map(place), pen: BEND_LINE, fill: 0.8 },
    ...words.map((line, index) =>
      text(line, middle, box.y + box.height - 0.8 - (words.length - 1 - index) * 3.6, {
        size: TYPE.small,
        align: 'centre',
      }),
    ),
  ];
}

function captionLines(result: Solved): string[] {
  const envelope = result.formed?.envelope;
  if (!envelope) return ['Envelope: no figure'];
  const { unit } = result;
  const size = `${lengthFigure(envelope.width, unit)} × ${lengthFigure(envelope.height, unit)} ${unit}`;
  return [`Envelope ${size}`, `leg ${envelope.seat + 1} level · not to scale`];
}
