import { assembleFormula } from './assemble-formula';
import type { Operand, Program } from './assembler';
import { BLOCK_KERNELS, type BlockKernel } from './block-kernels';
import type { FormulaScope } from './formula-scope';
import type { FormulaTree } from './formula-tree';
import { fuseSteps } from './fuse-steps';

/** Points per block: a formula's arrays stay in the processor's first cache. */
const BLOCK = 512;

/** A formula ready to be evaluated over arrays. Not re-entrant: it keeps its working arrays between calls. */
export interface CompiledFormula {
  /**
   * Values at n = out.length points.
   * @param inputs one array of n values per variable, in the scope's order
   * @param parameters values in the scope's order
   * @param out written: n values, not-a-number where the formula is none; may be one of the inputs
   * @param time value of t, default 0
   * @throws RangeError where the numbers of inputs, parameters or points do not fit. Cost: a few ns per operation and point.
   */
  evaluate(inputs: readonly Float64Array[], parameters: readonly number[], out: Float64Array, time?: number): void;
  /**
   * Values and derivatives at n = out.length points. On a break the derivative is that of one side.
   * @param inputs one array of n values per variable, in the scope's order
   * @param parameters values in the scope's order
   * @param out written: n values; none of the inputs
   * @param slope written: n derivatives with respect to variable `by`; none of the inputs
   * @param by number of the variable, default 0
   * @param time value of t, default 0
   * @throws RangeError where the numbers of inputs, parameters or points do not fit, or `by` is no variable
   */
  evaluateWithSlope(
    inputs: readonly Float64Array[],
    parameters: readonly number[],
    out: Float64Array,
    slope: Float64Array,
    by?: number,
    time?: number,
  ): void;
}

type Runner = (
  inputs: readonly Float64Array[],
  parameters: readonly number[],
  outputs: readonly Float64Array[],
  time: number,
) => void;

/**
 * Compiles a formula: a list of loops over blocks of 512 points, no generated code. Parts without variables are computed
 * once per call; equal parts once per block; derivatives come by forward differentiation, exact to round-off.
 * @param tree the formula
 * @param scope its names
 * @returns the compiled formula; derivatives are set up at their first use
 * @throws RangeError naming a variable or a parameter that the scope does not have.
 *   Cost: linear in the tree; a logistic map's values take 2 to 4 times a hand-written loop.
 */
export function compileFormula(tree: FormulaTree, scope: FormulaScope): CompiledFormula {
  const { variables, parameters: names } = scope;
  const check = (inputs: readonly Float64Array[], parameters: readonly number[], outputs: readonly Float64Array[]) => {
    if (inputs.length !== variables.length) {
      throw new RangeError(`${inputs.length} inputs given, needed: ${variables.length} (${variables.join(', ')})`);
    }
    if (parameters.length !== names.length) {
      throw new RangeError(`${parameters.length} parameters given, needed: ${names.length} (${names.join(', ')})`);
    }
    const n = outputs[0].length;
    for (const array of [...inputs, ...outputs]) {
      if (array.length !== n) throw new RangeError(`An array of ${array.length} points given, needed: ${n} as in out`);
    }
  };
  const assembled = assembleFormula(tree, scope, null);
  const values = link(assembled.program, [assembled.value]);
  const slopes: Runner[] = [];
  return {
    evaluate(inputs, parameters, out, time = 0) {
      check(inputs, parameters, [out]);
      values(inputs, parameters, [out], time);
    },
    evaluateWithSlope(inputs, parameters, out, slope, by = 0, time = 0) {
      check(inputs, parameters, [out, slope]);
      if (!Number.isInteger(by) || by < 0 || by >= variables.length) {
        throw new RangeError(`by is ${by}; allowed: 0 to ${variables.length - 1}`);
      }
      slopes[by] ??= linkWithSlope(tree, scope, by);
      slopes[by](inputs, parameters, [out, slope], time);
    },
  };
}

