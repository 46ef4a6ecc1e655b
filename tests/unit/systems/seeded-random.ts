import seedrandom from 'seedrandom';

/** Numbers from 0 to 1 that are the same in every run. */
export function seededRandom(seed: number): () => number {
  return seedrandom(`catalogue ${seed}`);
}
