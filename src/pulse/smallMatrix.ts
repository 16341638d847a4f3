// Small square matrices, row by row in one array: product, transform of a vector, exponential.

export function identity(size: number): Float64Array {
  const a = new Float64Array(size * size);
  for (let i = 0; i < size; i += 1) a[i * size + i] = 1;
  return a;
}

export function multiply(a: Float64Array, b: Float64Array, size: number): Float64Array<ArrayBuffer> {
  const out = new Float64Array(size * size);
  for (let i = 0; i < size; i += 1)
    for (let k = 0; k < size; k += 1) {
      const left = a[i * size + k]!;
      if (left === 0) continue;
      for (let j = 0; j < size; j += 1) out[i * size + j] = out[i * size + j]! + left * b[k * size + j]!;
    }
  return out;
}

export function transform(a: Float64Array, y: Float64Array, size: number): Float64Array<ArrayBuffer> {
  const out = new Float64Array(size);
  for (let i = 0; i < size; i += 1) {
    let sum = 0;
    for (let j = 0; j < size; j += 1) sum += a[i * size + j]! * y[j]!;
    out[i] = sum;
  }
  return out;
}

/**
 * exp(A t) by a Taylor series of A t / 2^k, small enough that twelve terms are exact to rounding, squared k times.
 * Source: [methods-derived] scaling and squaring, as in Moler and Van Loan, SIAM Review 20 (1978) (from memory)
 */
export function exponential(a: Float64Array, size: number, time: number): Float64Array {
  let norm = 0;
  for (let i = 0; i < size; i += 1) {
    let row = 0;
    for (let j = 0; j < size; j += 1) row += Math.abs(a[i * size + j]! * time);
    norm = Math.max(norm, row);
  }
  let halvings = 0;
  let scale = time;
  for (; norm > 0.25; norm /= 2) {
    scale /= 2;
    halvings += 1;
  }
  const small = a.map((value) => value * scale);
  let term: Float64Array = identity(size);
  let sum: Float64Array = identity(size);
  for (let k = 1; k <= 14; k += 1) {
    term = multiply(term, small, size).map((value) => value / k);
    sum = sum.map((value, at) => value + term[at]!);
  }
  for (let turn = 0; turn < halvings; turn += 1) sum = multiply(sum, sum, size);
  return sum;
}
