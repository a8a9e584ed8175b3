import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { ChangePart, CreatePart, ListParts, Part, PartList } from '@shared/contracts/parts';
import type { PaperSize } from '@shared/contracts/papers';
import type { Revision, SaveRevision } from '@shared/contracts/revisions';
import type { Session, SignIn } from '@shared/contracts/session';
import type { Observable } from 'rxjs';

export type PartQuery = Omit<ListParts, 'limit'> & { readonly limit?: number };

/** Every request the app makes. All fail with a `ServerProblem`. */
@Injectable({ providedIn: 'root' })
export class Server {
  private readonly http = inject(HttpClient);

  session(): Observable<Session> {
    return this.http.get<Session>('/api/session');
  }

  signIn(who: SignIn): Observable<Session> {
    return this.http.post<Session>('/api/session', who);
  }

  signOut(): Observable<Session> {
    return this.http.delete<Session>('/api/session');
  }

  parts(query: PartQuery): Observable<PartList> {
    const params: Record<string, string | number> = {};
    for (const [key, value] of Object.entries(query)) if (value !== undefined && value !== '') params[key] = value;
    return this.http.get<PartList>('/api/parts', { params });
  }

  createPart(part: CreatePart): Observable<Part> {
    return this.http.post<Part>('/api/parts', part);
  }

  part(id: string): Observable<Part> {
    return this.http.get<Part>(`/api/parts/${encodeURIComponent(id)}`);
  }

  changePart(id: string, change: ChangePart): Observable<Part> {
    return this.http.patch<Part>(`/api/parts/${encodeURIComponent(id)}`, change);
  }

  saveRevision(id: string, letter: string, save: SaveRevision): Observable<Revision> {
    return this.http.put<Revision>(revisionPath(id, letter), save);
  }

  /** For a link: the browser opens the PDF itself. */
  blankPaper(id: string, letter: string, size: PaperSize): string {
    return `${revisionPath(id, letter)}/blank.pdf?size=${size}`;
  }
}

const revisionPath = (id: string, letter: string): string =>
  `/api/parts/${encodeURIComponent(id)}/revisions/${encodeURIComponent(letter)}`;
