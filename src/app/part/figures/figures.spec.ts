import { of } from 'rxjs';
import { PageUnderTest } from '../page-under-test';
import { channel, part } from '../sample-part';

describe('figures and findings on the part page', () => {
  beforeEach(() => localStorage.clear());
  afterEach(() => localStorage.clear());

  const open = (document = channel): Promise<PageUnderTest> => PageUnderTest.open(of(part(document)));
  const inMillimetres = (page: PageUnderTest): Promise<void> => page.click(page.button('mm'));

  it('give the mass of a small part in figures that say something, in either unit', async () => {
    const page = await open({ ...channel, width: 0.1, chain: [{ leg: 0.5 }] });
    expect(page.textOf('lw-figures-strip')).toMatch(/Mass0\.000\d{3}lb/);
    await inMillimetres(page);
    expect(page.textOf('lw-figures-strip')).toMatch(/Mass0\.0000\d{3}kg/);
  });

  it('say why there is no mass', async () => {
    const { width: _width, ...open1 } = channel;
    expect((await open(open1)).textOf('lw-figures-strip')).toContain('width not stated');
  });

  it('say which unit the findings are in when another is shown', async () => {
    const page = await open({ ...channel, chain: channel.chain.with(2, { leg: 0.2, name: 'Web' }) });
    expect(page.textOf('lw-findings-list')).not.toContain('figures in');
    await inMillimetres(page);
    expect(page.textOf('lw-findings-list')).toContain("Their figures are in inches, the part's own unit.");
  });

  it('say in words that they are not current, and never by fading the words', async () => {
    const page = await open();
    expect(page.textOf('lw-figures-strip')).not.toContain('not current');
    await page.type('Length of leg 2', 'abc');
    for (const place of ['lw-figures-strip', 'lw-stations-table']) {
      expect(page.textOf(place)).withContext(place).toContain('not current');
    }
    for (const text of page.element.querySelectorAll<HTMLElement>('dt, dd, td, th, caption, svg text')) {
      for (let at: Element | null = text; at; at = at.parentElement) expect(getComputedStyle(at).opacity).toBe('1');
    }
  });
});
