import { AxeBuilder } from '@axe-core/playwright';
import { NewPart } from '../pages/new-part';
import { Part } from '../pages/part';
import { SignIn } from '../pages/sign-in';
import { visit } from '../support/browser';
import { journey } from '../support/journey';

const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];
const SCREENS = [
  { name: 'a desk', width: 1440, height: 900 },
  { name: 'a tablet', width: 1024, height: 768 },
  { name: 'a phone', width: 390, height: 844 },
];

describe('a hat from its overall sizes', () => {
  const at = journey();

  it('is made, has the blank that its flats and allowances add up to, and is undone step by step', async () => {
    const { context, page } = await visit(at.browser, at.shop.address);
    await new SignIn(page).enter('designer');
    const newPart = new NewPart(page);
    await newPart.open();
    await newPart.call('HC-3002-1', 'Hat');
    await newPart.chooseSection('Hat');
    await newPart.make();
    await page.getByRole('heading', { name: 'HC-3002-1' }).waitFor();
    const part = new Part(page);
    // Feet 0.55, webs 0.6, crown 1.1 and four allowances of 0.279, by the handbook's rule at R 0.16 and T 0.040.
    await part.figuresShow('4.516');
    await part.angleOfBend(2).fill('80');
    await part.angleOfBend(3).fill('80');
    await page.keyboard.press('Tab');
    await part.saved();
    expect(await part.figures()).not.toContain('4.516');
    await part.undo();
    await part.undo();
    await part.figuresShow('4.516');
    expect(await part.angleOfBend(2).inputValue()).toBe('90');
    await part.saved();
    await context.close();
  });

  for (const colorScheme of ['light', 'dark'] as const) {
    for (const { name, width, height } of SCREENS) {
      it(`reads well on ${name} in the ${colorScheme} theme: nothing inaccessible, nothing off the side`, async () => {
        const { context, page, complaints } = await visit(at.browser, at.shop.address, {
          viewport: { width, height },
          colorScheme,
        });
        const look = async (where: string): Promise<void> => {
          const { violations } = await new AxeBuilder({ page }).withTags(RULES).analyze();
          expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`))
            .withContext(where)
            .toEqual([]);
          const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
          expect(overflow).withContext(`${where} scrolls sideways`).toBeLessThanOrEqual(0);
        };
        const signIn = new SignIn(page);
        await signIn.open();
        await look('sign in');
        await signIn.as('designer');
        await page.getByRole('heading', { name: 'Parts' }).waitFor();
        await page.getByRole('link', { name: 'HC-2108-1' }).first().waitFor();
        await look('register');
        await new NewPart(page).open();
        await look('new part');
        await page.goto('/parts');
        await page.getByRole('link', { name: 'HC-2108-1' }).first().click();
        await new Part(page).saved();
        await look('part with 12 bends');
        expect(complaints).toEqual([]);
        await context.close();
      });
    }
  }
});
