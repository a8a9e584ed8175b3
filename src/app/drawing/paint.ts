/** Puts a drawing on the paper. The one place that knows svg.js. */
import { SVG } from '@svgdotjs/svg.js';
import type { Drawing, Mark } from './marks';
import { TEXT_SIZE } from './marks';

/** Figures sit on their middle: the baseline lies a third of the size lower. */
const BASELINE = 0.35;

export function paint(host: SVGSVGElement, drawing: Drawing): void {
  const paper = SVG(host);
  paper.clear();
  paper.size(drawing.width, drawing.height).viewbox(0, 0, drawing.width, drawing.height);
  const group = paper.group();
  for (const mark of drawing.marks) {
    const element =
      mark.kind === 'path'
        ? group.path(mark.d)
        : group
            .plain(mark.text)
            .attr({ x: mark.at.x, y: mark.at.y + TEXT_SIZE[mark.role] * BASELINE, 'text-anchor': mark.anchor });
    element.addClass(classOf(mark));
    if (mark.selected) element.addClass('selected');
    if (mark.pick !== undefined) element.attr('data-pick', mark.pick);
  }
}

const classOf = (mark: Mark): string => (mark.kind === 'path' ? `line-${mark.role}` : `text-${mark.role}`);
