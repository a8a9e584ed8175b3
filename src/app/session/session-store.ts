import { computed, inject, Injectable, signal } from '@angular/core';
import type { Person, Role, Session, SignIn } from '@shared/contracts/session';
import { firstValueFrom, type Observable } from 'rxjs';
import { CsrfToken } from '../server/csrf-token';
import { Server } from '../server/server';
import { ServerProblem } from '../server/server-problem';

export type Shop = Session['shop'];

/** An outage is never a sign-out: `unreachable` says only that we could not ask. */
export type SessionState =
  | { readonly is: 'loading' }
  | { readonly is: 'signed-in'; readonly person: Person; readonly shop: Shop }
  | { readonly is: 'signed-out'; readonly shop: Shop }
  | { readonly is: 'unreachable'; readonly message: string };

@Injectable({ providedIn: 'root' })
export class SessionStore {
  private readonly server = inject(Server);
  private readonly csrfToken = inject(CsrfToken);
  private readonly current = signal<SessionState>({ is: 'loading' });
  private asking: Promise<SessionState> | null = null;

  readonly state = this.current.asReadonly();
  readonly person = computed(() => {
    const state = this.current();
    return state.is === 'signed-in' ? state.person : null;
  });
  readonly shop = computed(() => {
    const state = this.current();
    return state.is === 'signed-in' || state.is === 'signed-out' ? state.shop : null;
  });

  /** To be called in a template or a computed: follows the session. */
  hasRole(role: Role): boolean {
    return this.person()?.roles.includes(role) ?? false;
  }

  /** Asks the server who we are, once; several callers share one request. */
  load(): Promise<SessionState> {
    this.asking ??= this.ask(this.server.session()).finally(() => (this.asking = null));
    return this.asking;
  }

  /** Rejects with a `ServerProblem`; the state stays as it was, so that a wrong password changes nothing on screen. */
  async signIn(who: SignIn): Promise<void> {
    if (this.csrfToken.value === null) await this.load();
    try {
      this.take(await firstValueFrom(this.server.signIn(who)));
    } catch (error) {
      if (!(error instanceof ServerProblem && error.is('csrf'))) throw error;
      // The token belonged to a session that has ended: fetch a new one and try once more.
      await this.renewToken();
      this.take(await firstValueFrom(this.server.signIn(who)));
    }
  }

  /**
   * Fetches a fresh token without touching the state: a page stays as it is while its session is renewed.
   * True when the server still knows us as this person.
   */
  async renewToken(personId?: string): Promise<boolean> {
    const session = await firstValueFrom(this.server.session());
    this.csrfToken.value = session.csrfToken;
    return session.person !== null && session.person.id === personId;
  }

  async signOut(): Promise<void> {
    this.take(await firstValueFrom(this.server.signOut()));
  }

  private async ask(request: Observable<Session>): Promise<SessionState> {
    try {
      this.take(await firstValueFrom(request));
    } catch (error) {
      const message = error instanceof Error ? error.message : "The server can't be reached.";
      this.current.update((state) => (state.is === 'loading' ? { is: 'unreachable', message } : state));
    }
    return this.current();
  }

  private take(session: Session): void {
    this.csrfToken.value = session.csrfToken;
    const { person, shop } = session;
    this.current.set(person === null ? { is: 'signed-out', shop } : { is: 'signed-in', person, shop });
  }
}
