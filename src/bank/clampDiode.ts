/*
 * What a clamp diode across each stage (cross-tied) or unit (strings) must stand, so that a dump cannot reverse it.
 *
 * | symbol | in code           | unit | meaning                                                                  |
 * | ------ | ----------------- | ---- | ------------------------------------------------------------------------ |
 * | v, w   | victim, others    | V    | before the dump: the stage that empties first, and each of the other n - 1 |
 * | U      | rest              | V    | what the others still hold when the victim is empty                        |
 * | R      | dumpResistance    | ohm  | of the dump resistor alone                                                 |
 * | r      | esr               | ohm  | of one unit                                                                |
 *
 * The victim (C_lo, the others C_hi) is empty after the charge C_lo v, so U = (n - 1)(w - v C_lo/C_hi). From then on its diode carries the
 * dump current: at first U/R_total, with action integral C' U^2 / (2 R_total), C' = C_hi/(n - 1).
 * R_total = R + (n - 1) r/p cross-tied. In strings the p strings share R: the victim's string carries C'/C_t of the current, least C_t
 * being worst (all other strings at C_lo), and r is left out; with no dump resistor a string empties through its own (n - 1) r.
 * While charged the diode blocks the stage's greatest voltage. Holds for an ideal diode and a dump without inductance.
 * Source: [methods-derived] 1.4, 3.1
 */

export interface ClampCase {
  readonly ties: "cross-tied" | "strings";
  readonly n: number;
  readonly p: number;
  /** Unit capacitance, F, and tolerance as fractions. */
  readonly C: number;
  readonly tLow: number;
  readonly tHigh: number;
  /** Stage voltages (V) before the dump: V/n each when equalised. */
  readonly victim: number;
  readonly others: number;
  /** Greatest stage voltage in any state, V. */
  readonly worstVoltage: number;
  readonly dumpResistance: number;
  readonly esr: number | null;
}

export interface ClampDiode {
  readonly count: number;
  /** V that it blocks. */
  readonly reverseVoltage: number;
  /** A and A^2 s; null when neither a dump resistor nor an ESR limits them. */
  readonly surgeCurrent: number | null;
  readonly action: number | null;
}

/** Duty of the clamp diodes of a bank. */
export function clampDiode(given: ClampCase): ClampDiode {
  const { ties, n, p, C, tLow, tHigh, victim, others, dumpResistance, esr } = given;
  const low = C * (1 - tLow);
  const high = C * (1 + tHigh);
  const count = ties === "cross-tied" ? n : n * p;
  const rest = Math.max(0, (n - 1) * (others - (victim * low) / high));
  const duty = { count, reverseVoltage: given.worstVoltage };
  if (rest === 0) return { ...duty, surgeCurrent: 0, action: 0 };
  const own = high / (n - 1);
  if (ties === "cross-tied") {
    const resistance = dumpResistance + ((n - 1) * (esr ?? 0)) / p;
    if (resistance === 0) return { ...duty, surgeCurrent: null, action: null };
    return { ...duty, surgeCurrent: rest / resistance, action: (p * own * rest ** 2) / (2 * resistance) };
  }
  if (dumpResistance > 0) {
    const all = own + ((p - 1) * low) / n;
    const part = own / all;
    return {
      ...duty,
      surgeCurrent: (part * rest) / dumpResistance,
      action: (part * own * rest ** 2) / (2 * dumpResistance),
    };
  }
  const resistance = (n - 1) * (esr ?? 0);
  if (resistance === 0) return { ...duty, surgeCurrent: null, action: null };
  return { ...duty, surgeCurrent: rest / resistance, action: (own * rest ** 2) / (2 * resistance) };
}
