import { provideZonelessChangeDetection } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { channel } from '../sample-part';
import { LocalCopies, type LocalCopy, type Stay } from './local-copies';

describe('local copies', () => {
  let copies: LocalCopies;
  const copy: LocalCopy = { document: channel, typed: null, version: 3, keptAt: '2026-01-05T10:00:00.000Z' };
  const stay: Stay = { person: 'me', part: 'p1', letter: 'A', visit: 'first' };
  const kept = (person = 'me', part = 'p1'): LocalCopy[] => copies.all(person, part, 'A').map((one) => one.copy);

  beforeEach(() => {
    localStorage.clear();
    TestBed.configureTestingModule({ providers: [provideZonelessChangeDetection()] });
    copies = TestBed.inject(LocalCopies);
  });

  afterEach(() => localStorage.clear());

  it('come back as they were kept, to the one who kept them', () => {
    expect(copies.keep(stay, copy)).toBeTrue();
    expect(kept()).toEqual([copy]);
    expect(kept('another')).toEqual([]);
    expect(kept('me', 'p2')).toEqual([]);
    expect(kept('me', 'p')).toEqual([]);
  });

  it('are gone when they are dropped', () => {
    copies.keep(stay, copy);
    copies.drop(stay);
    expect(kept()).toEqual([]);
  });

  it('of several visits stay apart, the newest first', () => {
    const newer = { ...copy, typed: '1 up', document: null, keptAt: '2026-01-05T10:00:01.000Z' };
    copies.keep(stay, copy);
    copies.keep({ ...stay, visit: 'second' }, newer);
    expect(copies.all('me', 'p1', 'A').map((one) => one.visit)).toEqual(['second', 'first']);
    copies.drop({ ...stay, visit: 'second' });
    expect(kept()).toEqual([copy]);
  });

  it('are not taken from what is no copy', () => {
    for (const broken of [
      '{',
      'null',
      '{"version":1}',
      '{"document":{"chain":3},"version":1,"keptAt":"x"}',
      '{"document":null,"typed":null,"version":1,"keptAt":"x"}',
      '{"document":null,"typed":3,"version":1,"keptAt":"x"}',
    ]) {
      localStorage.setItem('lw-draft/me/p1/A/first', broken);
      expect(kept()).withContext(broken).toEqual([]);
    }
  });

  it('say so when the browser keeps nothing', () => {
    spyOn(Storage.prototype, 'setItem').and.throwError('full');
    expect(copies.keep(stay, copy)).toBeFalse();
  });
});
