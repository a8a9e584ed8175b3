/** `npm run screenshot`: the picture in the README, taken from the running product. */
import { join } from 'node:path';
import { Part } from '../pages/part';
import { Register } from '../pages/register';
import { SignIn } from '../pages/sign-in';
import { launch, visit } from './browser';
import { openShop } from './shop';

async function main(): Promise<void> {
  const shop = await openShop();
  const browser = await launch();
  try {
    const { page } = await visit(browser, shop.address, {
      viewport: { width: 1440, height: 900 },
      colorScheme: 'light',
      reducedMotion: 'reduce',
    });
    await new SignIn(page).enter('designer');
    await new Register(page).openPart('HC-2103-1');
    const part = new Part(page);
    await part.saved();
    await part.angleOfBend(2).focus();
    await page
      .getByRole('radio', { name: 'sight lines' })
      .or(page.getByRole('button', { name: 'sight lines' }))
      .first()
      .click();
    await part.angleOfBend(2).focus();
    await page.mouse.move(700, 880);
    await page.screenshot({ path: join(__dirname, '..', 'screenshots', 'part-light.png') });
  } finally {
    await browser.close();
    await shop.close();
  }
}

main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
