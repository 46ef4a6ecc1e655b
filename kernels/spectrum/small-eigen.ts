import { EigenvalueDecomposition, inverse, Matrix } from 'ml-matrix';

/** Eigenpairs of a small real matrix, largest modulus first, conjugate partners side by side (positive imaginary part first). */
export interface SmallEigen {
  readonly re: Float64Array;
  readonly im: Float64Array;
  /** right vectors in real form: a real pair has column j; a conjugate pair has real part j and imaginary part j + 1 */
  readonly vectors: Matrix;
  /** condition number 1/|⟨left, right⟩| of each, from the inverse of the vectors; Infinity where they are dependent */
  readonly condition: Float64Array;
}

/**
 * Eigenpairs of a small dense matrix with ml-matrix, sorted by modulus.
 *
 * @param matrix m × m, m up to some hundred; cost about 25 m³
 * @returns values, vectors and condition numbers; vectors have unit length (a pair's real and imaginary part together)
 */
export function smallEigen(matrix: Matrix): SmallEigen {
  const m = matrix.rows;
  const decomposition = new EigenvalueDecomposition(matrix);
  const re0 = decomposition.realEigenvalues;
  const im0 = decomposition.imaginaryEigenvalues;
  const vectors0 = decomposition.eigenvectorMatrix;
  const blocks: number[][] = [];
  for (let j = 0; j < m; j++) {
    if (im0[j] !== 0 && j + 1 < m && im0[j + 1] === -im0[j]) {
      blocks.push([j, j + 1]);
      j++;
    } else blocks.push([j]);
  }
  const size = (b: number[]) => Math.hypot(re0[b[0]], im0[b[0]]);
  blocks.sort((a, b) => size(b) - size(a));
  const re = new Float64Array(m);
  const im = new Float64Array(m);
  const vectors = new Matrix(m, m);
  let at = 0;
  for (const block of blocks) {
    let norm = 0;
    for (const j of block) for (let i = 0; i < m; i++) norm += vectors0.get(i, j) ** 2;
    norm = Math.sqrt(norm) || 1;
    const flip = block.length === 2 && im0[block[0]] < 0 ? -1 : 1;
    block.forEach((j, part) => {
      re[at + part] = re0[j];
      im[at + part] = part === 0 ? Math.abs(im0[j]) : -Math.abs(im0[j]);
      for (let i = 0; i < m; i++) vectors.set(i, at + part, ((part === 1 ? flip : 1) * vectors0.get(i, j)) / norm);
    });
    at += block.length;
  }
  return { re, im, vectors, condition: conditions(vectors, im) };
}

/** 1/|⟨left, right⟩| with unit vectors: the rows of V⁻¹ are left vectors already scaled so that ⟨left, right⟩ = 1. */
function conditions(vectors: Matrix, im: Float64Array): Float64Array {
  const m = vectors.rows;
  const out = new Float64Array(m).fill(Number.POSITIVE_INFINITY);
  let dual: Matrix;
  try {
    dual = inverse(vectors);
  } catch {
    return out; // exactly dependent vectors: a defective matrix
  }
  for (let j = 0; j < m; j++) {
    let norm = 0;
    const pair = im[j] !== 0;
    // real form (a, b) of a pair: the complex left vector is (row_a − i row_b)/2
    for (let i = 0; i < m; i++)
      norm += pair ? (dual.get(j, i) ** 2 + dual.get(j + 1, i) ** 2) / 4 : dual.get(j, i) ** 2;
    out[j] = Math.sqrt(norm);
    if (pair) out[++j] = Math.sqrt(norm);
  }
  return out;
}
