/*
 * A shot into resistance and inductance, with a constant switch drop, in closed form half-cycle by half-cycle.
 *
 *   symbol  name        unit   meaning
 *   d       drop        V      switch drop, always against the current
 *   A_k     amplitudes  V      what drives half-cycle k: A_0 = V - d, A_(k+1) = A_k VR - 2d, until it is not above zero
 *   VR      reversal    1      of the loop without the drop
 *
 * Within a half-cycle v -+ d obeys the plain loop, so its action is that of `peaks` at A_k, its charge C A_k (1 + VR), and it
 * ends at v = d - A_k VR. From critical damping up there is one pulse, which leaves d on the bank. Source: [methods-derived].
 */
import { accepted, type Read, refused } from "../quantity/index.ts";
import { type Peaks, peaksOf } from "./peaks.ts";
import { dischargeAt, type SeriesLoop } from "./rlc.ts";
import { inductanceOf, type Mesh, resistanceOf, type Shot, storedIn } from "./shot.ts";

/** More half-cycles than this are not followed; what is left then stays `left`, so the energies still add up. */
const MOST_HALVES = 100_000;

interface Halves {
  /** Sum of A_k [V] and of A_k^2 [V^2]; null when the ring never ends. */
  readonly sum: number | null;
  readonly squares: number | null;
  /** Capacitor voltage at the end [V]; null when the ring never ends. */
  readonly end: number | null;
  /** The amplitudes one by one; with no drop and no one-way switch only the first, the rest being a geometric row. */
  readonly amplitudes: readonly number[];
}

function halvesOf(first: number, reversal: number, drop: number, oneWay: boolean): Halves {
  if (drop === 0 && !oneWay) {
    if (reversal === 1) return { sum: null, squares: null, end: null, amplitudes: [first] };
    const squares = (first * first) / ((1 - reversal) * (1 + reversal));
    return { sum: first / (1 - reversal), squares, end: 0, amplitudes: [first] };
  }
  const amplitudes = [first];
  let last = first;
  while (!oneWay && amplitudes.length < MOST_HALVES && last * reversal - 2 * drop > 0) {
    last = last * reversal - 2 * drop;
    amplitudes.push(last);
  }
  const side = amplitudes.length % 2 === 1 ? 1 : -1;
  return {
    sum: amplitudes.reduce((a, b) => a + b, 0),
    squares: amplitudes.reduce((a, b) => a + b * b, 0),
    end: side * (drop - last * reversal),
    amplitudes,
  };
}

/** The sampler of one shot. */
function sampler(loop: SeriesLoop, mesh: Mesh, peaks: Peaks, halves: Halves): Shot["at"] {
  const { drop, oneWay } = mesh.switch;
  const half = peaks.firstZero;
  if (half === null || (drop === 0 && !oneWay)) {
    return (time) => {
      const plain = dischargeAt(loop, mesh.voltage - drop, time);
      return { current: plain.current, voltage: plain.voltage + drop };
    };
  }
  return (time) => {
    const index = Math.floor(time / half);
    const amplitude = halves.amplitudes[index];
    if (amplitude === undefined) return { current: 0, voltage: halves.end ?? 0 };
    const side = index % 2 === 0 ? 1 : -1;
    const plain = dischargeAt(loop, amplitude, time - index * half);
    return { current: side * plain.current, voltage: side * (drop + plain.voltage) };
  };
}

/**
 * The shot of a mesh without lamp and without clamp. Refuses what `checkLoop` refuses, and a charge voltage that does not
 * exceed the switch drop (pulse.drop). Lossless without a drop it rings for ever: `action` is null and all energy is `left`.
 */
export function linearShot(mesh: Mesh): Read<Shot> {
  const loop = { capacitance: mesh.capacitance, inductance: inductanceOf(mesh), resistance: resistanceOf(mesh) };
  const { drop, oneWay } = mesh.switch;
  const first = mesh.voltage - drop;
  if (first <= 0 && mesh.voltage > 0) {
    const want = `a charge voltage above the switch drop of ${drop} V`;
    return refused({ code: "pulse.drop", place: { field: "voltage" }, read: `${mesh.voltage} V`, want });
  }
  const read = peaksOf(loop, first);
  if (!read.ok) return read;
  const peaks = read.value;
  const rings = peaks.firstZero !== null;
  const halves: Halves = rings
    ? halvesOf(first, peaks.reversal, drop, oneWay)
    : { sum: first, squares: first * first, end: drop, amplitudes: [first] };
  const unitAction = peaks.actionToZero / (first * first);
  const action = halves.squares === null ? null : unitAction * halves.squares;
  const charge = halves.sum === null ? 0 : mesh.capacitance * (1 + peaks.reversal) * halves.sum;
  const heat = (resistance: number): number => resistance * (action ?? 0);
  const end = halves.end ?? mesh.voltage;
  const scale = Math.sqrt(loop.inductance * loop.capacitance);
  const fades = loop.resistance === 0 ? 0 : (14 * loop.inductance) / loop.resistance;
  const whole = rings ? Math.min(Math.max(fades, 2 * (peaks.firstZero ?? 0)), 200 * scale) : 0;
  const counted = rings && (drop > 0 || oneWay) ? halves.amplitudes.length * (peaks.firstZero ?? 0) : whole;
  return accepted({
    method: "closed form",
    peakCurrent: peaks.peakCurrent,
    peakTime: peaks.peakTime,
    reversal: Math.max(0, first * peaks.reversal - (rings ? drop : 0)) / mesh.voltage,
    action,
    bankAction: action,
    energy: {
      stored: storedIn(mesh),
      load: heat(mesh.load.resistance),
      bank: heat(mesh.bank.resistance),
      bus: heat(mesh.bus.resistance),
      switch: heat(mesh.switch.resistance) + drop * charge,
      clamp: 0,
      left: (mesh.capacitance * end * end) / 2,
    },
    duration: rings ? counted : 7 * loop.resistance * loop.capacitance + 2 * scale,
    at: sampler(loop, mesh, peaks, halves),
  });
}
