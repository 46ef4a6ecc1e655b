import type { PublishedCheck } from './published-check';

export const chartChecks: readonly PublishedCheck[] = [
  {
    id: 'ewma-arl-lambda-0.4',
    title: 'Weighted moving average chart, mean run lengths: lambda = 0.4',
    group: 'Control charts',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Weighted moving average between limits',
      system: {
        type: 'map',
        variables: ['z'],
        formulas: ['(1 - lam)*z + lam*delta'],
        parameters: {
          lam: 0.4,
          delta: 0,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.4,
      },
      domain: [
        {
          from: -1.527,
          to: 1.527,
          ends: 'absorbing',
        },
      ],
      ask: {
        exit: {
          start: {
            kind: 'point',
            at: [0],
          },
        },
        spectrum: {
          count: 1,
        },
      },
      sweep: [
        {
          over: 'parameters.delta',
          values: [0, 0.25, 0.5, 0.75, 1, 1.5, 2, 2.5, 3, 4],
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 499.9513386420918,
      },
      {
        kind: 'number',
        path: 'cases[1].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 223.72781326663585,
      },
      {
        kind: 'number',
        path: 'cases[2].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 71.20050200529107,
      },
      {
        kind: 'number',
        path: 'cases[3].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 28.418384817503576,
      },
      {
        kind: 'number',
        path: 'cases[4].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 14.262764263052599,
      },
      {
        kind: 'number',
        path: 'cases[5].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 5.87494176263802,
      },
      {
        kind: 'number',
        path: 'cases[6].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 3.521539198798902,
      },
      {
        kind: 'number',
        path: 'cases[7].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 2.5391503036251004,
      },
      {
        kind: 'number',
        path: 'cases[8].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 2.018629564894315,
      },
      {
        kind: 'number',
        path: 'cases[9].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 1.4398958015543615,
      },
      {
        kind: 'number',
        path: 'cases[0].spectrum.noisy[0].re',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-10,
        expected: 0.9979931191373137,
      },
    ],
    source:
      "J. M. Lucas & M. S. Saccucci, Exponentially weighted moving average control schemes, Technometrics 32, 1990, 1, printed to three or four digits (from memory); digits beyond by Nystrom's method on 120 and 180 nodes; integral equation: S. V. Crowder, Technometrics 29, 1987, 401",
    basis: 'published',
    seen: 'recomputed',
  },
  {
    id: 'ewma-arl-lambda-0.2',
    title: 'Weighted moving average chart, mean run lengths: lambda = 0.2',
    group: 'Control charts',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Weighted moving average between limits',
      system: {
        type: 'map',
        variables: ['z'],
        formulas: ['(1 - lam)*z + lam*delta'],
        parameters: {
          lam: 0.2,
          delta: 0,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.2,
      },
      domain: [
        {
          from: -0.9873333333333335,
          to: 0.9873333333333335,
          ends: 'absorbing',
        },
      ],
      ask: {
        exit: {
          start: {
            kind: 'point',
            at: [0],
          },
        },
        spectrum: {
          count: 1,
        },
      },
      sweep: [
        {
          over: 'parameters.delta',
          values: [0, 0.25, 0.5, 0.75, 1, 1.5, 2, 2.5, 3, 4],
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 499.73512216525205,
      },
      {
        kind: 'number',
        path: 'cases[1].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 150.21640291961677,
      },
      {
        kind: 'number',
        path: 'cases[2].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 41.76439576247046,
      },
      {
        kind: 'number',
        path: 'cases[3].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 18.14962344632115,
      },
      {
        kind: 'number',
        path: 'cases[4].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 10.541665796564143,
      },
      {
        kind: 'number',
        path: 'cases[5].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 5.500648698970152,
      },
      {
        kind: 'number',
        path: 'cases[6].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 3.7434390605394383,
      },
      {
        kind: 'number',
        path: 'cases[7].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 2.880269675443349,
      },
      {
        kind: 'number',
        path: 'cases[8].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 2.3809034840803998,
      },
      {
        kind: 'number',
        path: 'cases[9].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 1.864365659693068,
      },
      {
        kind: 'number',
        path: 'cases[0].spectrum.noisy[0].re',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-10,
        expected: 0.9979830311684382,
      },
    ],
    source:
      "J. M. Lucas & M. S. Saccucci, Exponentially weighted moving average control schemes, Technometrics 32, 1990, 1, printed to three or four digits (from memory); digits beyond by Nystrom's method on 120 and 180 nodes; integral equation: S. V. Crowder, Technometrics 29, 1987, 401",
    basis: 'published',
    seen: 'recomputed',
  },
  {
    id: 'ewma-arl-lambda-0.1',
    title: 'Weighted moving average chart, mean run lengths: lambda = 0.1',
    group: 'Control charts',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Weighted moving average between limits',
      system: {
        type: 'map',
        variables: ['z'],
        formulas: ['(1 - lam)*z + lam*delta'],
        parameters: {
          lam: 0.1,
          delta: 0,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.1,
      },
      domain: [
        {
          from: -0.6455758751117608,
          to: 0.6455758751117608,
          ends: 'absorbing',
        },
      ],
      ask: {
        exit: {
          start: {
            kind: 'point',
            at: [0],
          },
        },
        spectrum: {
          count: 1,
        },
      },
      sweep: [
        {
          over: 'parameters.delta',
          values: [0, 0.25, 0.5, 0.75, 1, 1.5, 2, 2.5, 3, 4],
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
    },
    compare: [
      {
        kind: 'number',
        path: 'cases[0].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 499.579550081967,
      },
      {
        kind: 'number',
        path: 'cases[1].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 106.32185297837552,
      },
      {
        kind: 'number',
        path: 'cases[2].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 31.297435196282724,
      },
      {
        kind: 'number',
        path: 'cases[3].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 15.847543977991906,
      },
      {
        kind: 'number',
        path: 'cases[4].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 10.330665155223025,
      },
      {
        kind: 'number',
        path: 'cases[5].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 6.08418434210395,
      },
      {
        kind: 'number',
        path: 'cases[6].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 4.362253413742446,
      },
      {
        kind: 'number',
        path: 'cases[7].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 3.4416982208767357,
      },
      {
        kind: 'number',
        path: 'cases[8].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 2.8680035123158474,
      },
      {
        kind: 'number',
        path: 'cases[9].exit.meanTimeFrom',
        tolerance: {
          relative: 1e-9,
        },
        known: 1e-10,
        expected: 2.1930953899239536,
      },
      {
        kind: 'number',
        path: 'cases[0].spectrum.noisy[0].re',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-10,
        expected: 0.9979668346873465,
      },
    ],
    source:
      "J. M. Lucas & M. S. Saccucci, Exponentially weighted moving average control schemes, Technometrics 32, 1990, 1, printed to three or four digits (from memory); digits beyond by Nystrom's method on 120 and 180 nodes; integral equation: S. V. Crowder, Technometrics 29, 1987, 401",
    basis: 'published',
    seen: 'recomputed',
  },
];
