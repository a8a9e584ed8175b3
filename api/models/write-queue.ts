/**
 * One writer at a time. SQLite allows no more, and writers that wait inside SQLite hold the threads that the one
 * in front needs to commit; waiting here costs nothing.
 */
export class WriteQueue {
  #last: Promise<unknown> = Promise.resolve();

  run<T>(work: () => Promise<T>): Promise<T> {
    const mine = this.#last.then(work, work);
    this.#last = mine.catch(() => undefined);
    return mine;
  }
}
