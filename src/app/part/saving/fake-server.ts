/** For specs: a server whose answers to saves are given by hand. */
import { HttpErrorResponse, HttpHeaders } from '@angular/common/http';
import type { Revision, SaveRevision } from '@shared/contracts/revisions';
import type { PartDocument } from '@shared/part/document';
import { type Observable, Subject } from 'rxjs';
import { ServerProblem } from '../../server/server-problem';
import { channel, revision } from '../sample-part';

interface Sent {
  readonly save: SaveRevision;
  readonly answer: Subject<Revision>;
}

export class FakeServer {
  readonly sent: Sent[] = [];

  saveRevision(_id: string, _letter: string, save: SaveRevision): Observable<Revision> {
    const answer = new Subject<Revision>();
    this.sent.push({ save, answer });
    return answer;
  }

  confirm(index: number, version: number): void {
    const one = this.sent[index];
    if (!one) throw new Error(`Nothing was sent as number ${index}.`);
    one.answer.next(revision(one.save.document, version));
    one.answer.complete();
  }
}

export const problem = (status: number, type: string, more: object = {}): ServerProblem =>
  ServerProblem.of(
    new HttpErrorResponse({ status, headers: new HttpHeaders(), error: { type, title: 'No.', status, ...more } }),
  );

export const lost = (): ServerProblem => ServerProblem.of(new HttpErrorResponse({ status: 0 }));

export const thicker = (thickness: number): PartDocument => ({ ...channel, thickness });
