/** Puts a drawing on the paper. The one place that knows svg.js. */
import { type G, SVG, type Svg } from '@svgdotjs/svg.js';
import type { Drawing, Mark, Overlay, PathMark, TextMark } from './marks';
import { TEXT_SIZE } from './marks';

/** Figures sit on their middle: the baseline lies a third of the size lower. */
const BASELINE = 0.35;

interface Drawn<M extends Mark = Mark> {
  readonly node: SVGElement;
  mark: M;
}

/** Marks of one kind in a group of their own; an element that stands is given what has changed, not made anew. */
class Layer<M extends Mark> {
  readonly drawn: Drawn<M>[] = [];

  constructor(
    private readonly make: (mark: M) => SVGElement,
    private readonly change: (node: SVGElement, from: M, to: M) => void,
  ) {}

  draw(marks: readonly M[]): void {
    for (const left of this.drawn.splice(marks.length)) left.node.remove();
    marks.forEach((mark, index) => {
      const former = this.drawn[index];
      if (former) {
        this.change(former.node, former.mark, mark);
        if (former.mark.pick !== mark.pick) pickOf(former.node, mark);
        former.mark = mark;
      } else {
        const node = this.make(mark);
        pickOf(node, mark);
        this.drawn.push({ node, mark });
      }
      const node = this.drawn[index]?.node;
      // Selected and hidden are told anew after every drawing.
      if (node && node.getAttribute('class') !== classOf(mark)) node.setAttribute('class', classOf(mark));
    });
  }
}

/** A sheet with paths below and texts above, and over both what belongs to the selected entry. */
export class Paper {
  private readonly svg: Svg;
  private readonly base: Layers;
  private readonly over: Layers;
  private marked: SVGElement[] = [];
  private hidden: SVGElement[] = [];

  constructor(host: SVGSVGElement) {
    this.svg = SVG(host) as Svg;
    this.base = new Layers(this.svg);
    this.over = new Layers(this.svg);
  }

  draw(drawing: Drawing): void {
    this.svg.size(drawing.width, drawing.height).viewbox(0, 0, drawing.width, drawing.height);
    this.base.draw(drawing.marks);
    this.marked = [];
    this.hidden = [];
  }

  /** Marks everything that belongs to one entry of the chain, and lays over it what is said of it. */
  select(pick: number | null, overlay: Overlay): void {
    this.over.draw(overlay.marks);
    for (const node of this.marked) node.classList.remove('selected');
    for (const node of this.hidden) node.classList.remove('hidden');
    const all = [...this.base.all(), ...this.over.all()];
    this.marked = pick === null ? [] : all.filter(({ mark }) => mark.pick === pick).map(({ node }) => node);
    const hides = new Set(overlay.hides);
    this.hidden = hides.size === 0 ? [] : all.filter(({ mark }) => hides.has(mark)).map(({ node }) => node);
    for (const node of this.marked) node.classList.add('selected');
    for (const node of this.hidden) node.classList.add('hidden');
  }
}

class Layers {
  private readonly paths: Layer<PathMark>;
  private readonly texts: Layer<TextMark>;

  constructor(svg: Svg) {
    this.paths = pathLayer(svg.group());
    this.texts = textLayer(svg.group());
  }

  draw(marks: readonly Mark[]): void {
    this.paths.draw(marks.filter((mark) => mark.kind === 'path'));
    this.texts.draw(marks.filter((mark) => mark.kind === 'text'));
  }

  all(): readonly Drawn[] {
    return [...this.paths.drawn, ...this.texts.drawn];
  }
}

const pathLayer = (group: G): Layer<PathMark> =>
  new Layer(
    (mark) => group.path(mark.d).node,
    (node, from, to) => {
      if (from.d !== to.d) node.setAttribute('d', to.d);
    },
  );

const textLayer = (group: G): Layer<TextMark> =>
  new Layer(
    (mark) => group.plain(mark.text).attr(placeOf(mark)).node,
    (node, from, to) => {
      if (from.text !== to.text) node.textContent = to.text;
      const former: Record<string, unknown> = placeOf(from);
      for (const [name, value] of Object.entries(placeOf(to))) {
        if (former[name] !== value) node.setAttribute(name, String(value));
      }
    },
  );

const placeOf = ({ at, role, anchor }: TextMark) => ({
  x: at.x,
  y: at.y + TEXT_SIZE[role] * BASELINE,
  'text-anchor': anchor,
});

function pickOf(node: SVGElement, { pick }: Mark): void {
  if (pick === undefined) node.removeAttribute('data-pick');
  else node.setAttribute('data-pick', String(pick));
}

const classOf = (mark: Mark): string => (mark.kind === 'path' ? `line-${mark.role}` : `text-${mark.role}`);
