import type { PublishedCheck } from './published-check';

export const lineChecks: readonly PublishedCheck[] = [
  {
    id: 'expanding-linear',
    title: 'Expanding linear map with Gaussian noise on a long absorbing window: escape rate and spectrum',
    group: 'Maps of the line and the interval',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Expanding linear map',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['a*x'],
        parameters: {
          a: 2,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.25,
      },
      domain: [
        {
          from: -4,
          to: 4,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        spectrum: {
          count: 6,
        },
        exit: {
          start: {
            kind: 'point',
            at: [0],
          },
        },
      },
    },
    compare: [
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-14,
        expected: [
          [0.5, 0],
          [0.25, 0],
          [0.125, 0],
          [0.0625, 0],
          [0.03125, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].exit.rate',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-14,
        expected: Math.LN2,
      },
    ],
    source:
      'Gaussian integral: eigenvalues 1/(|a| a^n); without noise P. Gaspard, Chaos, Scattering and Statistical Mechanics, 1998 (from memory)',
    basis: 'exact',
    seen: 'identity',
  },
  {
    id: 'tent-reflecting-evolution',
    title: 'Tent map with Gaussian noise and reflecting ends: closed-form evolution (nilpotent)',
    group: 'Maps of the line and the interval',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Tent map, evolution',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['1 - abs(1 - 2*x)'],
        parameters: {},
        breaks: [[0.5]],
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.1,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'reflecting',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-10,
      },
      ask: {
        density: {
          start: {
            kind: 'formula',
            formula: '1 + (0.5)*cos(2*pi*x) + (0.2)*cos(4*pi*x) + (0.25)*cos(8*pi*x)',
          },
          at: [1, 2, 3],
        },
      },
    },
    compare: [
      {
        kind: 'density',
        path: 'cases[0].density[at=1]',
        tolerance: {
          absolute: 1e-9,
        },
        known: null,
        at: [0, 0.15, 0.5, 0.8],
        expected: [1.753608831849556, 1.4854745233384317, 0.9493364411987033, 0.5738694731970785],
      },
      {
        kind: 'density',
        path: 'cases[0].density[at=2]',
        tolerance: {
          absolute: 1e-9,
        },
        known: null,
        at: [0, 0.15, 0.5, 0.8],
        expected: [1.249445705822848, 1.1940045150832528, 0.9068230402866405, 0.9023691927433775],
      },
      {
        kind: 'density',
        path: 'cases[0].density[at=3]',
        tolerance: {
          absolute: 1e-9,
        },
        known: null,
        at: [0, 0.15, 0.5, 0.8],
        expected: [1.0886904711544159, 1.0790237884319247, 1, 0.9282479015969566],
      },
    ],
    source:
      'The tent is the fold of 2x and reflecting noise a folded Gaussian: cos(pi k x) is damped by exp(-pi^2 sigma^2 k^2/2) and k halves',
    basis: 'exact',
    seen: 'identity',
  },
  {
    id: 'ricker-noise-log-coordinate',
    title: 'Ricker map with lognormal noise: exact identity <x>=1 and computed variance, Lyapunov exponent',
    group: 'Maps of the line and the interval',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Ricker in ln x',
      system: {
        type: 'map',
        variables: ['y'],
        formulas: ['y + r*(1 - exp(y))'],
        parameters: {
          r: 1.8,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.2,
      },
      domain: [
        {
          from: -14,
          to: 2.6,
          ends: 'reflecting',
        },
      ],
      ask: {
        spectrum: {
          count: 3,
        },
        stationary: {},
        lyapunov: {},
      },
    },
    compare: [
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.00001,
        },
        known: null,
        of: 'exp(y)',
        expected: 1,
      },
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 0.00001,
        },
        known: null,
        of: '(exp(y) - 1)^2',
        expected: 0.08237346930009593,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 0.00001,
        },
        known: null,
        expected: -0.04377800922873647,
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 0.0001,
        },
        known: null,
        expected: -0.48209073179261414,
      },
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 0.0001,
        },
        known: null,
        expected: [
          [1, 0],
          [-0.6636593028972577, 0],
        ],
      },
    ],
    source:
      "Mean growth vanishes in the long run, hence <x> = 1 (R. Lande, S. Engen & B.-E. Saether, Stochastic Population Dynamics in Ecology and Conservation, 2003, from memory); other values by Nystrom's method in ln x",
    basis: 'exact',
    seen: 'identity',
  },
  {
    id: 'bistable-tanh-line',
    title: 'Bistable map a tanh x with Gaussian noise: switching eigenvalue, exit time, Lyapunov exponent, whole line',
    group: 'Maps of the line and the interval',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Bistable map',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['a*tanh(x)'],
        parameters: {
          a: 1.5,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.4,
      },
      domain: [
        {
          from: -5.1,
          to: 5.1,
          ends: 'reflecting',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        spectrum: {
          count: 8,
        },
        stationary: {},
        lyapunov: {},
      },
    },
    compare: [
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: [
          [1.0000000000000173, 0],
          [0.9787476212334185, 0],
          [0.6555273298907265, 0],
          [0.4479144556733537, 0],
          [0.28161867829581183, 0],
          [0.16015449014516148, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 1.520810506322118,
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: -0.7615820924530867,
      },
    ],
    source: "Nystrom's method, 300 and 420 nodes on different windows: differ by 1e-14",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'bistable-tanh-left-half',
    title: 'Bistable map a tanh x with Gaussian noise: switching eigenvalue, exit time, Lyapunov exponent, left half',
    group: 'Maps of the line and the interval',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Bistable map, left half',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['a*tanh(x)'],
        parameters: {
          a: 1.5,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.4,
      },
      domain: [
        {
          from: -5.1,
          to: 0,
          ends: ['reflecting', 'absorbing'],
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        spectrum: {
          count: 1,
        },
        exit: {
          start: {
            kind: 'point',
            at: [-1.2878394549601655],
          },
        },
      },
    },
    compare: [
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: [[0.9848623798217901, 0]],
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 68.46168088646414,
      },
    ],
    source: "Nystrom's method, 300 and 420 nodes on different windows: differ by 1e-14",
    basis: 'computed',
    seen: 'recomputed',
  },
];
