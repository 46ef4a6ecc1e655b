import { BLOCK_KERNELS, type BlockKernel, type BlockKernelName } from './block-kernels';

/** What an operation reads or gives: an array of values along the points, or one number for all of them. */
export type Operand = { vector: number } | { scalar: number; constant?: number };

/** One step of a program: `kernel` reads arrays and scalars by number and writes one array. */
export interface Step {
  kernel: BlockKernel;
  name: BlockKernelName;
  reads: number[];
  scalars: number[];
  write: number;
}

/** Numbers of arrays below this are the inputs, of which there are `inputs`; from it on they are results of steps. */
export interface Program {
  steps: Step[];
  inputs: number;
  /** computes scalar k from the parameters and the time; called in order */
  scalars: ((values: Float64Array, parameters: readonly number[], time: number) => number)[];
}

/**
 * Collects the steps of a program. Equal steps on equal operands are shared, operations on scalars alone move in front of
 * the loop, and what a constant 0 or 1 decides is left out.
 */
export class Assembler {
  readonly program: Program;
  private next: number;
  private readonly known = new Map<string, Operand>();

  /** @param inputs number of input arrays, which get the numbers 0 … inputs-1 */
  constructor(inputs: number) {
    this.program = { steps: [], inputs, scalars: [] };
    this.next = inputs;
  }

  /** A number known now. */
  constant(value: number): Operand {
    return this.remember(`c${Object.is(value, -0) ? '-0' : value}`, () => {
      this.program.scalars.push(() => value);
      return { scalar: this.program.scalars.length - 1, constant: value };
    });
  }

  /** A number computed once per call. `key` tells equal ones. */
  scalar(key: string, compute: Program['scalars'][number]): Operand {
    return this.remember(`s${key}`, () => {
      this.program.scalars.push(compute);
      return { scalar: this.program.scalars.length - 1 };
    });
  }

  /** One step: operands in the order of the kernel's letters; scalars where the kernel wants arrays are spread out. */
  step(name: BlockKernelName, vectors: Operand[], scalars: Operand[] = []): Operand {
    const reads = vectors.map((operand) => this.vector(operand));
    const values = scalars.map((operand) => ('scalar' in operand ? operand.scalar : -1));
    return this.remember(`${name}(${reads};${values})`, () => {
      const write = this.next++;
      this.program.steps.push({ kernel: BLOCK_KERNELS[name], name, reads, scalars: values, write });
      return { vector: write };
    });
  }

  /** An operand as an array. */
  vector(operand: Operand): number {
    if ('vector' in operand) return operand.vector;
    const filled = this.step('fillS', [], [operand]);
    return 'vector' in filled ? filled.vector : -1;
  }

  add(a: Operand, b: Operand): Operand {
    if (isConstant(a, 0)) return b;
    if (isConstant(b, 0)) return a;
    if ('scalar' in a && 'scalar' in b) return this.combine('+', a.scalar, b.scalar, (p, q) => p + q);
    if ('scalar' in a) return this.step('addVS', [b], [a]);
    return 'scalar' in b ? this.step('addVS', [a], [b]) : this.step('addVV', [a, b]);
  }

  subtract(a: Operand, b: Operand): Operand {
    if (isConstant(b, 0)) return a;
    if ('scalar' in a && 'scalar' in b) return this.combine('-', a.scalar, b.scalar, (p, q) => p - q);
    if ('scalar' in a) return this.step('subSV', [b], [a]);
    if ('scalar' in b) return this.step('addVS', [a], [this.negate(b)]);
    return this.step('subVV', [a, b]);
  }

  multiply(a: Operand, b: Operand): Operand {
    if (isConstant(a, 1)) return b;
    if (isConstant(b, 1)) return a;
    if ('scalar' in a && 'scalar' in b) return this.combine('*', a.scalar, b.scalar, (p, q) => p * q);
    if ('scalar' in a) return this.step('mulVS', [b], [a]);
    if ('scalar' in b) return this.step('mulVS', [a], [b]);
    return a.vector === b.vector ? this.step('squareV', [a]) : this.step('mulVV', [a, b]);
  }

  divide(a: Operand, b: Operand): Operand {
    if (isConstant(b, 1)) return a;
    if ('scalar' in a && 'scalar' in b) return this.combine('/', a.scalar, b.scalar, (p, q) => p / q);
    if ('scalar' in a) return this.step('divSV', [b], [a]);
    return 'scalar' in b ? this.step('divVS', [a], [b]) : this.step('divVV', [a, b]);
  }

  negate(a: Operand): Operand {
    return 'constant' in a ? this.constant(-(a.constant as number)) : this.multiply(this.constant(-1), a);
  }

  private combine(sign: string, a: number, b: number, f: (p: number, q: number) => number): Operand {
    const [p, q] = [this.constants.get(a), this.constants.get(b)];
    if (p !== undefined && q !== undefined) return this.constant(f(p, q));
    return this.scalar(`${a}${sign}${b}`, (values) => f(values[a], values[b]));
  }

  private readonly constants = new Map<number, number>();

  private remember(key: string, make: () => Operand): Operand {
    let operand = this.known.get(key);
    if (operand === undefined) {
      operand = make();
      this.known.set(key, operand);
      if ('constant' in operand) this.constants.set(operand.scalar, operand.constant as number);
    }
    return operand;
  }
}

function isConstant(operand: Operand, value: number): boolean {
  return 'scalar' in operand && operand.constant === value;
}