function linkWithSlope(tree: FormulaTree, scope: FormulaScope, by: number): Runner {
  const { program, value, slope } = assembleFormula(tree, scope, by);
  if (slope !== null) return link(program, [value, slope]);
  program.scalars.push(() => 0);
  return link(program, [value, { scalar: program.scalars.length - 1, constant: 0 }]);
}

/** A step with its arrays found: -1 - k stands for output k, 0 … inputs-1 for an input, the rest for working arrays. */
interface LinkedStep {
  kernel: BlockKernel;
  reads: number[];
  write: number;
  scalars: number[];
  arrays: Float64Array[];
  offsets: number[];
  values: number[];
}

/** Gives every intermediate result a working array (reused once it is no longer read) and the results their outputs. */
function link(assembled: Program, results: readonly Operand[]): Runner {
  const program = fuseSteps(assembled, results);
  const { inputs } = program;
  const steps = program.steps.map((step) => ({ ...step }));
  const places = new Map<number, number>();
  results.forEach((result, k) => {
    const direct = 'vector' in result && result.vector >= inputs && !places.has(result.vector);
    if (direct) places.set(result.vector, -1 - k);
    else {
      const write = -1 - k;
      steps.push(
        'vector' in result
          ? { kernel: BLOCK_KERNELS.copyV, name: 'copyV', reads: [result.vector], scalars: [], write }
          : { kernel: BLOCK_KERNELS.fillS, name: 'fillS', reads: [], scalars: [result.scalar], write },
      );
    }
  });
  const lastUse = new Map<number, number>();
  steps.forEach((step, i) => {
    for (const read of step.reads) lastUse.set(read, i);
  });
  const free: number[] = [];
  let registers = 0;
  const place = (vector: number) => (vector < inputs ? vector : (places.get(vector) as number));
  const linked = steps.map((step, i): LinkedStep => {
    const reads = step.reads.map(place);
    for (const read of new Set(step.reads)) {
      if (read >= inputs && lastUse.get(read) === i && place(read) >= 0) free.push(place(read));
    }
    if (step.write >= inputs && !places.has(step.write)) places.set(step.write, free.pop() ?? inputs + registers++);
    const write = step.write < 0 ? step.write : place(step.write);
    return {
      kernel: step.kernel,
      reads,
      write,
      scalars: step.scalars,
      arrays: new Array(reads.length),
      offsets: reads.map(() => 0),
      values: step.scalars.map(() => 0),
    };
  });
  const working = Array.from({ length: registers }, () => new Float64Array(BLOCK));
  const scalars = new Float64Array(program.scalars.length);
  return (given, parameters, outputs, time) => run(program, linked, working, scalars, given, parameters, outputs, time);
}

function run(
  program: Program,
  steps: readonly LinkedStep[],
  working: readonly Float64Array[],
  scalars: Float64Array,
  inputs: readonly Float64Array[],
  parameters: readonly number[],
  outputs: readonly Float64Array[],
  time: number,
): void {
  for (let k = 0; k < scalars.length; k++) scalars[k] = program.scalars[k](scalars, parameters, time);
  const source = (place: number) =>
    place < 0 ? outputs[-1 - place] : place < program.inputs ? inputs[place] : working[place - program.inputs];
  for (const step of steps) {
    for (let k = 0; k < step.reads.length; k++) step.arrays[k] = source(step.reads[k]);
    for (let k = 0; k < step.scalars.length; k++) step.values[k] = scalars[step.scalars[k]];
  }
  const n = outputs[0].length;
  for (let start = 0; start < n; start += BLOCK) {
    const count = Math.min(BLOCK, n - start);
    for (const step of steps) {
      for (let k = 0; k < step.reads.length; k++) step.offsets[k] = step.reads[k] < program.inputs ? start : 0;
      const { write } = step;
      step.kernel(count, source(write), write < 0 ? start : 0, step.arrays, step.offsets, step.values);
    }
  }
}
