import type { PublishedCheck } from './published-check';

export const walkChecks: readonly PublishedCheck[] = [
  {
    id: 'gauss-walk-absorbing-from-0.5',
    title: 'Gaussian random walk on [0,1] with absorbing ends: eigenvalues and mean exit time: from 0.5',
    group: 'Random walks',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Random walk on [0, 1]',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['x'],
        parameters: {},
      },
      noise: {
        kind: 'gaussian',
        sigma: 1,
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
        spectrum: {
          count: 6,
        },
      },
      sweep: [
        {
          over: 'noise.sigma',
          values: [1, 0.5, 0.25, 0.1],
        },
      ],
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
          [0.36917107454846065, 0],
          [0.028777863645464113, 0],
          [0.0009721065278753021, 0],
          [0.000020899324947476842, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[0].exit.rate',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.9964951257161146,
      },
      {
        kind: 'eigenvalues',
        path: 'cases[1].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: [
          [0.616231424963903, 0],
          [0.15847951027714216, 0],
          [0.021218899027396675, 0],
          [0.0018319287646407843, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[1].exit.rate',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.4841326961259226,
      },
      {
        kind: 'eigenvalues',
        path: 'cases[2].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: [
          [0.8317399267032117, 0],
          [0.4827823515294028, 0],
          [0.2006557449414547, 0],
          [0.06211352963120962, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[2].exit.rate',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.1842354751238725,
      },
      {
        kind: 'eigenvalues',
        path: 'cases[3].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: [
          [0.9612026063406842, 0],
          [0.8537700982283445, 0],
          [0.7011697768602494, 0],
          [0.5329357897468054, 0],
        ],
      },
      {
        kind: 'number',
        path: 'cases[3].exit.rate',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: 0.03957006357472274,
      },
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 1.6070402141776612,
      },
      {
        kind: 'number',
        path: 'cases[1].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 2.782927019005899,
      },
      {
        kind: 'number',
        path: 'cases[2].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 6.913502645008099,
      },
      {
        kind: 'number',
        path: 'cases[3].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 31.415389522613726,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'gauss-walk-absorbing-from-0.1',
    title: 'Gaussian random walk on [0,1] with absorbing ends: eigenvalues and mean exit time: from 0.1',
    group: 'Random walks',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Random walk on [0, 1]',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['x'],
        parameters: {},
      },
      noise: {
        kind: 'gaussian',
        sigma: 1,
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
            at: [0.1],
          },
        },
      },
      sweep: [
        {
          over: 'noise.sigma',
          values: [1, 0.5, 0.25, 0.1],
        },
      ],
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 1.563947734888037,
      },
      {
        kind: 'number',
        path: 'cases[1].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 2.4115407915595837,
      },
      {
        kind: 'number',
        path: 'cases[2].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 4.627293467037347,
      },
      {
        kind: 'number',
        path: 'cases[3].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 15.465651325177287,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'gauss-walk-absorbing-from-anywhere',
    title: 'Gaussian random walk on [0,1] with absorbing ends: eigenvalues and mean exit time: from anywhere',
    group: 'Random walks',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Random walk on [0, 1]',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['x'],
        parameters: {},
      },
      noise: {
        kind: 'gaussian',
        sigma: 1,
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
      sweep: [
        {
          over: 'noise.sigma',
          values: [1, 0.5, 0.25, 0.1],
        },
      ],
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 1.5845419452949783,
      },
      {
        kind: 'number',
        path: 'cases[1].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 2.587947108340775,
      },
      {
        kind: 'number',
        path: 'cases[2].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 5.714173325359358,
      },
      {
        kind: 'number',
        path: 'cases[3].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-11,
        expected: 23.18678516977913,
      },
    ],
    source:
      "Nystrom's method on Gauss-Legendre nodes, two orders; K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997 (method)",
    basis: 'computed',
    seen: 'recomputed',
  },
  {
    id: 'gauss-walk-siegmund-sweep',
    title: 'Absorbing Gaussian walk: small-noise limit with Siegmund continuity correction',
    group: 'Random walks',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Random walk on [0, 1]',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['x'],
        parameters: {},
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
          count: 1,
        },
        exit: {
          start: {
            kind: 'point',
            at: [0.5],
          },
        },
      },
      sweep: [
        {
          over: 'noise.sigma',
          values: [0.02, 0.05, 0.1, 0.25],
        },
      ],
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.rate',
        tolerance: {
          relative: 1e-8,
        },
        known: 1e-9,
        expected: 0.0018850319892095642,
      },
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-10,
        expected: [[0.9981167435677548, 0]],
      },
      {
        kind: 'number',
        path: 'cases[1].exit.rate',
        tolerance: {
          relative: 1e-8,
        },
        known: 1e-9,
        expected: 0.011015398822829816,
      },
      {
        kind: 'eigenvalues',
        path: 'cases[1].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-10,
        expected: [[0.9890450485286321, 0]],
      },
      {
        kind: 'number',
        path: 'cases[2].exit.rate',
        tolerance: {
          relative: 1e-8,
        },
        known: 1e-9,
        expected: 0.03957006357472269,
      },
      {
        kind: 'eigenvalues',
        path: 'cases[2].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-10,
        expected: [[0.9612026063406842, 0]],
      },
      {
        kind: 'number',
        path: 'cases[3].exit.rate',
        tolerance: {
          relative: 1e-8,
        },
        known: 1e-9,
        expected: 0.18423547512387248,
      },
      {
        kind: 'eigenvalues',
        path: 'cases[3].spectrum.noisy',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-10,
        expected: [[0.8317399267032117, 0]],
      },
    ],
    source:
      "Exact eigenvalues by Nystrom's method; asymptote: D. Siegmund, Corrected diffusion approximations in certain random walk problems, Adv. Appl. Prob. 11, 1979, 701 (from memory)",
    basis: 'computed',
    seen: 'recomputed',
  },
];
