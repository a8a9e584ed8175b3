import type { BlankPaperInput } from './blank-paper-input';
import type { NoteStyle } from './bend-notes';
import type { Across } from './blank-view';
import { lengthFigure } from './figures';
import type { Shown } from './running-dimensions';

/** What a reader of the drawing has to be told in words, and nothing that doesn't apply. */
export function blankSentences(input: BlankPaperInput, across: Across, shown: Shown, notes: NoteStyle): string[] {
  const { result, document } = input;
  const { unit, blank, holes, bends } = result;
  const said: string[] = [];
  const { start, end } = blank.trim;
  if (start > 0 || end > 0) {
    said.push(
      `Stations are net. Trim: datum end ${lengthFigure(start, unit)}, far end ${lengthFigure(end, unit)}. ` +
        `From the rough edge add ${lengthFigure(start, unit)} to every station.`,
    );
  }
  if (across === 'unknown') said.push('Width not stated: the strip is drawn with a break, not to scale across.');
  if (across === 'broken') said.push('Width drawn with a break, not to scale across.');
  if (across === 'nominal') said.push('Drawn wider than true: not to scale across.');
  if (shown === 'centres') said.push('Stations of the tangent lines: see the line schedule.');
  if (shown === 'ends') said.push('Stations of the lines: see the line schedule.');
  if (bends.length > 0 && notes === 'name') said.push('Face up and angle of each line: see the line schedule.');
  if (bends.length > 0 && notes === 'none') said.push('Names, faces and angles of the lines: see the line schedule.');
  if (holes.length > 0) {
    said.push(
      across === 'true'
        ? 'Holes are measured across from the datum corner, the lower left one, with face A up.'
        : 'Holes are not drawn where the width is not to scale: see the list of holes.',
    );
  }
  if (bends.some(({ turn }) => turn === 'down')) {
    said.push(
      'Face A is up on the first leg. Lines with face B up are bent with the sheet turned over: mark them on face B.',
    );
  }
  if (document.hand === 'opposite') said.push('Opposite hand of the part as typed.');
  said.push(
    bends.length > 0
      ? 'Mark by the stations: lines near each other run together at this scale.'
      : 'Work by the figures: do not scale the drawing.',
  );
  return said;
}
