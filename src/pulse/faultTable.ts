// The fault table of a bank: for each thing that can go wrong, the worst volts, peak amperes, joules into one unit, what stops it.
import { rowShort, unitOpen, unitShort } from "./chainFaults.ts";
import { bleederOpen, chargerRunning, dumpStuck, earlyFire, loadShort } from "./circuitFaults.ts";
import type { FaultBank } from "./faultBank.ts";
import type { Fault } from "./faultRow.ts";

/** All eight faults of a bank, in the order a reviewer asks for them. Source: [methods-derived] each row's own file head. */
export const faultTable = (bank: FaultBank): readonly Fault[] =>
  [unitShort, unitOpen, rowShort, loadShort, earlyFire, bleederOpen, dumpStuck, chargerRunning].map((fault) =>
    fault(bank),
  );
