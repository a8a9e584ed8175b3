import type { Pen } from './sheet';

/** Line widths in mm: one wide (outlines) and two narrow, every kind of line told by its pattern and not by colour. */
export const OUTLINE: Pen = { width: 0.5, shade: 0 };
export const FRAME: Pen = { width: 0.35, shade: 0 };
export const BEND_LINE: Pen = { width: 0.25, shade: 0 };
export const THIN: Pen = { width: 0.18, shade: 0.25 };
export const TANGENT_LINE: Pen = { width: 0.18, shade: 0.5 };
export const NET_EDGE: Pen = { width: 0.25, shade: 0.2, dash: [4, 1] };
export const CENTRE: Pen = { width: 0.18, shade: 0.2, dash: [4, 0.8, 0.6, 0.8] };
export const SIGHT_DATUM_SIDE: Pen = { width: 0.3, shade: 0, dash: [1.8, 1] };
export const SIGHT_FAR_SIDE: Pen = { width: 0.3, shade: 0, dash: [3.6, 0.8, 0.5, 0.8, 0.5, 0.8] };
export const RULE: Pen = { width: 0.18, shade: 0.65 };

export const INK = 0;
export const QUIET = 0.35;
