import { readFile } from 'node:fs/promises';
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

  /** Waits until the box for a leg's length says this is wrong with it. */
  async messageAtLeg(number: number, message: RegExp): Promise<void> {
    const row = this.page.locator('[data-row]').filter({ has: this.lengthOfLeg(number) });
    await row.locator('.stop').filter({ hasText: message }).waitFor();
  }

  /** The paper behind the menu "Blank PDF", as the browser puts it away. */
  async paper(size: RegExp): Promise<{ name: string; bytes: Uint8Array }> {
    await this.page.getByRole('button', { name: 'Blank PDF' }).click();
    const [download] = await Promise.all([
      this.page.waitForEvent('download'),
      this.page.getByRole('menuitem', { name: size }).click(),
    ]);
    return { name: download.suggestedFilename(), bytes: new Uint8Array(await readFile(await download.path())) };
  }
}
