// How far the shot's figures may lie apart: capacitance over its tolerance, and what else the brief says may spread.

import type { Capacitor } from "../catalog/index.ts";
import {
  type BusPath,
  type Circuit,
  type Corner,
  type Discharge,
  dischargeOf,
  type Envelope,
  envelopeOf,
  type Figures,
  type Load,
  type LoopSpread,
  type PulseBank,
  type Spread,
} from "../pulse/index.ts";
import { accepted, type Read } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { bankAt, type Shape } from "./shotCorner.ts";

export interface EnvelopeInput {
  readonly brief: Brief;
  readonly unit: Capacitor;
  readonly shape: Shape;
  readonly circuit: Circuit;
  /** At nominal capacitance. */
  readonly bank: PulseBank;
}

const about = (nominal: number, part: number): Spread => ({
  low: nominal * (1 - part),
  nominal,
  high: nominal * (1 + part),
});

/** The same load with its own resistance and inductance scaled; one whose current is given stays as it is. */
function scaled(load: Load, resistance: number, inductance: number): Load {
  if (load.kind === "resistor") return { ...load, resistance: load.resistance * resistance };
  if (load.kind !== "coil" && load.kind !== "lamp") return load;
  return {
    ...load,
    resistance: (load.resistance ?? 0) * resistance,
    inductance: (load.inductance ?? 0) * inductance,
  };
}

/** How far each part of the loop may lie from its nominal. ESR, resistance and inductance as factors. */
export function spreadOf({ brief, unit, shape, bank }: EnvelopeInput): LoopSpread {
  const { esr = 0, resistance = 0, inductance = 0 } = brief.spread ?? {};
  return {
    capacitance: {
      low: bankAt(unit, shape, "low").capacitance,
      nominal: bank.capacitance,
      high: bankAt(unit, shape, "high").capacitance,
    },
    esr: about(1, bank.esr === null ? 0 : esr),
    inductance: about(1, inductance),
    resistance: about(1, resistance),
  };
}

/** Whether the loop has constant R, L and C only. */
export const isLinear = ({ load, clamp, switch: sw }: Circuit): boolean =>
  load.kind !== "lamp" && clamp === null && sw.drop === 0;

/** The shot with every part at one point of its spread, shared by capacitance alone or, with `placed`, by place on the bus too. */
export function dischargeWith(
  { brief, circuit, bank }: EnvelopeInput,
  corner: Corner,
  placed = false,
): Read<Discharge> {
  const { bus, place = null } = circuit;
  const along = (path: BusPath): BusPath => ({
    resistance: path.resistance * corner.resistance,
    inductance: path.inductance * corner.inductance,
  });
  return dischargeOf(
    {
      ...bank,
      capacitance: corner.capacitance,
      esr: bank.esr === null ? null : bank.esr * corner.esr,
      esl: bank.esl === null ? null : bank.esl * corner.inductance,
    },
    {
      ...circuit,
      place: placed && place !== null ? { ...place, segment: along(place.segment) } : null,
      load: scaled(circuit.load, corner.resistance, corner.inductance),
      bus: bus && along(bus),
    },
    brief.voltage,
  );
}

/**
 * The envelope. Spreads of resistance and inductance are those of the outer circuit; the bank's ESL spreads with the
 * inductance. A tolerance that is unknown spreads nothing, and the caller says so.
 */
export function shotEnvelope(input: EnvelopeInput): Read<Envelope> {
  return envelopeOf(spreadOf(input), isLinear(input.circuit), (corner): Read<Figures> => {
    const shot = dischargeWith(input, corner);
    if (!shot.ok) return shot;
    const { peakCurrent, peakTime, reversal, action } = shot.value;
    return accepted({ peakCurrent, peakTime, reversal, action });
  });
}

/**
 * Reversal of the unit that its place on the bus reverses most, where the loop damps least: ESR and resistance low, inductance high.
 * The ladder itself goes through the corners of the capacitances. 0 where no place is told.
 */
export function placedReversal(input: EnvelopeInput): Read<number> {
  if ((input.circuit.place ?? null) === null || input.bank.parallel < 2) return accepted(0);
  const { capacitance, esr, inductance, resistance } = spreadOf(input);
  const corner = {
    capacitance: capacitance.nominal,
    esr: esr.low,
    inductance: inductance.high,
    resistance: resistance.low,
  };
  const shot = dischargeWith(input, corner, true);
  return shot.ok ? accepted(shot.value.unit.reversal) : shot;
}
