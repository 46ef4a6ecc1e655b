import { describe, expect, it } from 'vitest';
import {
  type ExploreState,
  edited,
  faultAt,
  firstState,
  pictured,
  redone,
  refused,
  undone,
} from '@/lib/client/explore-core';
import { FIRST_STUDY } from '@/lib/shared/bench-study';
import type { Result, ResultCase, StudyFile } from '@/lib/shared/study-types';

const at = (sigma: number): StudyFile => ({ ...FIRST_STUDY, noise: { kind: 'gaussian', sigma } });
const apply = (state: ExploreState, change: Partial<ExploreState>): ExploreState => ({ ...state, ...change });
const sigma = (state: ExploreState) => state.study.noise.sigma;

describe('undo', () => {
  it('takes a whole gesture back as one step, and redo brings it forth again', () => {
    let state = firstState(at(0.01));
    for (const value of [0.02, 0.03, 0.04]) state = apply(state, edited(state, at(value), true));
    state = apply(state, { moving: false });
    state = apply(state, edited(state, at(0.5), false));
    state = apply(state, undone(state));
    expect(sigma(state)).toBe(0.04);
    state = apply(state, undone(state));
    expect(sigma(state)).toBe(0.01);
    expect(undone(state)).toEqual({});
    state = apply(state, redone(state));
    expect(sigma(state)).toBe(0.04);
    state = apply(state, redone(state));
    expect(sigma(state)).toBe(0.5);
    expect(redone(state)).toEqual({});
  });

  it('a new edit forgets what was undone', () => {
    let state = firstState(at(0.01));
    state = apply(state, edited(state, at(0.02), false));
    state = apply(state, undone(state));
    state = apply(state, edited(state, at(0.03), false));
    expect(state.future).toEqual([]);
  });
});

function resultOf(more: Partial<ResultCase>): Result {
  const grid = { points: [8], x: [[]], weights: [[]], resolved: true, compared: [] };
  return { cases: [{ at: {}, grid, ...more }], warnings: [] } as unknown as Result;
}

const deterministic = { x: [[0.5]], values: [1], method: 'cells' as const };
const stationary = { values: [1], mean: [], covariance: [], entropy: null, quasi: false, uncertainty: null };

describe('the picture', () => {
  const full = pictured(
    firstState(at(0.01)),
    resultOf({ stationary: { ...stationary, deterministic } }),
    at(0.01),
    'full',
    0.1,
  );
  const state = apply(firstState(at(0.01)), full);

  it('keeps the system without noise while sigma moves', () => {
    const live = pictured(state, resultOf({ stationary }), at(0.02), 'live', 0.01);
    expect(live.picture?.case.stationary?.deterministic).toBe(deterministic);
    expect(live.picture?.settled).toBe(false);
  });

  it('drops it when a parameter moves, for it belongs to another system', () => {
    const moved = { ...at(0.02), system: { ...FIRST_STUDY.system, parameters: { r: 3.7 } } };
    const live = pictured(state, resultOf({ stationary }), moved, 'live', 0.01);
    expect(live.picture?.case.stationary?.deterministic).toBeUndefined();
  });

  it('stays when a study is refused, and the fault stands at its field', () => {
    const after = apply(state, refused([{ path: 'domain.0.from', message: 'from must be below to' }]));
    expect(after.picture).toBe(state.picture);
    expect(faultAt(after, 'domain')?.message).toBe('from must be below to');
    expect(faultAt(after, 'noise.sigma')).toBeUndefined();
  });

  it('while it moves the mean exit time is one over the mass lost per step, as far as that is known', () => {
    const lossy = (value: number) => ({
      ...stationary,
      lostPerStep: { value, uncertainty: 0, kind: 'bound' as const },
    });
    const live = pictured(state, resultOf({ stationary: lossy(0.001) }), at(0.02), 'live', 0.01);
    expect(live.picture?.case.exit?.meanTime?.value).toBeCloseTo(1000, 9);
    const rare = pictured(state, resultOf({ stationary: lossy(1e-12) }), at(0.02), 'live', 0.01);
    expect(rare.picture?.case.exit).toBeUndefined();
  });
});
