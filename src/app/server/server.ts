import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { CreatePart, ListParts, Part, PartList } from '@shared/contracts/parts';
import type { PaperSize } from '@shared/contracts/papers';
import type { Revision, SaveRevision } from '@shared/contracts/revisions';
import type { Session, SignIn } from '@shared/contracts/session';
import { map, type Observable } from 'rxjs';
import { fileNameOf } from './file-name';

export type PartQuery = Omit<ListParts, 'limit'> & { readonly limit?: number };

/** A file as the server made and named it. */
export interface ServedFile {
  readonly name: string;
  readonly content: Blob;
}

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

  saveRevision(id: string, letter: string, save: SaveRevision): Observable<Revision> {
    return this.http.put<Revision>(revisionPath(id, letter), save);
  }

  blankPaper(id: string, letter: string, size: PaperSize): Observable<ServedFile> {
    const asked = { params: { size }, responseType: 'blob', observe: 'response' } as const;
    return this.http.get(`${revisionPath(id, letter)}/blank.pdf`, asked).pipe(
      map(({ body, headers }) => ({
        content: body ?? new Blob(),
        name: fileNameOf(headers.get('Content-Disposition')) ?? 'blank.pdf',
      })),
    );
  }
}

const revisionPath = (id: string, letter: string): string =>
  `/api/parts/${encodeURIComponent(id)}/revisions/${encodeURIComponent(letter)}`;
