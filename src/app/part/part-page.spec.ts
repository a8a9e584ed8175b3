import { HttpErrorResponse, HttpHeaders } from '@angular/common/http';
import { provideZonelessChangeDetection, signal } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { Part } from '@shared/contracts/parts';
import { PROBLEM } from '@shared/contracts/problem';
import type { Role } from '@shared/contracts/session';
import { type Observable, of, throwError } from 'rxjs';
import { Server } from '../server/server';
import { ServerProblem } from '../server/server-problem';
import { SessionStore } from '../session/session-store';
import { PartPage } from './part-page';
import { channel, part, revision } from './sample-part';

describe('the part page', () => {
  let fixture: ComponentFixture<PartPage>;

  async function open(answer: Observable<Part>, roles: readonly Role[] = ['designer']): Promise<HTMLElement> {
    const server = {
      part: () => answer,
      saveRevision: () => of(revision(channel, 2)),
      blankPaper: (id: string, letter: string, size: string) =>
        `/api/parts/${id}/revisions/${letter}/blank.pdf?size=${size}`,
    };
    const session = {
      person: signal({ id: 'me', name: 'Avery Example', email: 'a@example.org', roles }),
      hasRole: (role: Role) => roles.includes(role),
    };
    TestBed.configureTestingModule({
      providers: [
        provideZonelessChangeDetection(),
        provideRouter([]),
        { provide: Server, useValue: server },
        { provide: SessionStore, useValue: session },
      ],
    });
    fixture = TestBed.createComponent(PartPage);
    fixture.componentRef.setInput('id', 'p1');
    await fixture.whenStable();
    return fixture.nativeElement as HTMLElement;
  }

  const labelled = (page: HTMLElement, label: string): HTMLInputElement => {
    const found = page.querySelector<HTMLInputElement>(`[aria-label="${label}"]`);
    if (!found) throw new Error(`nothing is labelled ${label}`);
    return found;
  };

  async function type(page: HTMLElement, label: string, text: string): Promise<void> {
    const box = labelled(page, label);
    box.focus();
    box.value = text;
    box.dispatchEvent(new Event('input', { bubbles: true }));
    await fixture.whenStable();
  }

  async function press(target: HTMLElement, key: string, more: KeyboardEventInit = {}): Promise<void> {
    target.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true, ...more }));
    await fixture.whenStable();
  }

  const refusal = (status: number, type: string): Observable<never> =>
    throwError(() =>
      ServerProblem.of(
        new HttpErrorResponse({ status, headers: new HttpHeaders(), error: { type, title: 'No such thing.', status } }),
      ),
    );

  beforeEach(() => localStorage.clear());
  afterEach(() => localStorage.clear());

  it('shows which part it is, its figures and its bends in words', async () => {
    const page = await open(of(part()));
    expect(page.querySelector('h1')?.textContent).toBe('HC-1001-1');
    expect(page.querySelector('lw-figures-strip')?.textContent).toContain('3.758');
    expect(page.querySelector('lw-blank-deck li')?.textContent).toContain('L1: face A up, 90° up, 90° between legs');
  });

  it('takes a typed chain and prints it back', async () => {
    const page = await open(of(part()));
    await type(page, 'Typed chain', '1 up 90 r.16 3 up 90 1');
    await press(labelled(page, 'Typed chain'), 'Enter');
    expect(labelled(page, 'Typed chain').value).toBe('1 up 90 r.16 3 up 90 1');
    expect(page.querySelector('lw-figures-strip')?.textContent).toContain('4.758');
    expect(labelled(page, 'Name of leg 2').value).toBe('Web');
  });

  it('keeps a typed chain that can not be read, points at the word and goes back on demand', async () => {
    const page = await open(of(part()));
    await type(page, 'Typed chain', '1 upp 90 r.16 3');
    labelled(page, 'Typed chain').blur();
    await fixture.whenStable();
    expect(labelled(page, 'Typed chain').value).toBe('1 upp 90 r.16 3');
    expect(page.querySelector('lw-typed-chain-box .wrong')?.textContent).toBe('upp');
    expect(page.querySelector('lw-figures-strip')?.textContent).toContain('3.758');
  });

  it('keeps what is typed and broken, says why at the field and marks the drawing as not current', async () => {
    const page = await open(of(part()));
    await type(page, 'Length of leg 2', 'abc');
    expect(labelled(page, 'Length of leg 2').value).toBe('abc');
    expect(labelled(page, 'Length of leg 2').getAttribute('aria-invalid')).toBe('true');
    expect(page.querySelector('lw-leg-row [role="alert"]')?.textContent).toBeTruthy();
    expect(page.querySelector('lw-formed-deck')?.textContent).toContain('not current');
    expect(page.querySelector('.saving')?.textContent).toContain("can't be saved: 1 field to mend");
    await press(labelled(page, 'Length of leg 2'), 'Escape');
    expect(labelled(page, 'Length of leg 2').value).toBe('2');
  });

  it('goes down the ledger by Enter and Tab, and along a column by the arrows', async () => {
    const page = await open(of(part()));
    const at = (): string | null | undefined => document.activeElement?.getAttribute('aria-label');
    document.body.append(page);
    labelled(page, 'Length of leg 1').focus();
    await press(labelled(page, 'Length of leg 1'), 'Enter');
    expect(at()).toContain('Angle of bend L1');
    await press(document.activeElement as HTMLElement, 'ArrowDown');
    expect(at()).toBe('Length of leg 2');
    await press(document.activeElement as HTMLElement, 'Tab');
    expect(at()).toContain('Angle of bend L2');
    await press(document.activeElement as HTMLElement, 'ArrowUp');
    expect(at()).toBe('Length of leg 2');
  });

  it('goes on in the new leg after one was added, and in the joined one after a bend was taken out', async () => {
    const page = await open(of(part()));
    document.body.append(page);
    const button = (words: string): HTMLButtonElement =>
      [...page.querySelectorAll('button')].find((one) => one.textContent?.includes(words))!;
    button('Add a leg at the end').click();
    await fixture.whenStable();
    expect(document.activeElement?.getAttribute('aria-label')).toBe('Length of leg 4');
    page.querySelector<HTMLElement>('[data-row="5"]')!.click();
    await fixture.whenStable();
    button('Take out, join legs').click();
    await fixture.whenStable();
    expect(document.activeElement?.getAttribute('aria-label')).toBe('Length of leg 3');
    expect(labelled(page, 'Length of leg 3').value).toBe('2');
  });

  it('undoes and redoes by key', async () => {
    const page = await open(of(part()));
    await type(page, 'Length of leg 2', '3');
    await press(page, 'z', { ctrlKey: true });
    expect(labelled(page, 'Length of leg 2').value).toBe('2');
    await press(page, 'z', { ctrlKey: true, shiftKey: true });
    expect(labelled(page, 'Length of leg 2').value).toBe('3');
  });

  it('shows the same selection in the ledger, the stations and both decks', async () => {
    const page = await open(of(part()));
    page.querySelector<HTMLElement>('[data-row="1"]')!.click();
    await fixture.whenStable();
    expect(page.querySelector('[data-row="1"]')?.classList).toContain('selected');
    expect(page.querySelector('lw-stations-table tr.selected')?.textContent).toContain('L1');
  });

  it('lets others than designers read only, and says so', async () => {
    const page = await open(of(part()), ['technician']);
    expect(page.querySelector('.saving')?.textContent).toContain('read only');
    expect(labelled(page, 'Length of leg 1').readOnly).toBeTrue();
    expect(page.querySelector('lw-ledger .add')).toBeNull();
  });

  it('says why a part that can not be bent is not drawn', async () => {
    const consumed = { ...channel, chain: channel.chain.with(2, { leg: 0.2, name: 'Web' }) };
    const page = await open(of(part(consumed)));
    expect(page.querySelector('lw-formed-deck .instead')?.textContent).toContain("can't be drawn");
    expect(page.querySelector('lw-findings-list .stop')?.textContent).toContain('stop');
  });

  it('shows a flat strip', async () => {
    const page = await open(of(part({ ...channel, chain: [{ leg: 4 }] })));
    expect(page.querySelector('lw-figures-strip')?.textContent).toContain('4.000');
    expect(page.querySelector('lw-stations-table')?.textContent).toContain('A flat strip');
  });

  it('tells a part that is not there from a server that does not answer', async () => {
    const page = await open(refusal(404, PROBLEM.notFound));
    expect(page.textContent).toContain('There is no such part here.');
  });

  it('offers to try again after a failure', async () => {
    const page = await open(refusal(503, PROBLEM.unavailable));
    expect(page.querySelector('[role="alert"]')?.textContent).toContain("can't be shown");
    expect(page.querySelector('button')?.textContent).toContain('Try again');
  });
});
