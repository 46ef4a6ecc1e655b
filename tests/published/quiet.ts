import type { PublishedCheck } from './published-check';

/* The eigenvalues of so many cells are those of a matrix, not of the map: `known` is null, for stated uncertainties speak of the map. */
export const quietChecks: readonly PublishedCheck[] = [
  {
    id: 'logistic4-det-law',
    title: 'Logistic r=4: invariant density, moments, Lyapunov exponent, spectrum',
    group: 'Maps without noise',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, r = 4',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['4*x*(1-x)'],
        parameters: {},
        breaks: [[0.5]],
      },
      noise: {
        kind: 'none',
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      ask: {
        stationary: {},
        lyapunov: {},
      },
    },
    compare: [
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        of: '1',
        window: [0, 0.1],
        expected: 0.20483276469913345,
      },
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        of: '1',
        window: [0, 0.25],
        expected: 0.3333333333333333,
      },
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        of: '1',
        window: [0, 0.5],
        expected: 0.5,
      },
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        of: '1',
        window: [0, 0.9],
        expected: 0.7951672353008665,
      },
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        of: 'x',
        expected: 0.5,
      },
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        of: 'x^2',
        expected: 0.375,
      },
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        of: 'x^3',
        expected: 0.3125,
      },
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        of: 'x^4',
        expected: 0.2734375,
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 0.002,
        },
        known: 1e-14,
        expected: Math.LN2,
      },
    ],
    source:
      'S. Ulam & J. von Neumann, Bull. Amer. Math. Soc. 53, 1947, 1120: density 1/(pi sqrt(x(1-x))), exponent ln 2 (from memory)',
    basis: 'exact',
    seen: 'from memory',
  },
  {
    id: 'chebyshev-map-t3-law',
    title: 'Chebyshev map T_3 on [-1,1]: density, Lyapunov exponent, doubly degenerate spectrum',
    group: 'Maps without noise',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'T3',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['4*x^3 - 3*x'],
        parameters: {},
      },
      noise: {
        kind: 'none',
      },
      domain: [
        {
          from: -1,
          to: 1,
          ends: 'absorbing',
        },
      ],
      ask: {
        stationary: {},
        lyapunov: {},
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 0.002,
        },
        known: 1e-14,
        expected: 1.0986122886681098,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        expected: 0.5,
      },
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        of: 'x^4',
        expected: 0.375,
      },
    ],
    source:
      'R. Adler & T. Rivlin, Ergodic and mixing properties of Chebyshev polynomials, Proc. Amer. Math. Soc. 15, 1964, 794 (from memory)',
    basis: 'exact',
    seen: 'from memory',
  },
  {
    id: 'ulam-rate-gauss-16-cells',
    title:
      'Ulam (histogram) discretisation of the Gauss map: first-order L1 convergence and approach of 2nd eigenvalue to the Wirsing constant: 16 cells',
    group: 'Maps without noise',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Continued fractions by cells',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['mod(1/x, 1)'],
        parameters: {},
      },
      noise: {
        kind: 'none',
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 16,
      },
      ask: {
        spectrum: {
          count: 2,
          deterministic: true,
        },
        stationary: {},
      },
    },
    compare: [
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.deterministic',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        expected: [
          [1, 0],
          [-0.3068577354866129, 0],
        ],
      },
      {
        kind: 'distance',
        path: 'cases[0].stationary',
        tolerance: {
          relative: 0.02,
        },
        known: null,
        to: '1/(log(2)*(1+x))',
        expected: 0.011528497589486625,
      },
    ],
    source:
      "Cells of the continued-fraction map in double precision; rate 1/n: C. Bose & R. Murray, The exact rate of approximation in Ulam's method, Discrete Contin. Dyn. Syst. 7, 2001, 219 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'ulam-rate-gauss-32-cells',
    title:
      'Ulam (histogram) discretisation of the Gauss map: first-order L1 convergence and approach of 2nd eigenvalue to the Wirsing constant: 32 cells',
    group: 'Maps without noise',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Continued fractions by cells',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['mod(1/x, 1)'],
        parameters: {},
      },
      noise: {
        kind: 'none',
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 32,
      },
      ask: {
        spectrum: {
          count: 2,
          deterministic: true,
        },
        stationary: {},
      },
    },
    compare: [
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.deterministic',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        expected: [
          [1, 0],
          [-0.3010745200949152, 0],
        ],
      },
      {
        kind: 'distance',
        path: 'cases[0].stationary',
        tolerance: {
          relative: 0.02,
        },
        known: null,
        to: '1/(log(2)*(1+x))',
        expected: 0.005777549315639748,
      },
    ],
    source:
      "Cells of the continued-fraction map in double precision; rate 1/n: C. Bose & R. Murray, The exact rate of approximation in Ulam's method, Discrete Contin. Dyn. Syst. 7, 2001, 219 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'ulam-rate-gauss-64-cells',
    title:
      'Ulam (histogram) discretisation of the Gauss map: first-order L1 convergence and approach of 2nd eigenvalue to the Wirsing constant: 64 cells',
    group: 'Maps without noise',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Continued fractions by cells',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['mod(1/x, 1)'],
        parameters: {},
      },
      noise: {
        kind: 'none',
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 64,
      },
      ask: {
        spectrum: {
          count: 2,
          deterministic: true,
        },
        stationary: {},
      },
    },
    compare: [
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.deterministic',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        expected: [
          [1, 0],
          [-0.30501119637888807, 0],
        ],
      },
      {
        kind: 'distance',
        path: 'cases[0].stationary',
        tolerance: {
          relative: 0.02,
        },
        known: null,
        to: '1/(log(2)*(1+x))',
        expected: 0.0028835957095697732,
      },
    ],
    source:
      "Cells of the continued-fraction map in double precision; rate 1/n: C. Bose & R. Murray, The exact rate of approximation in Ulam's method, Discrete Contin. Dyn. Syst. 7, 2001, 219 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'ulam-rate-gauss-128-cells',
    title:
      'Ulam (histogram) discretisation of the Gauss map: first-order L1 convergence and approach of 2nd eigenvalue to the Wirsing constant: 128 cells',
    group: 'Maps without noise',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Continued fractions by cells',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['mod(1/x, 1)'],
        parameters: {},
      },
      noise: {
        kind: 'none',
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 128,
      },
      ask: {
        spectrum: {
          count: 2,
          deterministic: true,
        },
        stationary: {},
      },
    },
    compare: [
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.deterministic',
        tolerance: {
          absolute: 0.002,
        },
        known: null,
        expected: [
          [1, 0],
          [-0.30482601897635153, 0],
        ],
      },
      {
        kind: 'distance',
        path: 'cases[0].stationary',
        tolerance: {
          relative: 0.02,
        },
        known: null,
        to: '1/(log(2)*(1+x))',
        expected: 0.001436000316576005,
      },
    ],
    source:
      "Cells of the continued-fraction map in double precision; rate 1/n: C. Bose & R. Murray, The exact rate of approximation in Ulam's method, Discrete Contin. Dyn. Syst. 7, 2001, 219 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'open-tent-s-2.5',
    title: 'Open tent map with slope s>2, escape rate: s = 2.5',
    group: 'Maps without noise',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Open tent map',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['s*(0.5 - abs(x - 0.5))'],
        parameters: {
          s: 2.5,
        },
        breaks: [[0.5]],
      },
      noise: {
        kind: 'none',
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      ask: {
        spectrum: {
          count: 2,
          deterministic: true,
        },
        exit: {
          start: {
            kind: 'point',
            at: [0.3],
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].spectrum.deterministic[0].re',
        tolerance: {
          absolute: 0.001,
        },
        known: 1e-14,
        expected: 0.8,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.rate',
        tolerance: {
          absolute: 0.001,
        },
        known: 1e-14,
        expected: 0.22314355131420976,
      },
    ],
    source:
      'The uniform density is conditionally invariant: eigenvalue 2/s; T. Tel & M. Gruiz, Chaotic Dynamics, Cambridge 2006 (from memory)',
    basis: 'exact',
    seen: 'identity',
  },
  {
    id: 'open-tent-s-3',
    title: 'Open tent map with slope s>2, escape rate: s = 3',
    group: 'Maps without noise',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Open tent map',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['s*(0.5 - abs(x - 0.5))'],
        parameters: {
          s: 3,
        },
        breaks: [[0.5]],
      },
      noise: {
        kind: 'none',
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      ask: {
        spectrum: {
          count: 2,
          deterministic: true,
        },
        exit: {
          start: {
            kind: 'point',
            at: [0.3],
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].spectrum.deterministic[0].re',
        tolerance: {
          absolute: 0.001,
        },
        known: 1e-14,
        expected: 0.6666666666666666,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.rate',
        tolerance: {
          absolute: 0.001,
        },
        known: 1e-14,
        expected: 0.4054651081081644,
      },
    ],
    source:
      'The uniform density is conditionally invariant: eigenvalue 2/s; T. Tel & M. Gruiz, Chaotic Dynamics, Cambridge 2006 (from memory)',
    basis: 'exact',
    seen: 'identity',
  },
  {
    id: 'beta-map-golden-law',
    title: 'Golden-mean beta transformation: invariant density and Lyapunov exponent',
    group: 'Maps without noise',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Beta transformation',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['mod(beta*x, 1)'],
        parameters: {
          beta: 1.618033988749895,
        },
        breaks: [[0.6180339887498948]],
      },
      noise: {
        kind: 'none',
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      ask: {
        stationary: {},
        lyapunov: {},
      },
    },
    compare: [
      {
        kind: 'density',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.005,
        },
        known: null,
        at: [0.1, 0.3, 0.55],
        expected: [1.170820393249937, 1.170820393249937, 1.170820393249937],
      },
      {
        kind: 'density',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.005,
        },
        known: null,
        at: [0.7, 0.9],
        expected: [0.7236067977499789, 0.7236067977499789],
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 0.005,
        },
        known: null,
        expected: 0.447213595499958,
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 0.000001,
        },
        known: 1e-14,
        expected: 0.48121182505960347,
      },
    ],
    source: 'A. Renyi, Acta Math. Acad. Sci. Hung. 8, 1957, 477; W. Parry, ibid. 11, 1960, 401 (from memory)',
    basis: 'exact',
    seen: 'from memory',
  },
];
