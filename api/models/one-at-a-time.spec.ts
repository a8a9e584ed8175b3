import { OneAtATime, Overdue } from './one-at-a-time';

const DAY = 24 * 60 * 60 * 1000;

describe('one at a time', () => {
  it('lets one in at a time, in the order they came', async () => {
    const queue = new OneAtATime({ patience: DAY });
    const log: string[] = [];
    const work = (name: string, turns: number) => async (): Promise<string> => {
      log.push(`${name} in`);
      for (let turn = 0; turn < turns; turn += 1) await Promise.resolve();
      log.push(`${name} out`);
      return name;
    };
    expect(await Promise.all([queue.run(work('a', 9)), queue.run(work('b', 1)), queue.run(work('c', 4))])).toEqual([
      'a',
      'b',
      'c',
    ]);
    expect(log).toEqual(['a in', 'a out', 'b in', 'b out', 'c in', 'c out']);
  });

  it('goes on after work that failed, and says so to whoever sent it', async () => {
    const queue = new OneAtATime({ patience: DAY });
    const failed = queue.run(() => Promise.reject(new Error('full')));
    const thrown = queue.run(() => {
      throw new Error('at once');
    });
    const next = queue.run(() => Promise.resolve('written'));
    await expectAsync(failed).toBeRejectedWithError('full');
    await expectAsync(thrown).toBeRejectedWithError('at once');
    expect(await next).toBe('written');
  });

  describe('with a limit', () => {
    let finish: (word: string) => void;
    let queue: OneAtATime;
    let first: Promise<string>;

    beforeEach(() => {
      jasmine.clock().install();
      queue = new OneAtATime({ patience: 1000, most: 2 });
      first = queue.run(() => new Promise<string>((resolve) => (finish = resolve)));
    });

    afterEach(() => jasmine.clock().uninstall());

    it('sends away who has waited too long, and never does their work afterwards', async () => {
      const done: string[] = [];
      const late = queue.run(() => Promise.resolve(done.push('late')));
      jasmine.clock().tick(500);
      const next = queue.run(() => Promise.resolve(done.push('next')));
      jasmine.clock().tick(499);
      jasmine.clock().tick(1);
      await expectAsync(late).toBeRejectedWithError(Overdue);
      finish('slow');
      expect(await first).toBe('slow');
      await next;
      expect(done).toEqual(['next']);
    });

    it('never sends away whose turn has come, however long it takes', async () => {
      jasmine.clock().tick(5000);
      finish('slow');
      expect(await first).toBe('slow');
    });

    it('sends away at once who comes when too many wait', async () => {
      const waiting = [queue.run(() => Promise.resolve(1)), queue.run(() => Promise.resolve(2))];
      await expectAsync(queue.run(() => Promise.resolve(3))).toBeRejectedWithError(Overdue);
      finish('done');
      expect(await Promise.all(waiting)).toEqual([1, 2]);
    });

    it('lets one wait without end who has to', async () => {
      const last = queue.run(() => Promise.resolve('closed'), { patience: null });
      jasmine.clock().tick(5000);
      finish('done');
      expect(await last).toBe('closed');
    });
  });
});
