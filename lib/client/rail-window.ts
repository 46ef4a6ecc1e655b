import { type Bounds, clamp, threeDigits } from '@/lib/shared/step-number';

/** Narrowest window of the rail: a factor of 1.5 from end to end. */
const NARROWEST = 1.5;

/** A window zoomed about one noise level, which keeps its place in it; within the levels that can be computed. */
export function zoomed(window: Bounds, about: number, factor: number, limits: Bounds): Bounds {
  const centre = clamp(about, window);
  const span = Math.log(window.max / window.min);
  const wanted = clamp(span * factor, { min: Math.log(NARROWEST), max: Math.log(limits.max / limits.min) });
  const below = Math.log(centre / window.min) * (wanted / span);
  return placed(centre * Math.exp(-below), wanted, limits);
}

/** The window moved, at its width, until it holds a noise level. */
export function holding(window: Bounds, sigma: number, limits: Bounds): Bounds {
  if (sigma >= window.min && sigma <= window.max) return window;
  const span = Math.log(window.max / window.min);
  return placed(sigma < window.min ? sigma / 1.2 : (sigma * 1.2) / Math.exp(span), span, limits);
}

function placed(from: number, span: number, limits: Bounds): Bounds {
  const min = clamp(from, { min: limits.min, max: Math.max(limits.max / Math.exp(span), limits.min) });
  return { min: threeDigits(min), max: threeDigits(Math.min(min * Math.exp(span), limits.max)) };
}
