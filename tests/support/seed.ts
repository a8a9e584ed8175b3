/** The seed of everything random in the specs: fresh each run, printed, and given back by SEED=… to repeat a run. */
export const SEED = Number(process.env['SEED'] ?? Date.now() % 2 ** 31);

console.log(`Random cases from seed ${SEED}: SEED=${SEED} repeats them.`);

/** A stream of figures in 0…1 that depends on nothing but its seed (mulberry32). */
export function randomFrom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}
