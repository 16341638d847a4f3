/*
 * Charging a bank from a voltage to a higher one, three ways.
 *
 *   symbol  name        unit  range
 *   C       capacitance F     > 0
 *   V_i V_f from, to    V     0 <= V_i < V_f
 *   I       current     A     constant current: t = C (V_f - V_i)/I
 *   P       power       W     into the bank, after the current limit I: from V = P/I on, t = C (V_f^2 - V^2)/(2 P)
 *   R V_s   resistance, supply  ohm, V   t = R C ln((V_s - V_i)/(V_s - V_f)), heat C (V_f - V_i)(V_s - (V_f + V_i)/2)
 *
 * Efficiency is energy gained by the bank over energy given: 1 but for the resistor, where it is (V_f + V_i)/(2 V_s).
 * Constant C; the charger's own loss is the charger's. Source: [textbook-charging].
 */
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";

/** The supply: A; W with a current limit [A]; V behind ohm. */
export type Charger =
  | { readonly kind: "constant current"; readonly current: number }
  | { readonly kind: "constant power"; readonly power: number; readonly currentLimit: number }
  | { readonly kind: "resistor"; readonly resistance: number; readonly supply: number };

/** What is charged: F, from and to V. */
export interface ChargeTask {
  readonly capacitance: number;
  readonly from: number;
  readonly to: number;
}

/** s, W out of the charger, J in the charging resistor, 1, and the integral of i^2 dt through the bank [A^2 s]. */
export interface Charge {
  readonly seconds: number;
  readonly peakPower: number;
  readonly meanPower: number;
  readonly peakCurrent: number;
  readonly resistorHeat: number;
  readonly efficiency: number;
  readonly action: number;
  /** Voltage at which constant power takes over from the current limit [V]; null for other chargers. */
  readonly crossover: number | null;
}

function faultsOf(charger: Charger, task: ChargeTask): readonly Refusal[] {
  const { kind, ...numbers } = charger;
  const bad = (field: string, read: number, want: string): Refusal[] => [
    { code: `pulse.charge.${field}`, place: { field }, read: String(read), want },
  ];
  const positive = Object.entries({ ...numbers, capacitance: task.capacitance, to: task.to }).flatMap(
    ([field, value]) => (Number.isFinite(value) && value > 0 ? [] : bad(field, value, "a number above zero")),
  );
  if (positive.length > 0) return positive;
  if (!(task.from >= 0 && task.from < task.to)) return bad(`from`, task.from, "from zero up to below the end voltage");
  if (kind === "resistor" && !(charger.supply > task.to)) {
    return bad("supply", charger.supply, "a supply above the end voltage, which is reached only after for ever");
  }
  return [];
}

/** Time, powers and heat of one charge. Codes: pulse.charge.<field>. Source: [textbook-charging]. */
export function chargeOf(charger: Charger, task: ChargeTask): Read<Charge> {
  const faults = faultsOf(charger, task);
  if (faults.length > 0) return refused(...faults);
  const { capacitance: C, from, to } = task;
  const gained = (C * (to - from) * (to + from)) / 2;
  if (charger.kind === "resistor") {
    const { resistance, supply } = charger;
    const resistorHeat = C * (to - from) * (supply - (to + from) / 2);
    const seconds = resistance * C * Math.log1p((to - from) / (supply - to));
    const peakCurrent = (supply - from) / resistance;
    const given = gained + resistorHeat;
    return accepted({
      seconds,
      peakPower: supply * peakCurrent,
      meanPower: given / seconds,
      peakCurrent,
      resistorHeat,
      efficiency: (to + from) / (2 * supply),
      action: resistorHeat / resistance,
      crossover: null,
    });
  }
  const limit = charger.kind === "constant current" ? charger.current : charger.currentLimit;
  const crossover = charger.kind === "constant current" ? null : charger.power / limit;
  const knee = Math.min(to, Math.max(from, crossover ?? to));
  const power = charger.kind === "constant current" ? to * limit : charger.power;
  const rising = (C * (knee - from)) / limit;
  const flat = knee < to ? (C * (to - knee) * (to + knee)) / (2 * power) : 0;
  const seconds = rising + flat;
  return accepted({
    seconds,
    peakPower: knee < to ? power : knee * limit,
    meanPower: gained / seconds,
    peakCurrent: knee > from ? limit : power / from,
    resistorHeat: 0,
    efficiency: 1,
    // in the flat part i = P/V, so the integral of i^2 dt is C P ln(V_f/V)
    action: limit * limit * rising + (knee < to ? C * power * Math.log(to / knee) : 0),
    crossover,
  });
}
