import type { Locator, Page } from 'playwright-core';

/** The part page: ledger, typed chain, decks, figures. */
export class Part {
  constructor(private readonly page: Page) {}

  /** Waits until the page says that the draft is saved. */
  async saved(): Promise<void> {
    await this.page
      .locator('.saving')
      .filter({ hasText: /^saved/ })
      .waitFor();
  }

  saving(): Promise<string> {
    return this.page.locator('.saving').innerText();
  }

  lengthOfLeg(number: number): Locator {
    return this.page.getByLabel(`Length of leg ${number}`, { exact: true });
  }

  angleOfBend(number: number): Locator {
    return this.page.getByLabel(`Angle of bend L${number} in degrees from flat`);
  }

  async typeChain(chain: string): Promise<void> {
    await this.chain().fill(chain);
    await this.page.keyboard.press('Enter');
  }

  chain(): Locator {
    return this.page.getByRole('textbox', { name: 'Typed chain' });
  }

  /** Waits until the typed chain shows this. */
  async chainReads(chain: string): Promise<void> {
    const box = await this.chain().elementHandle();
    await this.page.waitForFunction(([area, text]) => (area as HTMLTextAreaElement).value === text, [
      box,
      chain,
    ] as const);
  }

  /** The strip of figures, as a person reads it. */
  async figures(): Promise<string> {
    return (await this.page.locator('lw-figures-strip').innerText()).replace(/\s+/g, ' ');
  }

  /** Waits until the strip shows a figure. */
  async figuresShow(figure: string): Promise<void> {
    await this.page.locator('lw-figures-strip').filter({ hasText: figure }).waitFor();
  }

  async stations(): Promise<string> {
    return (await this.page.getByRole('region', { name: 'Table of stations' }).innerText()).replace(/\s+/g, ' ');
  }

  /** What the blank deck says in writing: legs with their flats, lines with their stations. */
  async blankTexts(): Promise<string> {
    return (await this.page.locator('lw-blank-deck svg text').allTextContents()).join(' | ');
  }

  async findings(): Promise<string> {
    return (await this.page.getByRole('list', { name: 'Findings' }).innerText()).replace(/\s+/g, ' ');
  }

  async undo(): Promise<void> {
    await this.page.getByRole('button', { name: 'Undo' }).click();
  }

  alerts(): Promise<string[]> {
    return this.page.getByRole('alert').allInnerTexts();
  }

  /** Address of the paper behind the menu "Blank PDF". */
  async paperAddress(size: RegExp): Promise<string> {
    await this.page.getByRole('button', { name: 'Blank PDF' }).click();
    const item = this.page.getByRole('menuitem', { name: size });
    await item.waitFor();
    const address = await item.getAttribute('href');
    await this.page.keyboard.press('Escape');
    return address ?? '';
  }
}
