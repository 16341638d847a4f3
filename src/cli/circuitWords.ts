// The load, the circuit around the bank and the limits on the shot, as they were read, in words.

import { type Dimension, formatQuantity } from "../quantity/index.ts";
import type { Brief, RatedLimit } from "../search/index.ts";

const show = (x: number, dimension: Dimension): string => formatQuantity(x, dimension, { digits: 6 });

/** Values that were given, joined by commas. */
const joined = (...parts: readonly (string | false | undefined)[]): string =>
  parts.filter((part) => typeof part === "string").join(", ");

export function loadWords({ load }: Brief): string | null {
  if (load === undefined) return null;
  const { resistance, inductance, lamp, current, time, recorded, width } = load;
  const coil = joined(
    resistance !== undefined && show(resistance, "resistance"),
    inductance !== undefined && show(inductance, "inductance"),
  );
  if (lamp) {
    const { bore, arc, gas, pressure, count } = lamp;
    const tube = `bore ${show(bore, "length")}, arc ${show(arc, "length")}, ${gas} at ${show(pressure, "pressure")}`;
    const drive = width === undefined ? "" : `, sized for a pulse of ${show(width, "time")}`;
    return `${count > 1 ? `${count} lamps in series, each` : "lamp,"} ${tube}${coil === "" ? "" : `; coil ${coil}`}${drive}`;
  }
  if (load.short) return "a dead short";
  if (current !== undefined) return `${show(current, "current")} for ${show(time ?? 0, "time")}`;
  if (Array.isArray(recorded)) return `a recorded current of ${recorded.length} samples`;
  return coil;
}

export function switchWords({ switch: sw }: Brief): string | null {
  if (sw === undefined) return null;
  const ways = sw.oneWay ? "blocks reverse current" : "carries both ways";
  return joined(`drop ${show(sw.drop, "voltage")}`, show(sw.resistance, "resistance"), ways);
}

export function busWords({ bus }: Brief): string | null {
  if (bus === undefined) return null;
  const fed = bus.feed !== undefined && `fed at ${bus.feed === "end" ? "one end" : "the centre"}`;
  if (bus.shape === undefined)
    return joined(
      show(bus.resistance ?? 0, "resistance"),
      show(bus.inductance ?? 0, "inductance"),
      fed,
      bus.stepResistance !== undefined &&
        `${show(bus.stepResistance, "resistance")} and ${show(bus.stepInductance ?? 0, "inductance")} from unit to unit`,
    );
  const lengths = (["length", "width", "gap", "thickness", "radius", "spacing", "inner", "outer", "wall"] as const).map(
    (key) => {
      const value = bus[key];
      return value !== undefined && `${key} ${show(value, "length")}`;
    },
  );
  const pitch = bus.pitch !== undefined && `pitch ${show(bus.pitch, "length")}`;
  return joined(`${bus.shape} of ${bus.metal}`, ...lengths, fed, pitch);
}

export const clampWords = ({ clamp }: Brief): string | null =>
  clamp === undefined ? null : joined(`drop ${show(clamp.drop, "voltage")}`, show(clamp.resistance, "resistance"));

const each = (price: number | undefined): string | false => price !== undefined && `${price} each`;

export const isolatingWords = ({ isolating, isolatingPrice }: Brief): string | null =>
  isolating === undefined ? null : joined(show(isolating, "resistance"), each(isolatingPrice));

export const sectionWords = ({ section }: Brief): string | null =>
  section === undefined ? null : joined(show(section.inductance, "inductance"), each(section.price));

export function chargerWords({ charger }: Brief): string | null {
  if (charger === undefined) return null;
  const { current, power, currentLimit, resistance, supply, highest } = charger;
  return joined(
    current !== undefined && `${show(current, "current")} constant`,
    power !== undefined && `${show(power, "power")} constant`,
    currentLimit !== undefined && `at most ${show(currentLimit, "current")}`,
    supply !== undefined && `${show(supply, "voltage")} behind ${show(resistance ?? 0, "resistance")}`,
    highest !== undefined && `reaches ${show(highest, "voltage")}`,
  );
}

const rated = (limit: RatedLimit | undefined, dimension: Dimension): string | false => {
  if (limit === undefined) return false;
  return limit.kind === "absolute" ? show(limit.value, dimension) : `${show(limit.value, "fraction")} of its rating`;
};

/** All limits on the shot in one line; null when there are none. */
export function limitWords(brief: Brief): string | null {
  const { maxReversal, maxTemperatureRise, maxFaultEnergy, minLife } = brief;
  const named = (name: string, text: string | false): string | false => text !== false && `${name} ${text}`;
  const text = joined(
    named("peak", rated(brief.maxPeakCurrent, "current")),
    named("slew", rated(brief.maxSlew, "slew")),
    maxReversal !== undefined && `reversal ${show(maxReversal, "fraction")}`,
    named("rms", rated(brief.maxRms, "current")),
    maxTemperatureRise !== undefined && `rise ${maxTemperatureRise} K`,
    maxFaultEnergy !== undefined && `into a shorted unit ${show(maxFaultEnergy, "energy")}`,
    minLife !== undefined && `life at least ${minLife} of that at the ratings`,
  );
  return text === "" ? null : text;
}
