/** The largest miss of a law over many cases, with the case that shows it: one expectation instead of a hundred thousand. */
export class Worst {
  miss = 0;
  label = 'no case';

  constructor(private readonly limit: number) {}

  /** @param miss how far a case is off; NaN counts as infinitely far */
  note(miss: number, label: string): void {
    const size = Number.isNaN(miss) ? Infinity : Math.abs(miss);
    if (size < this.miss) return;
    this.miss = size;
    this.label = label;
  }

  expectWithin(): void {
    expect(this.miss).withContext(this.label).toBeLessThan(this.limit);
  }
}
