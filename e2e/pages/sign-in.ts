import type { Page } from 'playwright-core';

const PASSWORD = 'harrow-creek-demo';

/** The sign-in page, as somebody at the keyboard uses it. */
export class SignIn {
  constructor(private readonly page: Page) {}

  async open(path = '/'): Promise<void> {
    await this.page.goto(path);
    await this.page.getByRole('heading', { name: 'Sign in' }).waitFor();
  }

  async as(who: 'designer' | 'technician' | 'supervisor' | 'administrator', password = PASSWORD): Promise<void> {
    await this.page.getByLabel('E-mail address').fill(`${who}@harrowcreek.example`);
    await this.page.getByRole('textbox', { name: 'Password' }).fill(password);
    await this.page.keyboard.press('Enter');
  }

  /** Signs in and waits for the register. */
  async enter(who: 'designer' | 'technician' | 'supervisor' | 'administrator'): Promise<void> {
    await this.open();
    await this.as(who);
    await this.page.getByRole('heading', { name: 'Parts' }).waitFor();
  }

  /** What the page says went wrong. */
  trouble(): Promise<string> {
    return this.page.locator('.trouble').innerText();
  }
}
