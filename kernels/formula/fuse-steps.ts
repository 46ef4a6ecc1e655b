import type { Operand, Program, Step } from './assembler';
import { BLOCK_KERNELS } from './block-kernels';

/** An operand written as scale*array + shift, with numbers of scalars; exact, since one of the two is trivial. */
interface Affine {
  read: number;
  scale: number;
  shift: number;
}

/**
 * Merges multiplications by a scalar and additions of one into the products, sums and blends that read them: a pass over
 * memory costs more than the arithmetic done twice. No rounding changes, since scale*a + 0 and ±1*a + shift are what the
 * separate steps compute (but for the sign of a zero).
 * @param program the steps; new in the result, the scalars may grow in place
 * @param results operands that must stay available
 * @returns a program with the same results in fewer steps; steps that nothing reads any more are left out. Cost: linear.
 */
export function fuseSteps(program: Program, results: readonly Operand[]): Program {
  const made = new Map(program.steps.map((step) => [step.write, step]));
  const constants = new Map<number, number>();
  const constant = (value: number): number => {
    let slot = constants.get(value);
    if (slot === undefined) {
      slot = program.scalars.push(() => value) - 1;
      constants.set(value, slot);
    }
    return slot;
  };
  const affine = (read: number): Affine => {
    const step = made.get(read);
    if (step?.name === 'mulVS') return { read: step.reads[0], scale: step.scalars[0], shift: constant(0) };
    if (step?.name === 'addVS') return { read: step.reads[0], scale: constant(1), shift: step.scalars[0] };
    if (step?.name === 'subSV') return { read: step.reads[0], scale: constant(-1), shift: step.scalars[0] };
    return { read, scale: constant(1), shift: constant(0) };
  };
  const steps = program.steps.map((step): Step => {
    if (step.name !== 'mulVV' && step.name !== 'blendVVSS') return step;
    const [a, b] = step.reads.map(affine);
    if (a.read === step.reads[0] && b.read === step.reads[1]) return step;
    const name = step.name === 'mulVV' ? 'mulAffine' : 'blendAffine';
    const scalars = [a.scale, a.shift, b.scale, b.shift, ...step.scalars];
    return { kernel: BLOCK_KERNELS[name], name, reads: [a.read, b.read], scalars, write: step.write };
  });
  return { ...program, steps: withoutUnread(steps, results) };
}

function withoutUnread(steps: readonly Step[], results: readonly Operand[]): Step[] {
  const needed = new Set(results.map((result) => ('vector' in result ? result.vector : -1)));
  const kept: Step[] = [];
  for (let k = steps.length - 1; k >= 0; k--) {
    if (!needed.has(steps[k].write)) continue;
    for (const read of steps[k].reads) needed.add(read);
    kept.push(steps[k]);
  }
  return kept.reverse();
}
