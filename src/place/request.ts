// What is asked of a placing, and what is wrong with the asking.
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { MeasuredUnit, Ties } from "./unit.ts";

/** A unit that must stand in a given stage (cross-tied) or string, counted from 0. */
export interface Pin {
  readonly serial: string;
  readonly group: number;
}

/** A stage or string that only takes units of one polarity or size group. */
export interface Room {
  readonly group: number;
  readonly takes: string;
}

export interface PlaceRequest {
  /** n_s, units or stages in series, >= 1. */
  readonly series: number;
  /** n_p, units per stage, or strings, >= 1. */
  readonly parallel: number;
  readonly ties: Ties;
  /** u, relative, of one capacitance against another; default 0.003, a handheld meter on electrolytics. */
  readonly uncertainty?: number;
  /** Relative uncertainty of one leakage reading; default 0.1. */
  readonly leakageUncertainty?: number;
  /** Whole number; default 1. */
  readonly seed?: number;
  /** Elementary trials allowed; default 6e6, some tens of milliseconds. */
  readonly moves?: number;
  /** Stop as soon as the gap is certified to a tenth of the floor; default: only where a proof is out of reach. */
  readonly stopAtFloor?: boolean;
  /** Stop at this certified gap instead (relative). */
  readonly stopAt?: number;
  /** The caller's time check: false means stop and give the best so far. */
  readonly within?: () => boolean;
  readonly pins?: readonly Pin[];
  readonly rooms?: readonly Room[];
  /** `mix`: every lot as evenly over the groups as it goes; `apart`: one lot to a group. */
  readonly lots?: "mix" | "apart";
  /** `keep`: outliers may be fitted too. Default `reject`, as far as there are spares. */
  readonly outliers?: "reject" | "keep";
  /** Conductance of the balancing resistor of a stage (cross-tied) or unit (strings), S, >= 0. */
  readonly balanceConductance?: number;
  /** Voltage on a unit at which leakage was read, V, > 0. */
  readonly leakageVoltage?: number;
  /** The charging gap that holding may use up, relative; default the greater of the best found and 0.3 of the floor. */
  readonly chargingLimit?: number;
  /** `charging`: holding only decides between placings of the same charging gap. Default `both`. */
  readonly goal?: "charging" | "both";
}

export const DEFAULTS = { uncertainty: 0.003, leakageUncertainty: 0.1, seed: 1, moves: 6e6 } as const;

const refusal = (code: string, field: string, read: string, want: string): Refusal => ({
  code,
  place: { field },
  read,
  want,
});

function duplicates(units: readonly MeasuredUnit[]): string[] {
  const seen = new Set<string>();
  const twice = new Set<string>();
  for (const { serial } of units) {
    if (seen.has(serial)) twice.add(serial);
    seen.add(serial);
  }
  return [...twice];
}

const whole = (value: number, least: number): boolean => Number.isInteger(value) && value >= least;
const absentOr = (value: number | undefined, test: (v: number) => boolean): boolean =>
  value === undefined || (Number.isFinite(value) && test(value));

function faultsOfUnits(units: readonly MeasuredUnit[]): Refusal[] {
  const faults = duplicates(units).map((serial) =>
    refusal("place.duplicate-serial", "serial", serial, "each serial once"),
  );
  for (const unit of units) {
    if (!(Number.isFinite(unit.capacitance) && unit.capacitance > 0)) {
      faults.push(refusal("place.capacitance", "capacitance", `${unit.serial}: ${unit.capacitance}`, "more than 0 F"));
    }
    for (const quantity of ["leakage", "esr"] as const) {
      if (!absentOr(unit[quantity], (v) => v >= 0)) {
        faults.push(
          refusal(`place.${quantity}`, quantity, `${unit.serial}: ${unit[quantity]}`, "0 or more, or absent"),
        );
      }
    }
  }
  return faults;
}

function faultsOfPins(units: readonly MeasuredUnit[], request: PlaceRequest, groups: number, size: number): Refusal[] {
  const known = new Set(units.map((unit) => unit.serial));
  const pins = request.pins ?? [];
  const faults: Refusal[] = [];
  const filled = new Map<number, number>();
  const seen = new Set<string>();
  for (const { serial, group } of pins) {
    const text = `${serial} in ${group + 1}`;
    if (!known.has(serial)) faults.push(refusal("place.pin-unknown", "pins", serial, "the serial of a measured unit"));
    if (!whole(group, 0) || group >= groups) faults.push(refusal("place.pin-group", "pins", text, `1 to ${groups}`));
    if (seen.has(serial)) faults.push(refusal("place.pin-twice", "pins", serial, "one position for a unit"));
    seen.add(serial);
    filled.set(group, (filled.get(group) ?? 0) + 1);
  }
  for (const [group, count] of filled) {
    if (count > size) faults.push(refusal("place.pin-full", "pins", `${count} in ${group + 1}`, `at most ${size}`));
  }
  return faults;
}

/** A room that nothing fits, or that is not there, is a slip of the pen: it is never passed over. */
function faultsOfRooms(units: readonly MeasuredUnit[], { rooms = [] }: PlaceRequest, groups: number): Refusal[] {
  const marked = [...new Set(units.flatMap((unit) => (unit.group === undefined ? [] : [unit.group])))];
  const faults: Refusal[] = [];
  const seen = new Set<number>();
  for (const { group, takes } of rooms) {
    const text = `${takes} in ${group + 1}`;
    const known = marked.length === 0 ? "a column `group` in the measured file" : `one of ${marked.join(", ")}`;
    if (!marked.includes(takes)) faults.push(refusal("place.room-unknown", "rooms", text, known));
    if (!whole(group, 0) || group >= groups) faults.push(refusal("place.room-group", "rooms", text, `1 to ${groups}`));
    if (seen.has(group)) faults.push(refusal("place.room-twice", "rooms", text, "one group for a stage or string"));
    seen.add(group);
  }
  return faults;
}

/** The request as it stands, or every fault of it. */
export function checkRequest(units: readonly MeasuredUnit[], request: PlaceRequest): Read<PlaceRequest> {
  const faults: Refusal[] = [];
  for (const field of ["series", "parallel"] as const) {
    if (!whole(request[field], 1)) {
      faults.push(refusal("place.shape", field, String(request[field]), "a whole number, 1 or more"));
    }
  }
  if (faults.length > 0) return refused(...faults);
  const positions = request.series * request.parallel;
  if (units.length < positions) {
    faults.push(refusal("place.too-few", "serial", `${units.length} units`, `${positions} or more`));
  }
  const numbers = ["uncertainty", "leakageUncertainty", "balanceConductance", "chargingLimit", "stopAt"] as const;
  for (const field of numbers) {
    if (!absentOr(request[field], (v) => v >= 0)) {
      faults.push(refusal("place.number", field, String(request[field]), "0 or more"));
    }
  }
  if (!absentOr(request.leakageVoltage, (v) => v > 0)) {
    faults.push(refusal("place.number", "leakageVoltage", String(request.leakageVoltage), "more than 0 V"));
  }
  const cross = request.ties === "cross-tied";
  const groups = cross ? request.series : request.parallel;
  faults.push(...faultsOfUnits(units), ...faultsOfPins(units, request, groups, positions / groups));
  faults.push(...faultsOfRooms(units, request, groups));
  return faults.length > 0 ? refused(...faults) : accepted(request);
}
