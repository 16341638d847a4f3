/*
 * Shots whose current is given: a steady current for a time, or a recorded one. The bank only follows.
 *
 *   V(t) = V - Q(t)/C, the terminals stand at V(t) - ESR i; bank, bus and switch heat by R times the action, the switch drop
 *   by the charge that passes either way; what the terminals gave beyond that went into the load.
 *
 * Inductance has no say, since the current is given. Source: [methods-derived].
 */
import { accepted, type Read, refused } from "../quantity/index.ts";
import { type CurrentSample, checkSamples, integralsOf, sampleAt } from "./samples.ts";
import { type Mesh, type Shot, storedIn } from "./shot.ts";

/** Figures of a given current, and a sampler of current and charge. */
interface Given {
  readonly charge: number;
  readonly absoluteCharge: number;
  readonly action: number;
  readonly peakCurrent: number;
  readonly peakTime: number;
  readonly greatestCharge: number;
  readonly seconds: number;
  readonly at: (time: number) => { readonly current: number; readonly charge: number };
}

function follow(mesh: Mesh, given: Given): Shot {
  const { capacitance, voltage } = mesh;
  const { action } = given;
  const stored = storedIn(mesh);
  const end = voltage - given.charge / capacitance;
  const left = (capacitance * end * end) / 2;
  const bank = mesh.bank.resistance * action;
  const bus = mesh.bus.resistance * action;
  const inSwitch = mesh.switch.resistance * action + mesh.switch.drop * given.absoluteCharge;
  return {
    method: "samples",
    peakCurrent: given.peakCurrent,
    peakTime: given.peakTime,
    reversal: Math.max(0, given.greatestCharge / capacitance - voltage) / voltage,
    action,
    bankAction: action,
    // the load takes what is missing: a recorded current says nothing of the load's own voltage
    energy: { stored, load: stored - left - bank - bus - inSwitch, bank, bus, switch: inSwitch, clamp: 0, left },
    duration: given.seconds,
    at: (time) => {
      const { current, charge } = given.at(time);
      return { current, voltage: voltage - charge / capacitance };
    },
  };
}

/**
 * A steady current [A] for some seconds. Refused when the bank cannot hold it up: its terminals would reach zero first
 * (pulse.steady.droop), told with the time it can.
 */
export function steadyShot(mesh: Mesh, load: { readonly current: number; readonly seconds: number }): Read<Shot> {
  const { current, seconds } = load;
  const series = mesh.bank.resistance + mesh.bus.resistance + mesh.switch.resistance;
  const spare = mesh.voltage - series * current - mesh.switch.drop;
  const longest = (spare * mesh.capacitance) / current;
  if (!(longest >= seconds * (1 - 1e-9))) {
    const want = spare > 0 ? `at most ${longest} s at this current` : "a current that leaves the terminals above zero";
    return refused({ code: "pulse.steady.droop", place: { field: "seconds" }, read: `${seconds} s`, want });
  }
  return accepted(
    follow(mesh, {
      charge: current * seconds,
      absoluteCharge: current * seconds,
      action: current * current * seconds,
      peakCurrent: current,
      peakTime: 0,
      greatestCharge: current * seconds,
      seconds,
      at: (time) => ({ current: time > seconds ? 0 : current, charge: current * Math.min(time, seconds) }),
    }),
  );
}

/** A recorded current as straight lines between samples. Refused as by `checkSamples`. */
export function recordedShot(mesh: Mesh, samples: readonly CurrentSample[]): Read<Shot> {
  const checked = checkSamples(samples);
  if (!checked.ok) return checked;
  const integrals = integralsOf(samples);
  const seconds = samples.at(-1)!.time - samples[0]!.time;
  return accepted(follow(mesh, { ...integrals, seconds, at: (time) => sampleAt(samples, integrals, time) }));
}
