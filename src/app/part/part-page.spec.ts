import { HttpErrorResponse, HttpHeaders } from '@angular/common/http';
import { PROBLEM } from '@shared/contracts/problem';
import { type Observable, of, throwError } from 'rxjs';
import { ServerProblem } from '../server/server-problem';
import { PageUnderTest } from './page-under-test';
import { channel, part } from './sample-part';

describe('the part page', () => {
  const refusal = (status: number, type: string): Observable<never> =>
    throwError(() =>
      ServerProblem.of(
        new HttpErrorResponse({ status, headers: new HttpHeaders(), error: { type, title: 'No such thing.', status } }),
      ),
    );

  beforeEach(() => localStorage.clear());
  afterEach(() => localStorage.clear());

  it('shows which part it is, its figures and its bends in words', async () => {
    const page = await PageUnderTest.open(of(part()));
    expect(page.textOf('h1')).toBe('HC-1001-1');
    expect(page.textOf('lw-figures-strip')).toContain('3.758');
    expect(page.textOf('lw-blank-deck li')).toContain('L1: face A up, 90° up, 90° between legs');
  });

  it('takes a typed chain and prints it back', async () => {
    const page = await PageUnderTest.open(of(part()));
    await page.type('Typed chain', '1 up 90 r.16 3 up 90 1');
    await page.press('Enter', {}, page.labelled('Typed chain'));
    expect(page.labelled('Typed chain').value).toBe('1 up 90 r.16 3 up 90 1');
    expect(page.textOf('lw-figures-strip')).toContain('4.758');
    expect(page.labelled('Name of leg 2').value).toBe('Web');
  });

  it("keeps a typed chain that can't be read and points at the word", async () => {
    const page = await PageUnderTest.open(of(part()));
    await page.type('Typed chain', '1 upp 90 r.16 3');
    page.labelled('Typed chain').blur();
    await page.settled();
    expect(page.labelled('Typed chain').value).toBe('1 upp 90 r.16 3');
    expect(page.textOf('lw-typed-chain-box .wrong')).toBe('upp');
    expect(page.textOf('lw-figures-strip')).toContain('3.758');
  });

  it('keeps what is typed and broken, says why at the field and marks the drawing as not current', async () => {
    const page = await PageUnderTest.open(of(part()));
    await page.type('Length of leg 2', 'abc');
    expect(page.labelled('Length of leg 2').value).toBe('abc');
    expect(page.labelled('Length of leg 2').getAttribute('aria-invalid')).toBe('true');
    expect(page.textOf('lw-leg-row .stop')).toBeTruthy();
    expect(page.textOf('lw-formed-deck')).toContain('not current');
    expect(page.textOf('.saving')).toContain("can't be saved: 1 field to mend");
    await page.press('Escape', {}, page.labelled('Length of leg 2'));
    expect(page.labelled('Length of leg 2').value).toBe('2');
  });

  it('undoes and redoes by key', async () => {
    const page = await PageUnderTest.open(of(part()));
    await page.type('Length of leg 2', '3');
    await page.press('z', { ctrlKey: true }, page.element);
    expect(page.labelled('Length of leg 2').value).toBe('2');
    await page.press('z', { ctrlKey: true, shiftKey: true }, page.element);
    expect(page.labelled('Length of leg 2').value).toBe('3');
  });

  it('shows the same selection in the ledger, the stations and both decks', async () => {
    const page = await PageUnderTest.open(of(part()));
    await page.click(page.row(1));
    expect(page.row(1).classList).toContain('selected');
    expect(page.textOf('lw-stations-table tr.selected')).toContain('L1');
  });

  it('lets others than designers read only, and says so', async () => {
    const page = await PageUnderTest.open(of(part()), ['technician']);
    expect(page.textOf('.saving')).toContain('read only');
    expect(page.labelled('Length of leg 1').readOnly).toBeTrue();
    expect(page.element.querySelector('lw-ledger .add')).toBeNull();
  });

  it("says why a part that can't be bent is not drawn", async () => {
    const consumed = { ...channel, chain: channel.chain.with(2, { leg: 0.2, name: 'Web' }) };
    const page = await PageUnderTest.open(of(part(consumed)));
    expect(page.textOf('lw-formed-deck .instead')).toContain("can't be drawn");
    expect(page.textOf('lw-findings-list .stop')).toContain('stop');
  });

  it('offers work that was left unsaved, by a moment nobody can misread, and goes on in the chain once that is settled', async () => {
    const key = `lw-draft/me/${part().id}/${part().revision.letter}/earlier`;
    const document = { ...channel, thickness: 0.05 };
    localStorage.setItem(
      key,
      JSON.stringify({ document, typed: null, version: 1, keptAt: '2026-01-05T10:00:00.000Z' }),
    );
    const page = await PageUnderTest.open(of(part()));
    await page.until(() => page.textOf('lw-saving-notices').includes('was not saved'));
    expect(page.textOf('lw-saving-notices')).toContain('5 January 2026');
    const discard = page.button('Discard it');
    discard.focus();
    discard.click();
    await page.until(() => page.textOf('lw-saving-notices').trim() === '');
    expect(window.document.activeElement).toBe(page.labelled('Typed chain'));
  });

  it('shows a flat strip', async () => {
    const page = await PageUnderTest.open(of(part({ ...channel, chain: [{ leg: 4 }] })));
    expect(page.textOf('lw-figures-strip')).toContain('4.000');
    expect(page.textOf('lw-stations-table')).toContain('A flat strip');
  });

  it('tells a part that is not there from a server that does not answer', async () => {
    const page = await PageUnderTest.open(refusal(404, PROBLEM.notFound));
    expect(page.element.textContent).toContain('There is no such part here.');
  });

  it('offers to try again after a failure', async () => {
    const page = await PageUnderTest.open(refusal(503, PROBLEM.unavailable));
    expect(page.textOf('[role="alert"]')).toContain("can't be shown");
    expect(page.textOf('button')).toContain('Try again');
  });
});
