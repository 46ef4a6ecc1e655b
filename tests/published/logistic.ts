import type { PublishedCheck } from './published-check';

export const logisticChecks: readonly PublishedCheck[] = [
  {
    id: 'logistic-absorbing-r-4-sigma-0.2-from-0.3',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.2, from 0.3',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.2,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
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
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: [
          [0.7752855106439327, 0],
          [-0.21499956769788933, 0],
          [0.005733727163194996, 0],
          [-0.0008678973481135605, 0],
          [-0.000014894360093847068, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].exit.rate',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.2545239166408335,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTime',
        tolerance: {
          relative: 0.0001,
        },
        known: 1e-11,
        expected: 4.450091326400711,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 4.613623845091068,
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.36831264961011145,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.6082016406660286,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.06808233593336738,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r-4-sigma-0.2-from-0.5',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.2, from 0.5',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.2,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'point',
            at: [0.5],
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 3.3556629016000907,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r-4-sigma-0.2-from-anywhere',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.2, from anywhere',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.2,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'uniform',
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 4.442980756338926,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r-4-sigma-0.1-from-0.3',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.1, from 0.3',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.1,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
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
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: [
          [0.8602911982975892, 0],
          [-0.34864322592110797, 0],
          [0.04090445019336862, 0],
          [-0.02957445878004295, 0],
          [-0.005014389065912255, 0],
          [0.0008367888741847261, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].exit.rate',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.15048434437591576,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTime',
        tolerance: {
          relative: 0.0001,
        },
        known: 1e-11,
        expected: 7.1577451657631945,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 8.243992798570183,
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.4369813856432966,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.6091222616815182,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.07526605385175805,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r-4-sigma-0.1-from-0.5',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.1, from 0.5',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.1,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'point',
            at: [0.5],
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 4.760566511843191,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r-4-sigma-0.1-from-anywhere',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.1, from anywhere',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.1,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'uniform',
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 7.108930300116735,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r-4-sigma-0.05-from-0.3',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.05, from 0.3',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.05,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
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
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: [
          [0.9110568793021508, 0],
          [-0.1918569082072788, 0.20901323040475736],
          [-0.1918569082072788, -0.20901323040475736],
          [-0.016560270529731268, 0.03530940296731272],
          [-0.016560270529731268, -0.03530940296731272],
          [0.014904329118712535, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].exit.rate',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.09314994755471069,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTime',
        tolerance: {
          relative: 0.0001,
        },
        known: 1e-11,
        expected: 11.243140471730516,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 12.092666328000202,
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.4998345467312701,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.5934443890645421,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.08615636930063075,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r-4-sigma-0.05-from-0.5',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.05, from 0.5',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.05,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'point',
            at: [0.5],
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 6.873195905573766,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r-4-sigma-0.05-from-anywhere',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.05, from anywhere',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.05,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'uniform',
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 11.120374068632414,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r-4-sigma-0.02-from-0.3',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.02, from 0.3',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.02,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
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
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: [
          [0.9484267934068228, 0],
          [-0.19981938002651517, 0.3363219881473093],
          [-0.19981938002651517, -0.3363219881473093],
          [0.07948444408665112, 0],
          [-0.05496593095461094, -0.03992396846566895],
          [-0.05496593095461094, 0.03992396846566895],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].exit.rate',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.05295067402290118,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTime',
        tolerance: {
          relative: 0.0001,
        },
        known: 1e-11,
        expected: 19.38991321381776,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 17.442222274413922,
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.5584363362583606,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.5692840637779965,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.09876207532521375,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r-4-sigma-0.02-from-0.5',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.02, from 0.5',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.02,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'point',
            at: [0.5],
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 10.788515312547258,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r-4-sigma-0.02-from-anywhere',
    title: 'Noisy logistic map with absorbing ends: r = 4, sigma = 0.02, from anywhere',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.02,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'uniform',
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 19.209549340919004,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r38-r-3.8-sigma-0.05-from-0.3',
    title: 'Noisy logistic map with absorbing ends: r = 3.8, sigma = 0.05, from 0.3',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 3.8,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.05,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
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
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: [
          [0.972235966472944, 0],
          [-0.49731102195715793, 0],
          [-0.012188590744662584, 0.18418693572700487],
          [-0.012188590744662584, -0.18418693572700487],
          [0.04834507188795769, 0.01596114184306735],
          [0.04834507188795769, -0.01596114184306735],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].exit.rate',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.028156740123022456,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTime',
        tolerance: {
          relative: 0.0001,
        },
        known: 1e-11,
        expected: 36.0178213668234,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 37.536877921795586,
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.3909831684128149,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.61609453286144,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.07310369013881729,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r38-r-3.8-sigma-0.05-from-0.5',
    title: 'Noisy logistic map with absorbing ends: r = 3.8, sigma = 0.05, from 0.5',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 3.8,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.05,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'point',
            at: [0.5],
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 31.28277024787139,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r38-r-3.8-sigma-0.05-from-anywhere',
    title: 'Noisy logistic map with absorbing ends: r = 3.8, sigma = 0.05, from anywhere',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 3.8,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.05,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'uniform',
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 35.79826391829254,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r38-r-3.8-sigma-0.02-from-0.3',
    title: 'Noisy logistic map with absorbing ends: r = 3.8, sigma = 0.02, from 0.3',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 3.8,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.02,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
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
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: [
          [0.9993810288346776, 0],
          [-0.3444077869781431, 0.23105467685692174],
          [-0.3444077869781431, -0.23105467685692174],
          [-0.005025016096828901, 0.2654719510330656],
          [-0.005025016096828901, -0.2654719510330656],
          [0.15499511305399802, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].exit.rate',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.0006191628070586939,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTime',
        tolerance: {
          relative: 0.0001,
        },
        known: 1e-11,
        expected: 1615.58414353462,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 1618.2882588932664,
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.40698792758054514,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.6280319798727105,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.06833814489352652,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r38-r-3.8-sigma-0.02-from-0.5',
    title: 'Noisy logistic map with absorbing ends: r = 3.8, sigma = 0.02, from 0.5',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 3.8,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.02,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'point',
            at: [0.5],
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 1602.4541846451443,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-absorbing-r38-r-3.8-sigma-0.02-from-anywhere',
    title: 'Noisy logistic map with absorbing ends: r = 3.8, sigma = 0.02, from anywhere',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, absorbing',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 3.8,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.02,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'absorbing',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        exit: {
          start: {
            kind: 'uniform',
          },
        },
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 1607.8638495910163,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-reflecting-r-4-sigma-0.1',
    title: 'Noisy logistic map, reflecting ends (fold): r = 4, sigma = 0.1',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, reflecting',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
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
          [1.0000000000000078, 0],
          [-0.35986430782791007, 0],
          [-0.044087263302976326, 0],
          [0.029993797379918648, 0],
          [-0.005134796389132907, 0],
          [0.0006331808760762634, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.5422427469693138,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.5875847292943946,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.09275676043863001,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-reflecting-r-4-sigma-0.05',
    title: 'Noisy logistic map, reflecting ends (fold): r = 4, sigma = 0.05',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, reflecting',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.05,
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
          [0.9999999999999685, 0],
          [-0.20836534113427285, 0.32418416540173006],
          [-0.20836534113427285, -0.32418416540173006],
          [0.0014493552938872304, 0.03505220008935189],
          [0.0014493552938872304, -0.03505220008935189],
          [0.024195008659428346, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.5911227947344495,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.5680163255396151,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.10249188175898372,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-reflecting-r-3.8-sigma-0.05',
    title: 'Noisy logistic map, reflecting ends (fold): r = 3.8, sigma = 0.05',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, reflecting',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 3.8,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.05,
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
          [1, 0],
          [-0.48759590550824905, 0],
          [-0.007465690192196579, 0.19507796592894805],
          [-0.007465690192196579, -0.19507796592894805],
          [0.11275564390894129, 0],
          [0.04306046710393429, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.432029683694707,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.5988246955070088,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.08256019065554421,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-reflecting-r-3.8-sigma-0.02',
    title: 'Noisy logistic map, reflecting ends (fold): r = 3.8, sigma = 0.02',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, reflecting',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 3.8,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.02,
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
          [1.0000000000000129, 0],
          [-0.3445817589907177, 0.23078537196518467],
          [-0.3445817589907177, -0.23078537196518467],
          [-0.003666188211853015, 0.26511032517260125],
          [-0.003666188211853015, -0.26511032517260125],
          [0.2601013677927154, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.40840352596334606,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.6271862418842963,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.06877586104921973,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-periodic-r-4-sigma-0.1',
    title: 'Noisy logistic map wrapped mod 1: r = 4, sigma = 0.1',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, periodic',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 4,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.1,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'periodic',
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
          [1.0000000000000058, 0],
          [-0.3598643078279111, 0],
          [-0.044087263302995915, 0],
          [0.02999379737995736, 0],
          [-0.00513479638865474, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.5422427469693148,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.524455060476393,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.09982979526129832,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'logistic-periodic-r-3.6-sigma-0.08',
    title: 'Noisy logistic map wrapped mod 1: r = 3.6, sigma = 0.08',
    group: 'Logistic map',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Logistic map, periodic',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['r*x*(1-x)'],
        parameters: {
          r: 3.6,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.08,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'periodic',
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
          [1, 0],
          [-0.5928762551687393, 0],
          [0.16982551585798572, 0.0715701076536656],
          [0.16982551585798572, -0.0715701076536656],
          [-0.04598331415624873, 0],
          [0.008226646715256846, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.27581065650117587,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.mean[0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.607682229527832,
      },
      {
        kind: 'number',
        path: 'cases[0].stationary.covariance[0][0]',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.06769342252308802,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method); system: J. P. Crutchfield, J. D. Farmer & B. A. Huberman, Phys. Rep. 92, 1982, 45 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
];
