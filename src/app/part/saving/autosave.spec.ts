import { TestBed } from '@angular/core/testing';
import { PROBLEM } from '@shared/contracts/problem';
import type { PartDocument } from '@shared/part/document';
import { Reachability } from '../../server/reachability';
import { channel, part, revision } from '../sample-part';
import { type Autosave } from './autosave';
import { closeDraft, openDraft } from './autosave-under-test';
import { type FakeServer, lost, problem, thicker } from './fake-server';
import { type LocalCopies, type LocalCopy } from './local-copies';

describe('autosave', () => {
  let sent: FakeServer['sent'];
  let confirm: FakeServer['confirm'];
  let autosave: Autosave;
  let copies: LocalCopies;
  let opened: PartDocument;

  beforeEach(() => ({ sent, confirm, autosave, copies, opened } = openDraft()));
  afterEach(closeDraft);

  const edit = (document: PartDocument, refused = 0): void => autosave.changed(document, refused);
  const wait = (time: number): void => jasmine.clock().tick(time);
  const copyOf = (id: string, person = 'me'): LocalCopy | null => copies.all(person, id, 'A')[0]?.copy ?? null;

  it('saves once, a moment after the last change, from the version it started from', () => {
    edit(thicker(0.05));
    wait(500);
    edit(thicker(0.06));
    wait(500);
    expect(sent.length).toBe(0);
    wait(400);
    expect(sent.map((one) => one.save)).toEqual([{ version: 1, document: thicker(0.06) }]);
    expect(autosave.state().is).toBe('saving');
    confirm(0, 2);
    expect(autosave.state().is).toBe('saved');
  });

  it('has one request on the way at a time and sends what came meanwhile afterwards', () => {
    edit(thicker(0.05));
    wait(900);
    edit(thicker(0.06));
    wait(5000);
    expect(sent.length).toBe(1);
    confirm(0, 2);
    expect(autosave.state().is).toBe('waiting');
    wait(900);
    expect(sent[1]?.save).toEqual({ version: 2, document: thicker(0.06) });
  });

  it('keeps a copy in the browser until the server confirms', () => {
    edit(thicker(0.05));
    expect(copyOf('p1')?.document).toEqual(thicker(0.05));
    wait(900);
    confirm(0, 2);
    expect(copyOf('p1')).toBeNull();
  });

  it('does not send what the engine refuses, but keeps it', () => {
    edit({ ...channel, thickness: 'abc' }, 1);
    wait(5000);
    expect(sent.length).toBe(0);
    expect(autosave.state()).toEqual({ is: 'held', fields: 1 });
    expect(copyOf('p1')?.document?.thickness).toBe('abc');
    edit(thicker(0.05));
    wait(900);
    expect(sent.length).toBe(1);
  });

  it('goes on trying, at longer and longer waits, while the server is lost', () => {
    edit(thicker(0.05));
    wait(900);
    sent[0]!.answer.error(lost());
    expect(autosave.state()).toEqual(jasmine.objectContaining({ is: 'trying', seconds: 2 }));
    wait(2100);
    sent[1]!.answer.error(lost());
    expect(autosave.state()).toEqual(jasmine.objectContaining({ is: 'trying', seconds: 4 }));
    wait(2100);
    expect(sent.length).toBe(2);
    wait(2000);
    confirm(2, 2);
    expect(autosave.state().is).toBe('saved');
  });

  it('tries at once when it is asked to', () => {
    edit(thicker(0.05));
    wait(900);
    sent[0]!.answer.error(lost());
    autosave.retry();
    wait(1);
    expect(sent.length).toBe(2);
  });

  it('stops when somebody else has saved, and lets theirs stand or ours go over it', () => {
    const theirs = revision(thicker(0.09), 7);
    edit(thicker(0.05));
    wait(900);
    sent[0]!.answer.error(problem(409, PROBLEM.stale, { current: theirs }));
    expect(autosave.state()).toEqual({ is: 'stale', theirs });
    edit(thicker(0.06));
    wait(5000);
    expect(sent.length).toBe(1);
    autosave.saveOver(theirs);
    wait(1);
    expect(sent[1]?.save).toEqual({ version: 7, document: thicker(0.06) });
  });

  it('takes theirs without sending anything', () => {
    const theirs = revision(thicker(0.09), 7);
    edit(thicker(0.05));
    wait(900);
    sent[0]!.answer.error(problem(409, PROBLEM.stale, { current: theirs }));
    autosave.takeTheirs(theirs);
    edit(theirs.document);
    wait(5000);
    expect(sent.length).toBe(1);
    expect(autosave.state().is).toBe('saved');
    edit(thicker(0.05));
    wait(900);
    expect(sent[1]?.save.version).toBe(7);
  });

  it('shows what the server refuses, and that one is signed out, without losing anything', () => {
    edit(thicker(0.05));
    wait(900);
    const errors = [{ path: 'thickness', message: 'Too thick.' }];
    sent[0]!.answer.error(problem(422, PROBLEM.invalid, { errors }));
    expect(autosave.state()).toEqual(jasmine.objectContaining({ is: 'refused', errors }));
    edit(thicker(0.06));
    wait(900);
    sent[1]!.answer.error(problem(401, PROBLEM.signedOut));
    expect(autosave.state().is).toBe('signed-out');
    expect(copyOf('p1')?.document).toEqual(thicker(0.06));
  });

  it('sends what the part before still wanted when another one is opened, and keeps the two apart', () => {
    edit(thicker(0.05));
    autosave.open({ ...part(), id: 'p2' }, 'me');
    expect(sent[0]?.save).toEqual({ version: 1, document: thicker(0.05) });
    expect(autosave.state().is).toBe('saved');
    confirm(0, 9);
    expect(copyOf('p1')).toBeNull();
    edit(thicker(0.07));
    wait(900);
    expect(sent[1]?.save).toEqual({ version: 1, document: thicker(0.07) });
  });

  it('never calls ours saved after a clash, also when ours is what the work began with', () => {
    const theirs = revision(thicker(0.09), 7);
    edit(thicker(0.05));
    wait(900);
    sent[0]!.answer.error(problem(409, PROBLEM.stale, { current: theirs }));
    edit(opened);
    expect(copyOf('p1')?.document).toEqual(opened);
    autosave.saveOver(theirs);
    edit(opened);
    expect(autosave.state().is).toBe('waiting');
    wait(900);
    expect(sent[1]?.save).toEqual({ version: 7, document: opened });
  });

  for (const [words, error] of [
    ['no answer', lost()],
    ['an error of the server', problem(500, PROBLEM.internal)],
    ['a wish to wait', problem(429, PROBLEM.tooManyAttempts)],
  ] as const) {
    it(`does not call the beginning saved after ${words}, and settles that save first`, () => {
      edit(thicker(0.05));
      wait(900);
      sent[0]!.answer.error(error);
      edit(opened);
      expect(autosave.state().is).toBe('waiting');
      wait(900);
      expect(sent[1]?.save).toEqual({ version: 1, document: thicker(0.05) });
      confirm(1, 2);
      wait(900);
      expect(sent[2]?.save).toEqual({ version: 2, document: opened });
      confirm(2, 3);
      expect(autosave.state().is).toBe('saved');
    });
  }

  it('sends a save whose answer was lost again as it was, and the newer work after it', () => {
    edit(thicker(0.05));
    wait(900);
    sent[0]!.answer.error(lost());
    edit(thicker(0.06));
    wait(900);
    expect(sent[1]?.save).toEqual({ version: 1, document: thicker(0.05) });
    confirm(1, 2);
    expect(autosave.state().is).toBe('waiting');
    wait(900);
    expect(sent[2]?.save).toEqual({ version: 2, document: thicker(0.06) });
  });

  it('sends the newest when it is left while a save is on its way', () => {
    edit(thicker(0.05));
    wait(900);
    edit(thicker(0.06));
    TestBed.resetTestingModule();
    expect(sent.length).toBe(1);
    confirm(0, 2);
    expect(sent[1]?.save).toEqual({ version: 2, document: thicker(0.06) });
    confirm(1, 3);
    expect(sent.length).toBe(2);
    expect(localStorage.length).toBe(0);
  });

  it('sends at once when the server answers again', () => {
    const reachability = TestBed.inject(Reachability);
    edit(thicker(0.05));
    wait(900);
    reachability.lost();
    sent[0]!.answer.error(lost());
    TestBed.tick();
    reachability.answered();
    TestBed.tick();
    wait(1);
    expect(sent.length).toBe(2);
  });

  it('goes on with newer work when what was sent is refused', () => {
    edit(thicker(0.05));
    wait(900);
    edit(thicker(0.06));
    wait(900);
    sent[0]!.answer.error(problem(422, PROBLEM.invalid, { errors: [] }));
    wait(900);
    expect(sent[1]?.save).toEqual({ version: 1, document: thicker(0.06) });
  });

  it('is saved again when everything is undone before it was sent', () => {
    edit(thicker(0.05));
    edit(part().revision.document);
    expect(autosave.state().is).toBe('saved');
    wait(5000);
    expect(sent.length).toBe(0);
  });
});
