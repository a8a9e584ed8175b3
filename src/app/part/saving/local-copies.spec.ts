import { provideZonelessChangeDetection } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { channel } from '../sample-part';
import { LocalCopies } from './local-copies';

describe('local copies', () => {
  let copies: LocalCopies;
  const copy = { document: channel, version: 3, keptAt: '2026-01-05T10:00:00.000Z' };

  beforeEach(() => {
    localStorage.clear();
    TestBed.configureTestingModule({ providers: [provideZonelessChangeDetection()] });
    copies = TestBed.inject(LocalCopies);
  });

  afterEach(() => localStorage.clear());

  it('come back as they were kept, to the one who kept them', () => {
    expect(copies.keep('me', 'p1', 'A', copy)).toBeTrue();
    expect(copies.read('me', 'p1', 'A')).toEqual(copy);
    expect(copies.read('another', 'p1', 'A')).toBeNull();
    expect(copies.read('me', 'p2', 'A')).toBeNull();
  });

  it('are gone when they are dropped', () => {
    copies.keep('me', 'p1', 'A', copy);
    copies.drop('me', 'p1', 'A');
    expect(copies.read('me', 'p1', 'A')).toBeNull();
  });

  it('stay when they were set aside, until they are dropped there', () => {
    copies.setAside('me', 'p1', 'A', copy);
    copies.drop('me', 'p1', 'A');
    expect(copies.read('me', 'p1', 'A')).toEqual(copy);
    copies.dropAside('me', 'p1', 'A');
    expect(copies.read('me', 'p1', 'A')).toBeNull();
  });

  it('are not taken from what is no copy', () => {
    for (const broken of ['{', 'null', '{"version":1}', '{"document":{"chain":3},"version":1,"keptAt":"x"}']) {
      localStorage.setItem('lw-draft/me/p1/A', broken);
      expect(copies.read('me', 'p1', 'A'))
        .withContext(broken)
        .toBeNull();
    }
  });

  it('say so when the browser keeps nothing', () => {
    spyOn(Storage.prototype, 'setItem').and.throwError('full');
    expect(copies.keep('me', 'p1', 'A', copy)).toBeFalse();
  });
});
