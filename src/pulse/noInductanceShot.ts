/*
 * The named limit of a mesh without inductance, in closed form: the current starts at its peak.
 *
 *   u     root of the current [A^0.5]: V - d = K0 u + R u^2 at any voltage V
 *   u_0   at full charge      t = C (K0 (1/u - 1/u_0) + 2 R ln(u_0/u))
 *   action     C (K0 u_0^3/3 + R u_0^4/2)        integral of |i|^1.5    C (K0 u_0^2/2 + 2 R u_0^3/3)
 *
 * The lamp's tail lasts for ever, so the integrals run to zero current, where C d^2/2 is left. A clamp has nothing to do here:
 * without inductance the bank never goes negative. Source: [methods-derived] by dV = -u^2 dt/C.
 */
import { accepted, power, type Read, refused } from "../quantity/index.ts";
import { type Mesh, resistanceOf, type Shot, storedIn } from "./shot.ts";

/** Part of the peak current at which a drawing of the shot may stop. */
const DRAWN = 1e-3;

/** u at what the voltage has above the drop: the positive root of K0 u + R u^2 = over. */
function rootOf(lamp: number, resistance: number, over: number): number {
  return (2 * over) / (lamp + Math.sqrt(lamp * lamp + 4 * resistance * over));
}

/** The shot with all inductance left out. Refused: no resistance and no lamp either (pulse.loop.none), or pulse.drop. */
export function noInductanceShot(mesh: Mesh): Read<Shot> {
  const { capacitance, voltage, lampConstant: lamp } = mesh;
  const { drop } = mesh.switch;
  const resistance = resistanceOf(mesh);
  if (!(voltage > drop)) {
    const want = `a charge voltage above the switch drop of ${drop} V`;
    return refused({ code: "pulse.drop", place: { field: "voltage" }, read: `${voltage} V`, want });
  }
  if (resistance === 0 && lamp === 0) {
    const want = "a resistance, a lamp or an inductance in the loop";
    return refused({ code: "pulse.loop.none", place: { field: "inductance" }, read: "0 H and 0 ohm", want });
  }
  const start = rootOf(lamp, resistance, voltage - drop);
  const action = capacitance * ((lamp * power(start, 3)) / 3 + (resistance * power(start, 4)) / 2);
  const lampIntegral = capacitance * ((lamp * start ** 2) / 2 + (2 * resistance * power(start, 3)) / 3);
  const timeAt = (u: number): number =>
    capacitance * (lamp * (1 / u - 1 / start) + 2 * resistance * Math.log(start / u));
  const stateAt = (time: number): { current: number; voltage: number } => {
    // halving in ln u, since the tail spans many decades
    let [low, high] = [Math.log(start) - 40, Math.log(start)];
    for (let turn = 0; turn < 80; turn++) {
      const middle = (low + high) / 2;
      if (timeAt(Math.exp(middle)) > time) low = middle;
      else high = middle;
    }
    const u = Math.exp(high);
    return { current: u * u, voltage: drop + lamp * u + resistance * u * u };
  };
  return accepted({
    method: "closed form",
    peakCurrent: start * start,
    peakTime: 0,
    reversal: 0,
    action,
    bankAction: action,
    energy: {
      stored: storedIn(mesh),
      load: mesh.load.resistance * action + lamp * lampIntegral,
      bank: mesh.bank.resistance * action,
      bus: mesh.bus.resistance * action,
      switch: mesh.switch.resistance * action + drop * capacitance * (voltage - drop),
      clamp: 0,
      left: (capacitance * drop * drop) / 2,
    },
    duration: timeAt(start * Math.sqrt(DRAWN)),
    at: stateAt,
  });
}
