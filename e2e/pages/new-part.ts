import type { Page } from 'playwright-core';

/** The page that begins a part. */
export class NewPart {
  constructor(private readonly page: Page) {}

  async open(): Promise<void> {
    await this.page.goto('/parts/new');
    await this.page.getByRole('heading', { name: 'New part' }).waitFor();
  }

  async call(number: string, title: string): Promise<void> {
    await this.page.getByRole('textbox', { name: 'Part number' }).fill(number);
    await this.page.getByRole('textbox', { name: 'Title' }).fill(title);
  }

  async typeChain(chain: string): Promise<void> {
    await this.page.getByRole('radio', { name: 'Typed chain' }).click();
    await this.page.getByRole('textbox', { name: 'Typed chain' }).fill(chain);
  }

  async chooseSection(name: string): Promise<void> {
    await this.page.getByRole('radio', { name: 'Section', exact: true }).click();
    // The pictures are labels over hidden radio buttons: a person clicks the picture.
    await this.page.getByText(name, { exact: true }).click();
  }

  async setThickness(thickness: string): Promise<void> {
    await this.page.getByLabel('Thickness').fill(thickness);
  }

  async setWidth(width: string): Promise<void> {
    await this.page.getByLabel(/^Width/).fill(width);
  }

  async make(): Promise<void> {
    await this.page.getByRole('button', { name: 'Make the part' }).click();
  }

  /** Everything that the page says is wrong, at fields and as a whole. */
  async messages(): Promise<string> {
    const all = await this.page.locator('mat-error, .trouble, lw-notice').allInnerTexts();
    return all.join('\n');
  }
}
