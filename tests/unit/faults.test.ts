import { existsSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { faults } from '../faults/faults.mjs';

describe('the checked-in faults', () => {
  it.each(faults.map((f) => [f.what, f] as const))('break a line that stands once: %s', (_, fault) => {
    expect(readFileSync(fault.file, 'utf8').split(fault.find).length - 1).toBe(1);
    expect(fault.replace).not.toBe(fault.find);
    expect(existsSync(fault.testFile)).toBe(true);
  });

  it('are a dozen and more', () => {
    expect(faults.length).toBeGreaterThanOrEqual(12);
  });
});
