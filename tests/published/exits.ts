import type { PublishedCheck } from './published-check';

/** Exits so rare that one minus the first eigenvalue has no digit left: two methods of positive sums agree on them. */
function rare(sigma: number, meanTime: number): PublishedCheck {
  return {
    id: `rare-exit-${sigma}`,
    title: `Logistic map leaving its range once in ${meanTime.toExponential(0)} steps, sigma = ${sigma}`,
    group: 'Rare exits',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, rare exits',
      system: { type: 'map', variables: ['x'], formulas: ['r*x*(1-x)'], parameters: { r: 3.8 } },
      noise: { kind: 'gaussian', sigma },
      domain: [{ from: 0, to: 1, ends: 'absorbing' }],
      ask: { exit: { start: { kind: 'point', at: [0.3] } } },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTime',
        tolerance: { relative: 1e-8 },
        known: 1e-9,
        expected: meanTime,
      },
      // the start is forgotten long before the exit
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: { relative: 1e-8 },
        known: 1e-9,
        expected: meanTime,
      },
    ],
    source:
      'Two methods of positive sums: fixed point of direct sums with the exit probability from erfc, and elimination without subtractions (W. K. Grassmann, M. I. Taksar & D. P. Heyman, Oper. Res. 33, 1985, 1107)',
    basis: 'computed',
    seen: 'recomputed',
  };
}

export const exitChecks: readonly PublishedCheck[] = [rare(0.005, 2.15748325e23), rare(0.003, 5.505471887e59)];
