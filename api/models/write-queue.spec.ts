import { WriteQueue } from './write-queue';

describe('write queue', () => {
  it('lets one in at a time, in the order they came', async () => {
    const queue = new WriteQueue();
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
    const queue = new WriteQueue();
    const failed = queue.run(() => Promise.reject(new Error('full')));
    const next = queue.run(() => Promise.resolve('written'));
    await expectAsync(failed).toBeRejectedWithError('full');
    expect(await next).toBe('written');
  });
});
