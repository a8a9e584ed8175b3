import { Injectable, type OnDestroy } from '@angular/core';

/** How long other tabs have to say what they hold open. */
const ROLL_CALL = 1_000;

type Call =
  | { readonly asks: string; readonly visits: readonly string[] }
  | { readonly answers: string; readonly visits: readonly string[] };

/**
 * Which visits to a draft still go on, in this tab or in another of this browser. Asked over a channel and not by locks:
 * a shop's server on plain http has no locks.
 */
@Injectable({ providedIn: 'root' })
export class OpenVisits implements OnDestroy {
  private readonly channel = new BroadcastChannel('lw-visits');
  /** Visits of this tab: true while they go on. */
  private readonly ours = new Map<string, boolean>();
  private readonly answers = new Map<string, (visits: readonly string[]) => void>();

  constructor() {
    this.channel.onmessage = ({ data }: MessageEvent<Call>) => this.hear(data);
  }

  begin(): string {
    const id = freshId();
    this.ours.set(id, true);
    return id;
  }

  end(visit: string): void {
    this.ours.set(visit, false);
  }

  /** Those of the visits that have ended: nobody works in them any more. */
  async ended(visits: readonly string[]): Promise<string[]> {
    const foreign = visits.filter((visit) => !this.ours.has(visit));
    const alive = foreign.length > 0 ? await this.callRoll(foreign) : new Set<string>();
    return visits.filter((visit) => !alive.has(visit) && this.ours.get(visit) !== true);
  }

  ngOnDestroy(): void {
    this.channel.close();
  }

  private callRoll(visits: readonly string[]): Promise<ReadonlySet<string>> {
    const asks = freshId();
    const alive = new Set<string>();
    this.channel.postMessage({ asks, visits } satisfies Call);
    return new Promise((resolve) => {
      const close = (): void => {
        clearTimeout(timer);
        this.answers.delete(asks);
        resolve(alive);
      };
      const timer = setTimeout(close, ROLL_CALL);
      this.answers.set(asks, (heard) => {
        for (const visit of heard) alive.add(visit);
        if (visits.every((visit) => alive.has(visit))) close();
      });
    });
  }

  private hear(call: Call): void {
    if ('answers' in call) return this.answers.get(call.answers)?.(call.visits);
    const visits = call.visits.filter((visit) => this.ours.get(visit) === true);
    if (visits.length > 0) this.channel.postMessage({ answers: call.asks, visits } satisfies Call);
  }
}

/** Not randomUUID, which plain http has not got. */
const freshId = (): string => [...crypto.getRandomValues(new Uint32Array(3))].map((n) => n.toString(36)).join('');
