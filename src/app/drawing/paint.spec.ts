import type { Drawing, Mark, TextMark } from './marks';
import { NO_OVERLAY } from './marks';
import { Paper } from './paint';

const path = (d: string, pick?: number): Mark => ({
  kind: 'path',
  role: 'edge',
  d,
  ...(pick === undefined ? {} : { pick }),
});
const text = (words: string, pick: number): TextMark => ({
  kind: 'text',
  role: 'name',
  text: words,
  at: { x: 10, y: 20 },
  anchor: 'middle',
  pick,
});
const drawing = (...marks: Mark[]): Drawing => ({ width: 100, height: 50, marks });

describe('the paper of a drawing', () => {
  let host: SVGSVGElement;
  let paper: Paper;
  const all = (selector: string): SVGElement[] => [...host.querySelectorAll<SVGElement>(selector)];

  beforeEach(() => {
    host = document.createElementNS('http://www.w3.org/2000/svg', 'svg');
    paper = new Paper(host);
  });

  it('shows texts over paths, each with its class and the entry it belongs to', () => {
    paper.draw(drawing(text('L1', 1), path('M0 0H5'), path('M0 5H5', 3)));
    expect(all('path, text').map((node) => node.tagName)).toEqual(['path', 'path', 'text']);
    expect(all('path').map((node) => node.getAttribute('data-pick'))).toEqual([null, '3']);
    expect(all('text')[0]!.getAttribute('class')).toBe('text-name');
    expect(host.getAttribute('viewBox')).toBe('0 0 100 50');
  });

  it('keeps the elements that stand and changes what has changed', () => {
    paper.draw(drawing(path('M0 0H5', 1), path('M0 5H5', 1), text('0.800', 1)));
    const [first, second] = all('path');
    const [figure] = all('text');
    paper.draw(drawing(path('M0 0H5'), text('0.900', 3)));
    expect(all('path')).toEqual([first!]);
    expect(first!.hasAttribute('data-pick')).toBeFalse();
    expect(second!.isConnected).toBeFalse();
    expect(all('text')).toEqual([figure!]);
    expect(figure!.textContent).toBe('0.900');
    expect(figure!.getAttribute('data-pick')).toBe('3');
  });

  it('marks what belongs to the selected entry without touching the rest', () => {
    paper.draw(drawing(path('M0 0H5', 1), path('M0 5H5', 3), text('L1', 1)));
    const before = all('path, text');
    paper.select(1, NO_OVERLAY);
    expect(all('.selected').map((node) => node.tagName)).toEqual(['path', 'text']);
    paper.select(3, NO_OVERLAY);
    expect(all('.selected').map((node) => node.getAttribute('data-pick'))).toEqual(['3']);
    paper.select(null, NO_OVERLAY);
    expect(all('.selected')).toEqual([]);
    expect(all('path, text')).toEqual(before);
  });

  it('lays a note over the drawing, hides what gives way to it, and takes both back', () => {
    const name = text('L1', 1);
    paper.draw(drawing(path('M0 0H5', 1), name));
    paper.select(1, { marks: [text('L1 · face A up', 1)], hides: [name] });
    expect(all('.hidden').map((node) => node.textContent)).toEqual(['L1']);
    expect(all('text.selected').map((node) => node.textContent)).toEqual(['L1', 'L1 · face A up']);
    paper.select(null, NO_OVERLAY);
    expect(all('.hidden')).toEqual([]);
    expect(all('text').map((node) => node.textContent)).toEqual(['L1']);
  });

  it('begins with nothing marked after a new drawing', () => {
    paper.draw(drawing(path('M0 0H5', 1)));
    paper.select(1, NO_OVERLAY);
    paper.draw(drawing(path('M0 0H6', 1)));
    expect(all('.selected')).toEqual([]);
    paper.select(1, NO_OVERLAY);
    expect(all('.selected').length).toBe(1);
  });
});
