import type { PublishedCheck } from './published-check';

export const circleChecks: readonly PublishedCheck[] = [
  {
    id: 'doubling-gauss-evolution-evolution',
    title: 'Doubling map on the circle with Gaussian noise: closed-form density evolution',
    group: 'Maps of the circle',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Doubling map, evolution',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['2*x'],
        parameters: {},
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
        tolerance: 1.0000000000000001e-11,
      },
      ask: {
        density: {
          start: {
            kind: 'formula',
            formula: '1 + (0.5)*cos(1*2*pi*x) + (0.3)*cos(2*2*pi*x) + (0.15)*cos(4*2*pi*x)',
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
          absolute: 1e-10,
        },
        known: null,
        at: [0, 0.1, 0.3, 0.5, 0.77],
        expected: [1.3143667260337488, 1.2202749684227727, 0.8688022837850151, 0.8218454955844248, 0.9648982071059997],
      },
      {
        kind: 'density',
        path: 'cases[0].density[at=2]',
        tolerance: {
          absolute: 1e-10,
        },
        known: null,
        at: [0, 0.1, 0.3, 0.5, 0.77],
        expected: [1.0559061758280157, 1.0452290463353786, 0.9827240415786292, 0.9440938241719843, 1.0070069017927397],
      },
      {
        kind: 'density',
        path: 'cases[0].density[at=3]',
        tolerance: {
          absolute: 1e-10,
        },
        known: null,
        at: [0, 0.1, 0.3, 0.5, 0.77],
        expected: [1, 1, 1, 1, 1],
      },
    ],
    source:
      'Fourier coefficients obey c(n+1,k) = exp(-2 pi^2 sigma^2 k^2) c(n,2k); A. Lasota & M. C. Mackey, Chaos, Fractals, and Noise, 2nd ed., Springer 1994, for transfer operators (from memory)',
    basis: 'exact',
    seen: 'identity',
  },
  {
    id: 'doubling-gauss-nilpotent-amplitudes',
    title: 'Noisy doubling map: finite-time exact decay to uniform (nilpotent spectrum {1,0,0,...}): amplitudes',
    group: 'Maps of the circle',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Doubling map, one mode',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['2*x'],
        parameters: {},
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.05,
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
        density: {
          start: {
            kind: 'formula',
            formula: '1 + (1)*cos(8*2*pi*x)',
          },
          at: [1, 2, 3, 4],
        },
      },
    },
    compare: [
      {
        kind: 'mean',
        path: 'cases[0].density[at=1]',
        tolerance: {
          absolute: 1e-12,
        },
        known: null,
        of: '2*cos(2*pi*4*x)',
        expected: 0.45404073872724504,
      },
      {
        kind: 'mean',
        path: 'cases[0].density[at=2]',
        tolerance: {
          absolute: 1e-12,
        },
        known: null,
        of: '2*cos(2*pi*2*x)',
        expected: 0.3727078388534379,
      },
      {
        kind: 'mean',
        path: 'cases[0].density[at=3]',
        tolerance: {
          absolute: 1e-12,
        },
        known: null,
        of: '2*cos(2*pi*1*x)',
        expected: 0.35476188461766306,
      },
      {
        kind: 'mean',
        path: 'cases[0].density[at=4]',
        tolerance: {
          absolute: 1e-12,
        },
        known: null,
        of: '2*cos(2*pi*1*x)',
        expected: 0,
      },
    ],
    source: 'Fourier coefficients obey c(n+1,k) = exp(-2 pi^2 sigma^2 k^2) c(n,2k): every mode ends',
    basis: 'exact',
    seen: 'identity',
  },
  {
    id: 'doubling-gauss-nilpotent-spectrum',
    title: 'Noisy doubling map: finite-time exact decay to uniform (nilpotent spectrum {1,0,0,...}): spectrum',
    group: 'Maps of the circle',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Doubling map, spectrum',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['2*x'],
        parameters: {},
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.05,
      },
      domain: [
        {
          from: 0,
          to: 1,
          ends: 'periodic',
        },
      ],
      ask: {
        spectrum: {
          count: 4,
        },
      },
    },
    compare: [
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 0.02,
        },
        known: null,
        expected: [
          [1, 0],
          [0, 0],
          [0, 0],
          [0, 0],
        ],
      },
    ],
    source: 'Fourier coefficients obey c(n+1,k) = exp(-2 pi^2 sigma^2 k^2) c(n,2k): every mode ends',
    basis: 'exact',
    seen: 'identity',
  },
  {
    id: 'rotation-gauss-spectrum',
    title: 'Rigid rotation with Gaussian noise: full spectrum',
    group: 'Maps of the circle',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Rotation',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['x + a'],
        parameters: {
          a: 0.6180339887498949,
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
        tolerance: 1.0000000000000001e-11,
      },
      ask: {
        spectrum: {
          count: 11,
        },
      },
    },
    compare: [
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-10,
        },
        known: 1e-14,
        expected: [
          [1, 0],
          [-0.6052830452102861, 0.5544888514771026],
          [-0.6052830452102861, -0.5544888514771026],
          [0.03969484063425345, -0.452302235292955],
          [0.03969484063425345, 0.452302235292955],
          [0.10296278787769089, 0.13429672405106588],
          [0.10296278787769089, -0.13429672405106588],
          [-0.04184939383737592, -0.007402568513064632],
          [-0.04184939383737592, 0.007402568513064632],
        ],
      },
    ],
    source:
      'Characteristic function of the wrapped normal law; K. V. Mardia & P. E. Jupp, Directional Statistics, Wiley 2000 (from memory)',
    basis: 'exact',
    seen: 'from memory',
  },
  {
    id: 'rotation-gauss-b-spectrum',
    title: 'Rigid rotation with Gaussian noise: full spectrum',
    group: 'Maps of the circle',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Rotation',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['x + a'],
        parameters: {
          a: 0.3,
        },
      },
      noise: {
        kind: 'gaussian',
        sigma: 0.06,
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
        tolerance: 1.0000000000000001e-11,
      },
      ask: {
        spectrum: {
          count: 11,
        },
      },
    },
    compare: [
      {
        kind: 'eigenvalues',
        path: 'cases[0].spectrum.noisy',
        tolerance: {
          absolute: 1e-10,
        },
        known: 1e-14,
        expected: [
          [1, 0],
          [-0.28781995306597846, -0.8858187312217163],
          [-0.28781995306597846, 0.8858187312217163],
          [-0.6088520608252109, 0.44235691545322237],
          [-0.6088520608252109, -0.44235691545322237],
          [0.4267803842377719, 0.31007409926721025],
          [0.4267803842377719, -0.31007409926721025],
          [0.09912858505943545, -0.30508641430090094],
          [0.09912858505943545, 0.30508641430090094],
        ],
      },
    ],
    source:
      'Characteristic function of the wrapped normal law; K. V. Mardia & P. E. Jupp, Directional Statistics, Wiley 2000 (from memory)',
    basis: 'exact',
    seen: 'from memory',
  },
  {
    id: 'sine-circle-map',
    title: 'Noisy sine circle map: eigenvalues, rotation number, Lyapunov exponent',
    group: 'Maps of the circle',
    study: {
      format: 'smirr-study',
      version: 1,
      title: 'Sine circle map',
      system: {
        type: 'map',
        variables: ['x'],
        formulas: ['x + Omega - K/(2*pi)*sin(2*pi*x)'],
        parameters: {
          Omega: 0.2,
          K: 0.9,
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
          ends: 'periodic',
        },
      ],
      grid: {
        points: 'auto',
        tolerance: 1e-11,
      },
      ask: {
        spectrum: {
          count: 9,
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
          [0.5206666526856423, 0.7052137447323862],
          [0.520666652685641, -0.7052137447323871],
          [-0.22765163946926112, -0.5780111889354882],
          [-0.22765163946926043, 0.5780111889354864],
          [-0.37487942075536856, -0.03944790344494676],
          [-0.374879420755367, 0.03944790344494618],
        ],
      },
      {
        kind: 'mean',
        path: 'cases[0].stationary',
        tolerance: {
          absolute: 1e-9,
        },
        known: null,
        of: 'Omega - K/(2*pi)*sin(2*pi*x)',
        expected: 0.14567875481903036,
      },
      {
        kind: 'number',
        path: 'cases[0].lyapunov.value',
        tolerance: {
          absolute: 1e-9,
        },
        known: 1e-11,
        expected: -0.05051378357605274,
      },
    ],
    source:
      'Jacobi-Anger expansion (DLMF 10.12.1): matrix elements exp(-2 pi^2 sigma^2 k^2 - 2 pi i k Omega) J_(k-j)(kK), compared with a Nystrom matrix of 1600 points: moduli differ by 2e-15',
    basis: 'computed',
    seen: 'recomputed',
  },
];
