/** For specs: a draft that "me" has open, on a clock and a server that the spec moves by hand. */
import { provideZonelessChangeDetection } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import type { PartDocument } from '@shared/part/document';
import { Server } from '../../server/server';
import { part } from '../sample-part';
import { Autosave } from './autosave';
import { FakeServer } from './fake-server';
import { LeftBehind } from './left-behind';
import { LocalCopies } from './local-copies';

export interface OpenDraft {
  readonly sent: FakeServer['sent'];
  readonly confirm: FakeServer['confirm'];
  readonly autosave: Autosave;
  readonly copies: LocalCopies;
  readonly opened: PartDocument;
}

/** To be called before each spec. */
export function openDraft(): OpenDraft {
  jasmine.clock().install();
  localStorage.clear();
  const server = new FakeServer();
  TestBed.configureTestingModule({
    providers: [provideZonelessChangeDetection(), Autosave, LeftBehind, { provide: Server, useValue: server }],
  });
  const autosave = TestBed.inject(Autosave);
  const first = part();
  autosave.open(first, 'me');
  return {
    sent: server.sent,
    confirm: (index, version) => server.confirm(index, version),
    autosave,
    copies: TestBed.inject(LocalCopies),
    opened: first.revision.document,
  };
}

/** To be called after each. */
export function closeDraft(): void {
  jasmine.clock().uninstall();
  localStorage.clear();
}
