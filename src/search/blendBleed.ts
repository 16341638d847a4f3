// How a blend empties: the slowest group alone, and all together, through the balancing chains with high C and high R.
//
// | symbol | in code     | unit |
// | ------ | ----------- | ---- |
// | C      | capacitance | F    |
// | G      | conductance | S    |
//
// t = (sum C / sum G) ln(V/V_safe) while the groups stay joined; it is never longer than the slowest group alone, because
// a ratio of sums lies between the ratios. A group of single units has no chain: cut off, it never empties.
// Source: [joulewright-design] section 3 "Bleed".

import type { BlendResult } from "./blendResult.ts";
import type { Brief } from "./brief.ts";
import type { LayoutResult } from "./result.ts";

type Emptied = Pick<LayoutResult, "series" | "balance" | "bleed" | "capacitance">;

/** Conductance of all chains of one group with their resistors high, S. */
function conductance({ series, balance }: Emptied): number {
  if (balance === null) return 0;
  return balance.positions / series / (balance.resistance * (1 + balance.tolerance) * series);
}

export function bleedOf(
  layouts: readonly Emptied[],
  brief: Pick<Brief, "voltage" | "overshoot" | "touchSafe">,
): BlendResult["bleed"] {
  const alone = layouts.map((one) => one.bleed.seconds);
  const voltage = brief.voltage * (1 + brief.overshoot);
  const sum = { capacitance: 0, conductance: 0, known: true };
  for (const layout of layouts) {
    sum.known &&= layout.capacitance.high !== null;
    sum.capacitance += layout.capacitance.high ?? 0;
    sum.conductance += conductance(layout);
  }
  const log = voltage <= brief.touchSafe ? 0 : Math.log(voltage / brief.touchSafe);
  return {
    seconds: alone.some((seconds) => seconds === null) ? null : Math.max(...alone.map((seconds) => seconds as number)),
    together: !sum.known || sum.conductance === 0 ? null : (sum.capacitance / sum.conductance) * log,
    toVoltage: brief.touchSafe,
  };
}
