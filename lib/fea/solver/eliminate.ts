/** Columns eliminated together. Eight rank updates in one pass keep the arithmetic ahead of the memory. */
const BLOCK = 8;
/** Stands in for a pivot of exactly zero, so that the failure shows as huge numbers, not as NaN. */
const TINY = 1e-30;

/**
 * Partial LDL^T of a dense symmetric block held by columns (lower triangle, order `size`): eliminates the first
 * `pivots` columns, leaves D on their diagonal and the Schur complement in the rest. Returns the number of pivots
 * that are not positive: the equilibrium is unstable or the part is loose.
 * Method: right-looking by blocks of eight columns, left-looking within a block, no pivoting.
 * Source: Golub and Van Loan, Matrix Computations, 4.1 and 4.2 (from memory). Limit: without pivoting accuracy is
 * lost near a singular matrix; stable for the definite matrices of stable equilibria.
 */
export function eliminate(block: Float64Array, size: number, pivots: number): number {
  let notPositive = 0;
  for (let first = 0; first < pivots; first += BLOCK) {
    const last = Math.min(pivots, first + BLOCK);
    for (let k = first; k < last; k++) notPositive += finishColumn(block, size, first, k);
    if (last - first === BLOCK) updateByEight(block, size, first);
    else for (let k = first; k < last; k++) updateByOne(block, size, k, last);
  }
  return notPositive;
}

/** Brings column k up to date within its block and divides it by its pivot. Returns 1 if that is not positive. */
function finishColumn(block: Float64Array, size: number, first: number, k: number): number {
  const column = k * size;
  for (let j = first; j < k; j++) {
    const other = j * size;
    const scale = block[other + k]! * block[other + j]!;
    if (scale === 0) continue;
    for (let i = k; i < size; i++) block[column + i]! -= scale * block[other + i]!;
  }
  const pivot = block[column + k]!;
  if (pivot === 0) block[column + k] = TINY;
  const inverse = 1 / block[column + k]!;
  for (let i = k + 1; i < size; i++) block[column + i]! *= inverse;
  return pivot > 0 ? 0 : 1;
}

/** Subtracts the share of one finished column from the columns from `from` on. */
function updateByOne(block: Float64Array, size: number, k: number, from: number): void {
  const column = k * size;
  for (let j = from; j < size; j++) {
    const target = j * size;
    const scale = block[column + j]! * block[column + k]!;
    for (let i = j; i < size; i++) block[target + i]! -= scale * block[column + i]!;
  }
}

/** Subtracts the share of eight finished columns in one pass over the rest. */
function updateByEight(f: Float64Array, size: number, first: number): void {
  const c0 = first * size;
  const c1 = c0 + size;
  const c2 = c1 + size;
  const c3 = c2 + size;
  const c4 = c3 + size;
  const c5 = c4 + size;
  const c6 = c5 + size;
  const c7 = c6 + size;
  const step = size + 1;
  const d = c0 + first;
  for (let j = first + BLOCK; j < size; j++) {
    const a0 = f[c0 + j]! * f[d]!;
    const a1 = f[c1 + j]! * f[d + step]!;
    const a2 = f[c2 + j]! * f[d + 2 * step]!;
    const a3 = f[c3 + j]! * f[d + 3 * step]!;
    const a4 = f[c4 + j]! * f[d + 4 * step]!;
    const a5 = f[c5 + j]! * f[d + 5 * step]!;
    const a6 = f[c6 + j]! * f[d + 6 * step]!;
    const a7 = f[c7 + j]! * f[d + 7 * step]!;
    const target = j * size;
    for (let i = j; i < size; i++) {
      f[target + i]! -=
        a0 * f[c0 + i]! +
        a1 * f[c1 + i]! +
        a2 * f[c2 + i]! +
        a3 * f[c3 + i]! +
        a4 * f[c4 + i]! +
        a5 * f[c5 + i]! +
        a6 * f[c6 + i]! +
        a7 * f[c7 + i]!;
    }
  }
}
