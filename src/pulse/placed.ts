// The shares by place of one computed shot: what of the circuit drives the ladder, and for how long.
import type { PlaceShares } from "./busPath.ts";
import { placeShares, taperOf } from "./busPlace.ts";
import type { LadderDrive } from "./ladderCourse.ts";
import { type Circuit, linearPartOf } from "./load.ts";
import type { PulseBank } from "./loopMesh.ts";
import type { Mesh, Shot } from "./shot.ts";

/** Times at which the capacitor voltage is looked at for its first zero. */
const LOOKS = 4000;

/** First time [s] at which the capacitor voltage is at or below zero; the end when it never is. */
function firstZero({ at, duration }: Shot): number {
  for (let k = 1; k <= LOOKS; k++) {
    const time = (duration * k) / LOOKS;
    if (at(time).voltage <= 0) return time;
  }
  return duration;
}

/** Whether resistance, inductance and capacitance are all there is, so that the ladder can be solved with its load. */
const isLinear = ({ load, clamp, switch: sw }: Circuit): boolean =>
  (load.kind === "resistor" || load.kind === "coil" || load.kind === "short") && clamp === null && sw.drop === 0;

/**
 * The shares, or null where the place is not told, has no say, or cannot be judged because ESR or ESL is unknown. A linear
 * circuit is solved whole; lamp, switch drop, clamp and given currents drive the ladder with the bank's computed current, the
 * clamp until the capacitors first stand at zero, where it takes the current over.
 */
export function placedOf(bank: PulseBank, circuit: Circuit, shot: Shot, mesh: Mesh): PlaceShares | null {
  const { place = null, bus } = circuit;
  const { parallel, series, unit, esr, esl } = bank;
  if (place === null || bus === null || parallel < 2 || esr === null || esl === null) return null;
  const taper = taperOf(parallel, place);
  const load = linearPartOf(circuit.load);
  const linear = isLinear(circuit);
  const drive: LadderDrive = linear
    ? {
        kind: "load",
        load: {
          resistance: load.resistance + bus.resistance - taper.resistance + circuit.switch.resistance,
          inductance: load.inductance + bus.inductance - taper.inductance,
        },
      }
    : { kind: "given", current: (time) => shot.at(time).current };
  const ratio = parallel / series;
  const branches = {
    unit,
    series,
    parallel,
    esr: mesh.bank.resistance * ratio,
    esl: mesh.bank.inductance * ratio,
  };
  const seconds = circuit.clamp === null ? shot.duration : firstZero(shot);
  const toZero = linear && circuit.switch.oneWay;
  return placeShares(branches, place, { voltage: mesh.voltage, drive, seconds, toZero });
}
