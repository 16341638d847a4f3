// Faults around the chain: load short, early fire, bleeder open, dump stuck, charger running on.
import { atHigh, type FaultBank, worstBefore } from "./faultBank.ts";
import { type FaultCurrent, faultPeak, loadShortLoop } from "./faultCurrents.ts";
import { heldWithoutResistor } from "./faultHold.ts";
import { type Fault, row } from "./faultRow.ts";

/** A short across the bus: the whole bank empties through itself. */
export function loadShort(bank: FaultBank): Fault {
  return row(bank, {
    id: "load-short",
    volts: worstBefore(bank),
    peak: faultPeak(loadShortLoop(bank)),
    peakWorst: faultPeak(loadShortLoop(atHigh(bank))),
    joules: (bank.unit.capacitance * worstBefore(bank) ** 2) / 2,
    stops: "Nothing opens until the bank is empty; bus and units must bear it.",
    note: "At most each unit's own energy turns to heat in it; the ring may reverse the units.",
  });
}

/** The switch closes while the charger still feeds. */
export function earlyFire(bank: FaultBank): Fault {
  const { shot } = bank;
  const amperes = shot?.highest?.peakCurrent ?? shot?.peakCurrent ?? null;
  return row(bank, {
    id: "early-fire",
    volts: worstBefore(bank),
    peak: amperes === null ? null : { amperes, bound: shot?.highest?.bound ?? "side unknown" },
    joules: shot?.unitHeat ?? null,
    joulesWorst: shot?.highest?.unitHeat ?? null,
    stops: "The charger must stand the short: its trip, and a resistor or diode between it and the bank.",
    note: "At most the shot at the highest voltage, with the charger still feeding the load.",
  });
}

/** One balancing resistor opens: its position climbs. */
export function bleederOpen(bank: FaultBank): Fault {
  const { balance, series: n } = bank;
  const stops = "A meter on every stage; short each unit by hand before touching.";
  const peak: FaultCurrent = { amperes: 0, bound: "value" };
  const base = { id: "bleeder-open", peak, joules: 0, stops } as const;
  if (balance === undefined) return row(bank, { ...base, volts: null, note: "Balancing resistors were not told." });
  if (balance === null || n === 1) {
    return row(bank, { ...base, volts: worstBefore(bank), note: "No balancing resistor is there to open." });
  }
  const volts = heldWithoutResistor(bank);
  const note =
    "The position without its resistor climbs toward the whole voltage; told with its units not leaking and the others leaking most.";
  return row(bank, { ...base, volts, note: `${note} After the dump its units keep their charge.` });
}

/** The dump does not do as it is told. */
export function dumpStuck(bank: FaultBank): Fault {
  return row(bank, {
    id: "dump-stuck",
    volts: worstBefore(bank),
    peak: { amperes: 0, bound: "value" },
    joules: 0,
    stops: bank.balance
      ? "The balancing resistors, slowly; see the bleed time."
      : "Nothing given: the bank stays charged.",
    note: "Open: the bank stays at its voltage. Closed: the charger feeds the dump resistor until it trips.",
  });
}

/** The charger does not stop. */
export function chargerRunning(bank: FaultBank): Fault {
  const highest = bank.chargerHighest ?? null;
  return row(bank, {
    id: "charger-running",
    volts: highest === null ? null : (worstBefore(bank) * Math.max(highest, bank.voltage)) / bank.voltage,
    peak: { amperes: 0, bound: "value" },
    joules: 0,
    stops: "A second, independent trip on voltage, and a charger that cannot reach what the units cannot stand.",
    note: highest === null ? "The charger's highest voltage is unknown." : "Every unit rises with the bank.",
  });
}
