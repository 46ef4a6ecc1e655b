import { describe, expect, it } from 'vitest';
import { parseStudy, run } from '@/kernels';

/**
 * Tent map with reflecting ends: cos(kπx) goes to cos(kπx/2) for even k and to nothing for odd k, noise only damps it, so
 * every mode but the constant dies after finitely many steps: the spectrum is {1, 0} for any noise. (Identity.)
 */
describe('the tent map with reflecting ends', () => {
  it.each([0.1, 0.02, 0.01, 0.005])('has no eigenvalue beside 1 at sigma %d, with error bars and without', (sigma) => {
    const { study } = parseStudy({
      format: 'smirr-study',
      version: 1,
      system: { type: 'map', id: 'tent', parameters: { s: 2 } },
      noise: { kind: 'gaussian', sigma },
      domain: [{ from: 0, to: 1, ends: 'reflecting' }],
      ask: { spectrum: { count: 8 } },
    });
    if (!study) throw new Error('the study was refused');
    for (const uncertainties of [true, false]) {
      const { noisy, gap } = run(study, { runtime: 'test', uncertainties }).cases[0].spectrum ?? {};
      expect(noisy?.map((e) => e.modulus)).toEqual([expect.closeTo(1, 12)]);
      expect(gap).toBeNull();
    }
  });
});
