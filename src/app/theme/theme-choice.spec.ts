import { TestBed } from '@angular/core/testing';
import { ThemeChoice } from './theme-choice';

describe('ThemeChoice', () => {
  const root = document.documentElement;

  beforeEach(() => localStorage.removeItem('lw-theme'));
  afterEach(() => {
    localStorage.removeItem('lw-theme');
    root.style.colorScheme = '';
  });

  it('follows the system until somebody chooses', () => {
    const choice = TestBed.inject(ThemeChoice);
    choice.apply();
    expect(choice.theme()).toBe('system');
    expect(root.style.colorScheme).toBe('');
  });

  it('keeps the choice', () => {
    TestBed.inject(ThemeChoice).choose('dark');
    expect(root.style.colorScheme).toBe('dark');
    TestBed.resetTestingModule();
    expect(TestBed.inject(ThemeChoice).theme()).toBe('dark');
    TestBed.inject(ThemeChoice).choose('system');
    expect(root.style.colorScheme).toBe('');
  });

  it('ignores what it did not write', () => {
    localStorage.setItem('lw-theme', 'purple');
    expect(TestBed.inject(ThemeChoice).theme()).toBe('system');
  });
});
