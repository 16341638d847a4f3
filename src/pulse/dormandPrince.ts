/*
 * One step of the Dormand-Prince 5(4) pair, its error estimate and its dense output.
 *
 *   x     independent variable      y   state, n numbers
 *   h     step                      k1..k7  slopes of the seven stages (k7 is the next step's k1)
 *   theta part of the step, 0..1    y(theta) fourth-order dense output
 *
 * Source: [DormandPrince1980] table of the 5(4)7M pair; dense output [HNW] section II.6. Checked by their order in the tests.
 */

/** Writes dy/dx into `out`. */
export type Slope = (x: number, y: Float64Array, out: Float64Array) => void;

/** Scratch for steps of one system of `size` numbers: the slopes, the trial state and the error. */
export interface Scratch {
  readonly k: readonly Float64Array[];
  readonly trial: Float64Array;
  readonly next: Float64Array;
  readonly error: Float64Array;
}

export const scratchOf = (size: number): Scratch => ({
  k: Array.from({ length: 7 }, () => new Float64Array(size)),
  trial: new Float64Array(size),
  next: new Float64Array(size),
  error: new Float64Array(size),
});

/** Takes one step from (x, y) whose slope already stands in k[0]; leaves the new state in `next`, its slope in k[6]. */
export function step(slope: Slope, at: { readonly x: number; readonly h: number }, y: Float64Array, s: Scratch): void {
  const { trial, next, error } = s;
  const [k1, k2, k3, k4, k5, k6, k7] = s.k as readonly [
    Float64Array,
    Float64Array,
    Float64Array,
    Float64Array,
    Float64Array,
    Float64Array,
    Float64Array,
  ];
  const { x, h } = at;
  const size = y.length;
  for (let i = 0; i < size; i++) trial[i] = y[i]! + h * (k1[i]! / 5);
  slope(x + h / 5, trial, k2);
  for (let i = 0; i < size; i++) trial[i] = y[i]! + h * ((3 / 40) * k1[i]! + (9 / 40) * k2[i]!);
  slope(x + 0.3 * h, trial, k3);
  for (let i = 0; i < size; i++) trial[i] = y[i]! + h * ((44 / 45) * k1[i]! - (56 / 15) * k2[i]! + (32 / 9) * k3[i]!);
  slope(x + 0.8 * h, trial, k4);
  for (let i = 0; i < size; i++)
    trial[i] =
      y[i]! + h * ((19372 / 6561) * k1[i]! - (25360 / 2187) * k2[i]! + (64448 / 6561) * k3[i]! - (212 / 729) * k4[i]!);
  slope(x + (8 / 9) * h, trial, k5);
  for (let i = 0; i < size; i++)
    trial[i] =
      y[i]! +
      h *
        ((9017 / 3168) * k1[i]! -
          (355 / 33) * k2[i]! +
          (46732 / 5247) * k3[i]! +
          (49 / 176) * k4[i]! -
          (5103 / 18656) * k5[i]!);
  slope(x + h, trial, k6);
  for (let i = 0; i < size; i++)
    next[i] =
      y[i]! +
      h *
        ((35 / 384) * k1[i]! +
          (500 / 1113) * k3[i]! +
          (125 / 192) * k4[i]! -
          (2187 / 6784) * k5[i]! +
          (11 / 84) * k6[i]!);
  slope(x + h, next, k7);
  for (let i = 0; i < size; i++)
    error[i] =
      h *
      ((71 / 57600) * k1[i]! -
        (71 / 16695) * k3[i]! +
        (71 / 1920) * k4[i]! -
        (17253 / 339200) * k5[i]! +
        (22 / 525) * k6[i]! -
        k7[i]! / 40);
}

/** One accepted step, able to give the state anywhere inside it. */
export interface Piece {
  readonly x: number;
  readonly h: number;
  /** Five rows of the dense polynomial, one after another. */
  readonly rows: Float64Array;
}

/** Keeps the step just taken by `step` as a dense piece. Source: [HNW] section II.6. */
export function pieceOf(at: { readonly x: number; readonly h: number }, y: Float64Array, s: Scratch): Piece {
  const { h } = at;
  const size = y.length;
  const rows = new Float64Array(5 * size);
  const [k1, , k3, k4, k5, k6, k7] = s.k;
  for (let i = 0; i < size; i++) {
    const rise = s.next[i]! - y[i]!;
    const bend = h * k1![i]! - rise;
    rows[i] = y[i]!;
    rows[size + i] = rise;
    rows[2 * size + i] = bend;
    rows[3 * size + i] = rise - h * k7![i]! - bend;
    rows[4 * size + i] =
      h *
      ((-12715105075 / 11282082432) * k1![i]! +
        (87487479700 / 32700410799) * k3![i]! -
        (10690763975 / 1880347072) * k4![i]! +
        (701980252875 / 199316789632) * k5![i]! -
        (1453857185 / 822651844) * k6![i]! +
        (69997945 / 29380423) * k7![i]!);
  }
  return { x: at.x, h, rows };
}

/** Writes the state at part `theta` of a piece into `out`. */
export function within({ rows }: Piece, theta: number, out: Float64Array): Float64Array {
  const size = out.length;
  const rest = 1 - theta;
  for (let i = 0; i < size; i++) {
    const inner = rows[3 * size + i]! + rest * rows[4 * size + i]!;
    const middle = rows[2 * size + i]! + theta * inner;
    out[i] = rows[i]! + theta * (rows[size + i]! + rest * middle);
  }
  return out;
}
