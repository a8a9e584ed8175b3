import { HttpErrorResponse, HttpHeaders } from '@angular/common/http';
import { provideZonelessChangeDetection } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { PROBLEM } from '@shared/contracts/problem';
import type { Revision, SaveRevision } from '@shared/contracts/revisions';
import type { PartDocument } from '@shared/part/document';
import { Subject } from 'rxjs';
import { Server } from '../../server/server';
import { ServerProblem } from '../../server/server-problem';
import { channel, part, revision } from '../sample-part';
import { Autosave } from './autosave';
import { LocalCopies } from './local-copies';

interface Sent {
  readonly save: SaveRevision;
  readonly answer: Subject<Revision>;
}

const problem = (status: number, type: string, more: object = {}): ServerProblem =>
  ServerProblem.of(
    new HttpErrorResponse({ status, headers: new HttpHeaders(), error: { type, title: 'No.', status, ...more } }),
  );

const lost = (): ServerProblem => ServerProblem.of(new HttpErrorResponse({ status: 0 }));

const thicker = (thickness: number): PartDocument => ({ ...channel, thickness });

describe('autosave', () => {
  let sent: Sent[];
  let autosave: Autosave;
  let copies: LocalCopies;

  beforeEach(() => {
    jasmine.clock().install();
    localStorage.clear();
    sent = [];
    const server = {
      saveRevision: (_id: string, _letter: string, save: SaveRevision) => {
        const answer = new Subject<Revision>();
        sent.push({ save, answer });
        return answer;
      },
    };
    TestBed.configureTestingModule({
      providers: [provideZonelessChangeDetection(), Autosave, { provide: Server, useValue: server }],
    });
    autosave = TestBed.inject(Autosave);
    copies = TestBed.inject(LocalCopies);
    autosave.open(part(), 'me');
  });

  afterEach(() => {
    jasmine.clock().uninstall();
    localStorage.clear();
  });

  const edit = (document: PartDocument, refused = 0): void => autosave.changed(document, refused);
  const wait = (time: number): void => jasmine.clock().tick(time);
  const confirm = (index: number, version: number): void => {
    const one = sent[index]!;
    one.answer.next(revision(one.save.document, version));
    one.answer.complete();
  };

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
    expect(copies.read('me', 'p1', 'A')?.document).toEqual(thicker(0.05));
    wait(900);
    confirm(0, 2);
    expect(copies.read('me', 'p1', 'A')).toBeNull();
  });

  it('does not send what the engine refuses, but keeps it', () => {
    edit({ ...channel, thickness: 'abc' }, 1);
    wait(5000);
    expect(sent.length).toBe(0);
    expect(autosave.state()).toEqual({ is: 'held', fields: 1 });
    expect(copies.read('me', 'p1', 'A')?.document.thickness).toBe('abc');
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
    expect(copies.read('me', 'p1', 'A')?.document).toEqual(thicker(0.06));
  });

  it('offers the work that an earlier visit could not save, until that is settled', () => {
    edit(thicker(0.05));
    autosave.open(part(), 'me');
    expect(autosave.leftBehind()?.document).toEqual(thicker(0.05));
    edit(thicker(0.06));
    autosave.open(part(), 'me');
    expect(autosave.leftBehind()?.document).toEqual(thicker(0.06));
    autosave.settleCopy();
    autosave.open(part(), 'me');
    expect(autosave.leftBehind()).toBeNull();
  });

  it('does not offer what the server has already, nor the work of somebody else', () => {
    edit(thicker(0.05));
    autosave.open(part(thicker(0.05), 2), 'me');
    expect(autosave.leftBehind()).toBeNull();
    edit(thicker(0.06));
    autosave.open(part(), 'another');
    expect(autosave.leftBehind()).toBeNull();
  });

  it('sends what the part before still wanted when another one is opened, and keeps the two apart', () => {
    edit(thicker(0.05));
    autosave.open({ ...part(), id: 'p2' }, 'me');
    expect(sent[0]?.save).toEqual({ version: 1, document: thicker(0.05) });
    expect(autosave.state().is).toBe('saved');
    confirm(0, 9);
    expect(copies.read('me', 'p1', 'A')).toBeNull();
    edit(thicker(0.07));
    wait(900);
    expect(sent[1]?.save).toEqual({ version: 1, document: thicker(0.07) });
  });

  it('is saved again when everything is undone before it was sent', () => {
    edit(thicker(0.05));
    edit(part().revision.document);
    expect(autosave.state().is).toBe('saved');
    wait(5000);
    expect(sent.length).toBe(0);
  });
});
