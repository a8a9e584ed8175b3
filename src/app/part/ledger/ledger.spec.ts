import { of } from 'rxjs';
import { PageUnderTest } from '../page-under-test';
import { part } from '../sample-part';

describe('the ledger', () => {
  let page: PageUnderTest;

  beforeEach(async () => {
    localStorage.clear();
    page = await PageUnderTest.open(of(part()));
  });
  afterEach(() => localStorage.clear());

  const focus = async (label: string): Promise<void> => {
    page.labelled(label).focus();
    await page.settled();
  };
  const angle = 'Angle of bend L1 in degrees from flat';

  it('goes down by Enter and along a column by the arrows', async () => {
    await focus('Length of leg 1');
    await page.press('Enter');
    expect(page.focused()).toBe(angle);
    await page.press('ArrowDown');
    expect(page.focused()).toBe('Length of leg 2');
    await page.press('Enter', { shiftKey: true });
    expect(page.focused()).toBe(angle);
    await page.press('ArrowUp');
    expect(page.focused()).toBe('Length of leg 1');
    await page.press('ArrowUp');
    expect(page.focused()).toBe('Length of leg 1');
  });

  it('leaves Tab alone, so that it reaches everything a row has', async () => {
    await focus('Inside radius of bend L1');
    expect((await page.press('Tab')).defaultPrevented).toBeFalse();
    await focus('Length of leg 2');
    expect((await page.press('Tab')).defaultPrevented).toBeFalse();
    expect(page.row(2).querySelectorAll('select').length).toBe(3);
  });

  it('goes on in the new leg, whether it was added by button or by key', async () => {
    await page.click(page.button('Add a leg at the end'));
    expect(page.focused()).toBe('Length of leg 4');
    await focus('Length of leg 1');
    await page.press('Enter', { altKey: true });
    expect(page.focused()).toBe('Length of leg 5');
    await page.press('Enter', { altKey: true, shiftKey: true });
    expect(page.focused()).toBe('Length of leg 1');
    expect(page.labelled('Length of leg 1').closest('.row')?.classList).toContain('selected');
  });

  it('goes on in the joined leg after a bend was taken out', async () => {
    await page.click(page.row(3));
    await page.click(page.button('Take out, join legs'));
    expect(page.focused()).toBe('Length of leg 2');
    expect(page.labelled('Length of leg 2').value).toBe('3');
    expect(page.row(2).classList).toContain('selected');
  });

  it('takes no bend out by key while a box holds text, and goes on in the joined leg when it does', async () => {
    await focus(angle);
    await page.type('Name of bend L1', 'Heel');
    await page.press('Backspace', { altKey: true });
    expect(page.labelled('Name of bend L1').value).toBe('Heel');
    expect(page.focused()).toBe('Name of bend L1');
    await focus('Turn of bend L1');
    await page.press('Backspace', { altKey: true });
    expect(page.focused()).toBe('Length of leg 1');
    expect(page.labelled('Length of leg 1').value).toBe('3');
  });

  it('gives a figure back as it was by Escape, all of it selected for the next to take its place', async () => {
    await page.type('Length of leg 2', '0.5');
    await page.press('Escape');
    const box = page.labelled('Length of leg 2');
    expect([box.value, box.selectionStart, box.selectionEnd]).toEqual(['2', 0, 1]);
    expect(page.focused()).toBe('Length of leg 2');
  });

  it('gives a name back as it was by Escape, and keeps its box and the focus', async () => {
    await focus(angle);
    await page.type('Name of bend L1', 'Heel');
    await page.press('Escape');
    expect(page.labelled('Name of bend L1').value).toBe('');
    expect(page.focused()).toBe('Name of bend L1');
    await page.type('Name of leg 1', 'Foot');
    await page.press('Escape');
    expect(page.labelled('Name of leg 1').value).toBe('Left flange');
    expect(page.focused()).toBe('Name of leg 1');
  });

  it('never drops the focus with what had it', async () => {
    await focus(angle);
    page.button('Take out, join legs').focus();
    await page.press('Escape');
    expect(page.focused()).toBe(angle);
    await page.click(page.button('Add a leg at the end'));
    await page.press('z', { ctrlKey: true });
    expect(page.element.querySelectorAll('[data-row]').length).toBe(5);
    expect(page.focused()).toBe('Length of leg 3');
  });

  it('takes a comma for the point of a plain figure and says what it understood', async () => {
    await page.type('Length of leg 2', '2,25');
    expect(page.labelled('Length of leg 2').value).toBe('2,25');
    expect(page.textOf('lw-leg-row .understood')).toBe('= 2.25');
    expect(page.textOf('lw-figures-strip')).toContain('4.008');
    page.labelled('Length of leg 2').blur();
    await page.settled();
    expect(page.labelled('Length of leg 2').value).toBe('2.25');
    await page.type('Length of leg 2', '1,5 + 1');
    expect(page.textOf('[data-row="2"] .stop')).toContain('Use a point for decimals');
  });
});
