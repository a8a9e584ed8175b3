import { of } from 'rxjs';
import { PageUnderTest } from '../page-under-test';
import { part } from '../sample-part';

describe('the typed chain', () => {
  it('keeps the focus when it goes back to the chain as it stands', async () => {
    localStorage.clear();
    const page = await PageUnderTest.open(of(part()));
    await page.type('Typed chain', '1 upp 90 r.16 3');
    expect(page.element.querySelector('lw-typed-chain-box [aria-live]')).toBeNull();
    await page.click(page.button('Back to the chain as it stands'));
    expect(page.focused()).toBe('Typed chain');
    expect(page.labelled('Typed chain').value).toBe('1 up 90 r0.16 2 up 90 1');
  });
});
