import type { Page } from 'playwright-core';

/** The register of parts. */
export class Register {
  constructor(private readonly page: Page) {}

  async open(): Promise<void> {
    await this.page.goto('/parts');
    await this.page.getByRole('heading', { name: 'Parts' }).waitFor();
  }

  async search(words: string): Promise<void> {
    await this.page
      .getByRole('searchbox')
      .or(this.page.getByLabel(/Search/))
      .first()
      .fill(words);
  }

  async openPart(number: string): Promise<void> {
    await this.page.getByRole('link', { name: number }).first().click();
    await this.page.getByRole('heading', { name: number }).waitFor();
  }

  /** Text of the row that shows a part. */
  row(number: string): Promise<string> {
    return this.page.getByRole('row').filter({ hasText: number }).innerText();
  }

  async rowCount(): Promise<number> {
    return this.page
      .getByRole('row')
      .filter({ has: this.page.getByRole('link') })
      .count();
  }
}
