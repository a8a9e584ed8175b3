import { NewPart } from '../pages/new-part';
import { Part } from '../pages/part';
import { Register } from '../pages/register';
import { SignIn } from '../pages/sign-in';
import { visit, type Visit } from '../support/browser';
import { journey } from '../support/journey';

describe('bad input on the part page', () => {
  let visitor: Visit;
  let part: Part;
  const visited = journey(async ({ browser, shop }) => {
    visitor = await visit(browser, shop.address, { viewport: { width: 1440, height: 900 } });
    part = new Part(visitor.page);
    await new SignIn(visitor.page).enter('designer');
    await new Register(visitor.page).openPart('HC-2103-1');
    await part.saved();
  });

  const wrong: readonly (readonly [string, RegExp])[] = [
    ['abc', /"abc" is not a figure/],
    ['0', /must be above 0/],
    ['-1', /must be above 0/],
    ['1e9', /can't be above/],
    ['2-3/16', /can be read two ways/],
  ];
  for (const [typed, message] of wrong) {
    it(`says at the field what is wrong with a leg of ${typed}, and keeps it`, async () => {
      await part.lengthOfLeg(1).fill(typed);
      await part.messageAtLeg(1, message);
      expect(await part.lengthOfLeg(1).inputValue()).toBe(typed);
      expect(await part.lengthOfLeg(1).getAttribute('aria-invalid')).toBe('true');
      await part.lengthOfLeg(1).fill('0.75');
      await part.saved();
    });
  }

  it('says which leg the bends consume, and what would mend it', async () => {
    await part.lengthOfLeg(1).fill('0.1');
    await visitor.page.getByRole('list', { name: 'Findings' }).filter({ hasText: 'no flat is left' }).waitFor();
    expect(await part.findings()).toContain('Make it longer than');
    await part.lengthOfLeg(1).fill('0.75');
    await part.saved();
  });

  it('points at the word that breaks a typed chain, and refuses an empty one', async () => {
    const before = await part.chain().inputValue();
    await part.typeChain('1 up 90 r.16 2 sideways 90 1');
    await visitor.page.getByText('"sideways" is no word of a chain').waitFor();
    await part.typeChain('');
    await visitor.page.getByText('Type a chain').waitFor();
    await visitor.page.getByRole('button', { name: 'Back to the chain as it stands' }).click();
    await part.chainReads(before);
    expect(before).toContain('up 90');
  });

  it('keeps the work when the server is lost, and saves it when it answers again', async () => {
    await visited.shop.stop();
    await part.lengthOfLeg(3).fill('1 3/8');
    await visitor.page.getByText('Your work is kept in this browser').waitFor();
    expect(await part.saving()).not.toMatch(/^saved/);
    expect(await part.lengthOfLeg(3).inputValue()).toBe('1 3/8');
    await visited.shop.restart();
    await part.saved();
    await visitor.page.reload();
    await part.saved();
    expect(await part.lengthOfLeg(3).inputValue()).toBe('1 3/8');
  });

  it('says at their fields what a new part lacks', async () => {
    const newPart = new NewPart(visitor.page);
    await newPart.open();
    await newPart.make();
    expect(await newPart.messages()).toContain('Give the part a number');
    await newPart.call('HC-2103-1', 'Taken');
    await newPart.make();
    await visitor.page
      .getByText(/is taken|has that number|already/)
      .first()
      .waitFor();
    expect(await visitor.page.getByRole('textbox', { name: 'Title' }).inputValue()).toBe('Taken');
  });
});

describe('somebody without the role', () => {
  let visitor: Visit;
  journey(async ({ browser, shop }) => {
    visitor = await visit(browser, shop.address);
  });

  it('is told that the password is wrong, and keeps the address typed', async () => {
    const signIn = new SignIn(visitor.page);
    await signIn.open();
    await signIn.as('technician', 'not-the-password');
    await visitor.page
      .locator('.trouble')
      .filter({ hasText: /password/ })
      .waitFor();
    expect(await visitor.page.getByLabel('E-mail address').inputValue()).toBe('technician@harrowcreek.example');
  });

  it('reads a part but is not offered to change it', async () => {
    await new SignIn(visitor.page).enter('technician');
    await new Register(visitor.page).openPart('HC-2102-1');
    const part = new Part(visitor.page);
    expect(await part.saving()).toContain('read only');
    expect(await part.lengthOfLeg(1).getAttribute('readonly')).not.toBeNull();
    expect(await visitor.page.getByRole('button', { name: 'Undo' }).count()).toBe(0);
    await new NewPart(visitor.page).open();
    expect(await visitor.page.locator('body').innerText()).toContain('Only designers make new parts');
  });
});
