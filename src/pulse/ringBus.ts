// Settles a bus whose skin depth depends on the ring frequency that the bus itself helps to set.
import { accepted, type Read } from "../quantity/index.ts";
import { type Bus, type BusGeometry, busOf } from "./bus.ts";
import { peaksOf } from "./peaks.ts";
import type { SeriesLoop } from "./rlc.ts";
import { pulseFrequency } from "./skin.ts";

/** The settled bus and the frequency [Hz] it was taken at. */
export interface RingBus {
  readonly bus: Bus;
  readonly frequency: number;
}

/**
 * The bus of `geometry` in a loop whose other parts are `rest`, at the frequency of the whole loop: iterated until the frequency
 * moves by less than 1e-12. Refused as by `busOf` and `peaksOf`.
 */
export function ringBus(geometry: BusGeometry, rest: SeriesLoop, resistivity: number): Read<RingBus> {
  let frequency = 0;
  for (let turn = 0; ; turn++) {
    const bus = busOf(geometry, { resistivity, frequency });
    if (!bus.ok) return bus;
    const { inductance, resistance } = bus.value;
    const loop = {
      capacitance: rest.capacitance,
      inductance: rest.inductance + inductance,
      resistance: rest.resistance + resistance,
    };
    const peaks = peaksOf(loop, 1);
    if (!peaks.ok) return peaks;
    const next = pulseFrequency(peaks.value) ?? 0;
    if (turn >= 60 || Math.abs(next - frequency) <= 1e-12 * next) return accepted({ bus: bus.value, frequency: next });
    frequency = next;
  }
}
