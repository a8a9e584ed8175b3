import { LiveAnnouncer } from '@angular/cdk/a11y';
import { provideZonelessChangeDetection } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import type { Expression } from '@shared/part/document';
import { ExpressionField } from './expression-field';
import { typedExpression } from './typed-expression';

describe('a box for an expression', () => {
  let fixture: ComponentFixture<ExpressionField>;
  let announced: string[];

  beforeEach(() => {
    announced = [];
    const announcer = { announce: (words: string) => Promise.resolve(announced.push(words)) };
    TestBed.configureTestingModule({
      providers: [provideZonelessChangeDetection(), { provide: LiveAnnouncer, useValue: announcer }],
    });
    fixture = TestBed.createComponent(ExpressionField);
    fixture.componentRef.setInput('label', 'Length of leg 1');
    hold(0.5, null);
    fixture.componentInstance.typed.subscribe((text) => hold(typedExpression(text), null));
  });

  const element = (): HTMLElement => fixture.nativeElement as HTMLElement;
  const box = (): HTMLInputElement => element().querySelector('input')!;

  /** What the page does with what was typed. */
  function hold(value: Expression, message: string | null): void {
    fixture.componentRef.setInput('value', value);
    fixture.componentRef.setInput('message', message);
    fixture.detectChanges();
  }

  function type(text: string): void {
    box().value = text;
    box().dispatchEvent(new Event('input'));
    fixture.detectChanges();
  }

  it('leaves what is being typed alone while it means the same, and says what it understood', () => {
    type('0,75');
    expect(box().value).toBe('0,75');
    expect(element().querySelector('.understood')?.textContent).toBe('= 0.75');
    box().dispatchEvent(new Event('blur'));
    fixture.detectChanges();
    expect(box().value).toBe('0.75');
    expect(element().querySelector('.understood')).toBeNull();
  });

  it('shows what the part has once that is another', () => {
    type('0,75');
    hold(2, null);
    expect(box().value).toBe('2');
  });

  it('shows at once what is wrong and reads it out only when the typing pauses', () => {
    jasmine.clock().install();
    try {
      hold('1 3/', 'This is not complete.');
      expect(element().querySelector('.message')?.textContent).toBe('This is not complete.');
      expect(element().querySelector('[role="alert"]')).toBeNull();
      jasmine.clock().tick(999);
      hold('1 3/q', 'This is not complete.');
      jasmine.clock().tick(999);
      expect(announced).toEqual([]);
      jasmine.clock().tick(1);
      expect(announced).toEqual(['Length of leg 1: This is not complete.']);
    } finally {
      jasmine.clock().uninstall();
    }
  });

  it('reads nothing out when it was mended before the pause', () => {
    jasmine.clock().install();
    try {
      hold('1 3/', 'This is not complete.');
      jasmine.clock().tick(999);
      hold('1 3/16', null);
      jasmine.clock().tick(5000);
      expect(announced).toEqual([]);
    } finally {
      jasmine.clock().uninstall();
    }
  });

  it('has an edge that can be seen: 3 to 1 against its ground', () => {
    document.documentElement.style.setProperty('--lw-control', 'rgb(1, 2, 3)');
    document.body.append(element());
    expect(getComputedStyle(box()).borderTopColor).toBe('rgb(1, 2, 3)');
    document.documentElement.style.removeProperty('--lw-control');
  });
});
