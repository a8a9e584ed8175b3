/** Work that is done one at a time, in the order it came. */

/** The turn did not come in time: the work was taken out and is never done. */
export class Overdue extends Error {}

export interface Limits {
  /** Milliseconds that work waits for its turn at most; null: without end. */
  readonly patience: number | null;
  /** How many may wait at once; who comes after them is sent away. */
  readonly most?: number;
}

interface Waiting {
  readonly begin: () => void;
}

export class OneAtATime {
  readonly #limits: Limits;
  readonly #waiting = new Set<Waiting>();
  #busy = false;

  constructor(limits: Limits) {
    this.#limits = limits;
  }

  run<T>(work: () => Promise<T>, { patience = this.#limits.patience }: Partial<Limits> = {}): Promise<T> {
    return new Promise<T>((resolve, reject) => {
      if (this.#waiting.size >= (this.#limits.most ?? Infinity)) {
        reject(new Overdue('Too many wait already.'));
        return;
      }
      let late: NodeJS.Timeout | undefined;
      const mine: Waiting = {
        begin: () => {
          clearTimeout(late);
          this.#perform(work).then(resolve, reject);
        },
      };
      this.#waiting.add(mine);
      if (patience !== null && this.#busy) {
        late = setTimeout(() => {
          this.#waiting.delete(mine);
          reject(new Overdue('Other work did not end in time.'));
        }, patience);
      }
      this.#next();
    });
  }

  async #perform<T>(work: () => Promise<T>): Promise<T> {
    try {
      return await work();
    } finally {
      this.#busy = false;
      this.#next();
    }
  }

  #next(): void {
    if (this.#busy) return;
    // A set keeps the order in which its members came.
    const [first] = this.#waiting;
    if (!first) return;
    this.#waiting.delete(first);
    this.#busy = true;
    first.begin();
  }
}
