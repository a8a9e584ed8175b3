import { TestBed } from '@angular/core/testing';
import type { PartDocument } from '@shared/part/document';
import { channel, part } from '../sample-part';
import { type Autosave } from './autosave';
import { closeDraft, openDraft } from './autosave-under-test';
import { type FakeServer, lost, thicker } from './fake-server';
import { type LocalCopies, type LocalCopy } from './local-copies';
import { OpenVisits } from './open-visits';

describe('work left behind', () => {
  let sent: FakeServer['sent'];
  let confirm: FakeServer['confirm'];
  let autosave: Autosave;
  let copies: LocalCopies;

  beforeEach(() => ({ sent, confirm, autosave, copies } = openDraft()));
  afterEach(closeDraft);

  const edit = (document: PartDocument, refused = 0): void => autosave.changed(document, refused);
  const wait = (time: number): void => jasmine.clock().tick(time);
  const copyOf = (id: string, person = 'me'): LocalCopy | null => copies.all(person, id, 'A')[0]?.copy ?? null;
  const looked = async (): Promise<void> => {
    for (let turn = 0; turn < 5; turn += 1) await Promise.resolve();
  };
  const lose = (index: number): void => sent[index]!.answer.error(lost());

  it('is offered, where earlier visits could not save it, the newest first, until each is settled', async () => {
    edit(thicker(0.05));
    autosave.open(part(), 'me');
    lose(0);
    autosave.open(part(), 'me');
    await looked();
    expect(autosave.leftBehind()?.document).toEqual(thicker(0.05));
    wait(10);
    edit(thicker(0.06));
    autosave.open(part(), 'me');
    lose(1);
    autosave.open(part(), 'me');
    await looked();
    expect(autosave.leftBehind()?.document).toEqual(thicker(0.06));
    autosave.settleCopy();
    expect(autosave.leftBehind()?.document).toEqual(thicker(0.05));
    autosave.settleCopy();
    autosave.open(part(), 'me');
    await looked();
    expect(autosave.leftBehind()).toBeNull();
  });

  it('is not offered when the server has it already, nor to somebody else', async () => {
    edit(thicker(0.05));
    autosave.open(part(), 'me');
    lose(0);
    const turned = Object.fromEntries(Object.entries(thicker(0.05)).reverse()) as unknown as PartDocument;
    autosave.open(part(turned, 2), 'me');
    await looked();
    expect(autosave.leftBehind()).toBeNull();
    expect(localStorage.length).toBe(0);
    edit(thicker(0.06));
    autosave.open(part(), 'another');
    lose(1);
    autosave.open(part(), 'another');
    await looked();
    expect(autosave.leftBehind()).toBeNull();
  });

  it('stays with another tab that works with it, and is offered once that tab is gone', async () => {
    const elsewhere = new OpenVisits();
    const stay = { person: 'me', part: 'p1', letter: 'A', visit: elsewhere.begin() };
    copies.keep(stay, { document: thicker(0.05), typed: null, version: 1, keptAt: '2026-01-05T10:00:00.000Z' });
    autosave.open(part(), 'me');
    await TestBed.inject(OpenVisits).ended([stay.visit]);
    await looked();
    expect(autosave.leftBehind()).toBeNull();
    edit(thicker(0.06));
    wait(900);
    confirm(0, 2);
    expect(copyOf('p1')?.document).toEqual(thicker(0.05));
    elsewhere.ngOnDestroy();
    autosave.open(part(), 'me');
    wait(1000);
    await looked();
    expect(autosave.leftBehind()?.document).toEqual(thicker(0.05));
  });

  it('is not lost where the browser has no room for another copy', async () => {
    edit({ ...channel, thickness: 'abc' }, 1);
    autosave.open(part(), 'me');
    spyOn(Storage.prototype, 'setItem').and.throwError('full');
    await looked();
    edit({ ...channel, thickness: 'abd' }, 1);
    expect(autosave.keepsCopy()).toBeFalse();
    expect(autosave.atRisk).toBeTrue();
    autosave.open(part(), 'me');
    await looked();
    expect(autosave.leftBehind()?.document?.thickness).toBe('abc');
  });

  it('may be a typed chain that was not taken, beside a draft that is saved', async () => {
    autosave.typed('1 upp');
    expect(autosave.state().is).toBe('saved');
    expect(autosave.untaken()).toBe('1 upp');
    edit(thicker(0.05));
    wait(900);
    confirm(0, 2);
    expect(copyOf('p1')).toEqual(jasmine.objectContaining({ document: null, typed: '1 upp' }));
    autosave.open(part(thicker(0.05), 2), 'me');
    await looked();
    expect(autosave.untaken()).toBeNull();
    expect(autosave.leftBehind()?.typed).toBe('1 upp');
    autosave.settleCopy();
    autosave.typed('1 up');
    autosave.typed(null);
    expect(localStorage.length).toBe(0);
  });
});
