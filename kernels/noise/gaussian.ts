import { erfc } from '../core/erf';
import type { NoiseKind } from './noise-kind';

const ROOT_TWO_PI = Math.sqrt(2 * Math.PI);

/** Gaussian noise of standard deviation sigma per step: density exp(−d²/2σ²)/(σ√2π). */
export const gaussian: NoiseKind = {
  id: 'gaussian',
  title: 'Gaussian',
  density: (d, sigma) => Math.exp((-0.5 * d * d) / (sigma * sigma)) / (sigma * ROOT_TWO_PI),
  tail: (d, sigma) => 0.5 * erfc(d / (sigma * Math.SQRT2)),
  transform: (q, sigma) => Math.exp(-0.5 * q * q * sigma * sigma),
  reach: 8.9, // exp(−39.6) = 6e-18
  reachOf: (part) => Math.sqrt(-2 * Math.log(part)),
  fullReach: 38.5, // exp(−741) = 1e-322
};
