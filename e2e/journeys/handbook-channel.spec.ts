import { NewPart } from '../pages/new-part';
import { Part } from '../pages/part';
import { Register } from '../pages/register';
import { SignIn } from '../pages/sign-in';
import { visit, type Visit } from '../support/browser';
import { journey } from '../support/journey';
import { readPdf } from '../support/read-pdf';

/**
 * FAA-H-8083-31 ch. 4, the U-channel of the flat layout: 1 × 2 × 1 in, T 0.040, R 0.16. The handbook prints flats 0.80, 1.60,
 * 0.80 and a developed width of 3.74: it reads its allowance table in the 5/32 column (0.273) and rounds that to 0.27. By its
 * rule, at R 0.16, a bend takes 0.279 and the whole is 3.758.
 */
describe('the handbook channel, from the typed chain to the paper', () => {
  let visitor: Visit;
  let part: Part;
  journey(async ({ browser, shop }) => {
    visitor = await visit(browser, shop.address, { viewport: { width: 1440, height: 900 } });
    part = new Part(visitor.page);
  });

  it('begins with the sign-in of a demo shop that says it is one', async () => {
    const signIn = new SignIn(visitor.page);
    await signIn.open();
    expect(await visitor.page.locator('body').innerText()).toContain('This is a demo shop');
    await signIn.as('designer');
    await visitor.page.getByRole('heading', { name: 'Parts' }).waitFor();
    expect(await new Register(visitor.page).rowCount()).toBe(8);
  });

  it('makes a part of 1 up 90 r.16 2 up 90 1 at 0.040', async () => {
    const newPart = new NewPart(visitor.page);
    await newPart.open();
    await newPart.call('HC-3001-1', 'Handbook channel');
    await newPart.typeChain('1 up 90 r.16 2 up 90 1');
    await newPart.setThickness('0.040');
    await newPart.setWidth('6');
    await newPart.make();
    await visitor.page.getByRole('heading', { name: 'HC-3001-1' }).waitFor();
    await part.chainReads('1 up 90 r.16 2 up 90 1');
    expect(visitor.page.url()).toMatch(/parts\/[\w-]+$/);
  });

  it('shows its flats, allowance and blank', async () => {
    await part.figuresShow('3.758');
    const texts = await part.blankTexts();
    expect(texts).toMatch(/0\.800.*1\.600.*0\.800/);
    const stations = await part.stations();
    for (const figure of ['0.279', '0.800', '1.079', '2.679', '2.958']) expect(stations).toContain(figure);
  });

  it('saves an edit made in the ledger, and has it after a reload', async () => {
    await part.lengthOfLeg(2).fill('2 1/4');
    await visitor.page.keyboard.press('Tab');
    await part.figuresShow('4.008');
    await part.saved();
    await visitor.page.reload();
    await part.saved();
    await part.chainReads('1 up 90 r.16 2 1/4 up 90 1');
    expect(await part.lengthOfLeg(2).inputValue()).toBe('2 1/4');
    await part.typeChain('1 up 90 r.16 2 up 90 1');
    await part.figuresShow('3.758');
    await part.saved();
  });

  it('prints the same figures', async () => {
    for (const size of [/A4/, /Letter/]) {
      const { name, bytes } = await part.paper(size);
      expect(name).toBe('HC-3001-1-A-blank.pdf');
      const text = await readPdf(bytes);
      for (const figure of [
        'HC-3001-1',
        '3.758',
        '0.800',
        '1.600',
        '0.279',
        '1.079',
        '2.679',
        '2.958',
        'NOT RELEASED',
      ]) {
        expect(text).toContain(figure);
      }
    }
  });

  it('stands in the register', async () => {
    const register = new Register(visitor.page);
    await register.open();
    await register.search('handbook ch');
    await visitor.page.waitForURL(/search=handbook/);
    expect(await register.row('HC-3001-1')).toContain('3.758');
  });

  it('asked nothing of any other machine and complained of nothing', () => {
    expect(visitor.complaints).toEqual([]);
  });
});
