import { HttpErrorResponse } from '@angular/common/http';
import { provideZonelessChangeDetection } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { NEVER, Subject } from 'rxjs';
import { Server, type ServedFile } from '../server/server';
import { ServerProblem } from '../server/server-problem';
import { FileHandover } from '../ui/file-handover';
import { PartEditor } from './editing/part-editor';
import { PartHeader } from './part-header';
import { part } from './sample-part';
import { Autosave } from './saving/autosave';
import { LeftBehind } from './saving/left-behind';

describe('the header of a part', () => {
  let fixture: ComponentFixture<PartHeader>;
  let editor: PartEditor;
  let made: Subject<ServedFile>;
  let asked: unknown[];
  let give: jasmine.Spy;

  beforeEach(async () => {
    localStorage.clear();
    made = new Subject();
    asked = [];
    give = jasmine.createSpy('give');
    const server = {
      saveRevision: () => NEVER,
      blankPaper: (...args: unknown[]) => {
        asked.push(args);
        return made;
      },
    };
    TestBed.configureTestingModule({
      providers: [
        provideZonelessChangeDetection(),
        Autosave,
        LeftBehind,
        PartEditor,
        { provide: Server, useValue: server },
        { provide: FileHandover, useValue: { give } },
      ],
    });
    editor = TestBed.inject(PartEditor);
    editor.open(part(), 'me', true);
    fixture = TestBed.createComponent(PartHeader);
    await fixture.whenStable();
  });

  afterEach(() => localStorage.clear());

  const page = (): HTMLElement => fixture.nativeElement as HTMLElement;
  const pdf = (): HTMLButtonElement => page().querySelector<HTMLButtonElement>('.actions button:last-of-type')!;
  const settle = async (): Promise<void> => {
    await new Promise((resolve) => setTimeout(resolve));
    await fixture.whenStable();
  };
  const choose = async (size: string): Promise<void> => {
    pdf().click();
    await fixture.whenStable();
    const items = [...document.querySelectorAll<HTMLElement>('[mat-menu-item]')];
    items.find((item) => item.textContent?.trim() === size)!.click();
    await fixture.whenStable();
  };

  it('says that the paper is being made, and hands it over under the name that the server gave it', async () => {
    await choose('Letter');
    expect(asked).toEqual([['p1', 'A', 'letter']]);
    expect(pdf().textContent).toContain('Making the PDF');
    expect(pdf().getAttribute('aria-disabled')).toBe('true');
    const file = { name: 'HC-1001-1-A-blank.pdf', content: new Blob(['%PDF-']) };
    made.next(file);
    made.complete();
    await settle();
    expect(give).toHaveBeenCalledOnceWith(file);
    expect(pdf().textContent).toContain('Blank PDF');
  });

  it('says in words why there is no paper', async () => {
    await choose('A4');
    made.error(ServerProblem.of(new HttpErrorResponse({ status: 0 })));
    await settle();
    expect(page().querySelector('[role="alert"]')?.textContent).toContain("The PDF was not made. The server can't be");
    expect(pdf().textContent).toContain('Blank PDF');
  });

  it('does not say plainly saved while a typed chain is not taken', async () => {
    expect(page().querySelector('.saving')?.textContent).toMatch(/^saved [\d:]+$/);
    editor.typeChain('1 upp 90');
    await fixture.whenStable();
    expect(page().querySelector('.saving')?.textContent).toMatch(/^saved [\d:]+, but not the typed chain$/);
    expect(page().querySelector('.saving')?.classList).toContain('late');
  });
});
