/** The part page as its specs use it: opened on an answer of the server, typed into and driven by keys. */
import { provideZonelessChangeDetection, signal } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { Part } from '@shared/contracts/parts';
import type { Role } from '@shared/contracts/session';
import { type Observable, of } from 'rxjs';
import { Server } from '../server/server';
import { SessionStore } from '../session/session-store';
import { PartPage } from './part-page';
import { channel, revision } from './sample-part';

export class PageUnderTest {
  private constructor(private readonly fixture: ComponentFixture<PartPage>) {}

  static async open(answer: Observable<Part>, roles: readonly Role[] = ['designer']): Promise<PageUnderTest> {
    const server = {
      part: () => answer,
      saveRevision: () => of(revision(channel, 2)),
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
    const fixture = TestBed.createComponent(PartPage);
    fixture.componentRef.setInput('id', 'p1');
    const page = new PageUnderTest(fixture);
    // Only what is in the document can have the focus.
    document.body.append(page.element);
    window.focus();
    await page.settled();
    return page;
  }

  get element(): HTMLElement {
    return this.fixture.nativeElement as HTMLElement;
  }

  settled(): Promise<unknown> {
    return this.fixture.whenStable();
  }

  /** Settles again and again until something is so; the runner's own limit ends a wait in vain. */
  async until(so: () => boolean): Promise<void> {
    while (!so()) {
      await new Promise((resolve) => requestAnimationFrame(resolve));
      await this.settled();
    }
  }

  labelled(label: string): HTMLInputElement {
    const found = this.element.querySelector<HTMLInputElement>(`[aria-label="${label}"]`);
    if (!found) throw new Error(`nothing is labelled ${label}`);
    return found;
  }

  button(words: string): HTMLButtonElement {
    const found = [...this.element.querySelectorAll('button')].find((one) => one.textContent?.includes(words));
    if (!found) throw new Error(`no button says ${words}`);
    return found;
  }

  row(index: number): HTMLElement {
    const found = this.element.querySelector<HTMLElement>(`[data-row="${index}"]`);
    if (!found) throw new Error(`there is no row ${index}`);
    return found;
  }

  textOf(selector: string): string {
    return this.element.querySelector(selector)?.textContent ?? '';
  }

  /** Name of what has the focus. */
  focused(): string {
    return document.activeElement?.getAttribute('aria-label') ?? document.activeElement?.tagName ?? '';
  }

  async click(target: HTMLElement): Promise<void> {
    target.click();
    await this.settled();
  }

  async type(label: string, text: string): Promise<void> {
    const box = this.labelled(label);
    box.focus();
    box.value = text;
    box.dispatchEvent(new Event('input', { bubbles: true }));
    await this.settled();
  }

  /** @param target what has the focus when it is left out */
  async press(key: string, more: KeyboardEventInit = {}, target = document.activeElement): Promise<KeyboardEvent> {
    const event = new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true, ...more });
    target?.dispatchEvent(event);
    await this.settled();
    return event;
  }
}
