/** Where an eigenvalue goes as the noise level changes. */
export interface Trail {
  points: { re: number; im: number }[];
}

export interface TrailLevel {
  sigma: number;
  eigenvalues: readonly { re: number; im: number; modulus: number }[];
}

/** Further than this between two neighbouring levels an eigenvalue is not taken for the same one. */
const FARTHEST = 0.12;

/**
 * Follows each of `current`, the eigenvalues at `sigma`, through the levels on either side: at each level every trail
 * takes the nearest eigenvalue that no closer trail wants. A trail ends where none is near.
 */
export function trailsThrough(
  levels: readonly TrailLevel[],
  sigma: number,
  current: readonly { re: number; im: number; modulus: number }[],
): Trail[] {
  const sorted = [...levels].sort((a, b) => a.sigma - b.sigma);
  const below = sorted.filter((level) => level.sigma < sigma).reverse();
  const above = sorted.filter((level) => level.sigma > sigma);
  const down = followed(below, current);
  const up = followed(above, current);
  return current.map(({ re, im }, i) => ({ points: [...down[i].reverse(), { re, im }, ...up[i]] }));
}

function followed(levels: TrailLevel[], current: readonly { re: number; im: number }[]) {
  const paths: { re: number; im: number }[][] = current.map(() => []);
  let heads: ({ re: number; im: number } | null)[] = [...current];
  for (const { eigenvalues } of levels) {
    const pairs = heads.flatMap((head, trail) =>
      head === null
        ? []
        : eigenvalues.map((value, index) => ({
            trail,
            index,
            distance: Math.hypot(value.re - head.re, value.im - head.im),
          })),
    );
    pairs.sort((a, b) => a.distance - b.distance);
    const taken = new Set<number>();
    const next: typeof heads = heads.map(() => null);
    for (const { trail, index, distance } of pairs) {
      if (distance > FARTHEST) break;
      if (next[trail] !== null || taken.has(index)) continue;
      taken.add(index);
      const { re, im } = eigenvalues[index];
      next[trail] = { re, im };
      paths[trail].push({ re, im });
    }
    heads = next;
  }
  return paths;
}
