// Stored energy, pulse energy and the capacitance that a pulse needs.
//
// | symbol | in code     | unit | range      |
// | ------ | ----------- | ---- | ---------- |
// | E      | energy      | J    | > 0        |
// | V      | voltage     | V    | > 0        |
// | r      | ripple      | 1    | 0 < r <= 1 |
// | I, f   | current, frequency of recharge | A, Hz | > 0 |
// | n, p   | series, parallel | 1 | >= 1     |
//
// C_req = 2E / (V^2 r (2 - r)); for a steady current also I/(f r V); the larger holds. E = C V^2 r (2 - r)/2.
// Holds for a capacitance that does not depend on voltage. Source: [joulewright-design] section 3.

/** Energy that C gives up from V down to V(1 - r), J. With r = 1 the whole stored energy. */
export const pulseEnergy = (capacitance: number, voltage: number, ripple: number): number =>
  (capacitance * voltage * voltage * ripple * (2 - ripple)) / 2;

/** Whole stored energy, J. */
export const storedEnergy = (capacitance: number, voltage: number): number => (capacitance * voltage * voltage) / 2;

export interface Need {
  readonly energy: number;
  readonly voltage: number;
  readonly ripple: number;
  readonly steady?: { readonly current: number; readonly frequency: number } | undefined;
}

/** Capacitance that the brief requires, F. */
export function requiredCapacitance({ energy, voltage, ripple, steady }: Need): number {
  const forPulse = (2 * energy) / (voltage * voltage * ripple * (2 - ripple));
  const forSteady = steady ? steady.current / (steady.frequency * ripple * voltage) : 0;
  return Math.max(forPulse, forSteady);
}

/** Capacitance of n in series by p in parallel of equal units, F. */
export const bankCapacitance = (unit: number, series: number, parallel: number): number => (unit * parallel) / series;

/** An exact fit is a fit: relative slack of every comparison of capacitance. */
export const FIT = 1e-9;

/** Least p with p C/n >= C_req, within FIT. Range: all positive; result >= 1. */
export const leastParallel = (required: number, series: number, unit: number): number =>
  Math.max(1, Math.ceil(((required * series) / unit) * (1 - FIT)));
