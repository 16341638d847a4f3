// One placing with all that is said about it: shares, course, spares, resistors, front, mending.

import {
  asBuilt,
  type Front,
  type HoldCourse,
  holdCourse,
  type Mending,
  mend,
  type Placing,
  type Position,
  place,
  placingFront,
  positionList,
  type Replacement,
  type ResistorEffect,
  replacements,
  resistorEffect,
  SPARE_RULE,
  stressFindings,
} from "../place/index.ts";
import { accepted, type Finding, type Read, refused } from "../quantity/index.ts";
import { readGroups } from "./listInput.ts";
import type { PlaceFlags } from "./placeFlags.ts";
import { type PlaceInput, readPlaceInput } from "./placeInput.ts";
import type { Ports } from "./ports.ts";

export interface Placed {
  readonly input: PlaceInput;
  readonly placing: Placing;
  /** Null when voltage or leakage is not known. */
  readonly course: HoldCourse | null;
  readonly findings: readonly Finding[];
  readonly positions: readonly Position[];
  readonly spares: ReadonlyMap<string, readonly Replacement[]>;
  readonly resistors: readonly ResistorEffect[] | null;
  readonly front: Front | null;
  readonly mending: { readonly out: string; readonly found: Mending } | null;
  readonly notes: readonly string[];
}

/** Re-placing beside other resistors is a look ahead, not the result: a part of the effort does. */
const EFFECT_MOVES = 2e6;

/** Places as asked, or takes the builder's own list, and works out the rest. */
export function placedBank(brief: string | undefined, flags: PlaceFlags, ports: Ports): Read<Placed> {
  const read = readPlaceInput(brief, flags, ports);
  if (!read.ok) return read;
  const input = read.value;
  const { units, request, bank } = input;
  const placing = placingOf(flags, input, ports);
  if (!placing.ok) return placing;
  const { value } = placing;
  const mending = mendingOf(flags, input, value);
  const front = flags.front === true ? placingFront(units, { ...request, moves: EFFECT_MOVES }) : null;
  const refusals = [mending, front].flatMap((one) => (one === null || one.ok ? [] : one.refusals));
  if (refusals.length > 0) return refused(...refusals);
  const course = courseOfBank(input, value);
  const stress =
    bank.voltage === null
      ? []
      : stressFindings({ voltage: bank.voltage, limit: bank.limit, charging: value.charging, course });
  const out = new Set(value.rejected.map((o) => o.serial));
  const sound = { ...value, spares: value.spares.filter((serial) => !out.has(serial)) };
  return accepted({
    input,
    placing: value,
    course,
    findings: [...input.ofPart, ...stress, ...value.findings],
    positions: positionList(units, value),
    spares: replacements(units, request, sound),
    resistors: resistorsOf(input, value),
    front: front?.ok ? front.value : null,
    mending: mending?.ok ? { out: flags.without as string, found: mending.value } : null,
    notes: [...input.notes, ...notesOf(input, value, flags)],
  });
}

/** Too few units is a fault of the file that they came from. */
const fromFile = (placing: Read<Placing>, file: string): Read<Placing> =>
  placing.ok
    ? placing
    : refused(...placing.refusals.map((one) => (one.code === "place.too-few" ? { ...one, place: { file } } : one)));

function placingOf(flags: PlaceFlags, { units, request, measured }: PlaceInput, ports: Ports): Read<Placing> {
  if (flags.positions === undefined) return fromFile(place(units, request), measured.file);
  const groups = readGroups(flags.positions, request, ports.files);
  return groups.ok ? asBuilt(units, request, groups.value) : groups;
}

function mendingOf({ without }: PlaceFlags, { units, request }: PlaceInput, placing: Placing): Read<Mending> | null {
  return without === undefined ? null : mend(units, request, placing, without);
}

/** The exact course of the placed bank; null when something that it needs is not known. */
function courseOfBank({ units, request, bank }: PlaceInput, placing: Placing): HoldCourse | null {
  const { voltage, leakageVoltage } = bank;
  if (voltage === null || leakageVoltage === null || placing.holding === null) return null;
  const bySerial = new Map(units.map((unit) => [unit.serial, unit]));
  const groups = placing.groups.map((group) => group.flatMap((serial) => bySerial.get(serial) ?? []));
  const resistance = bank.resistance ?? Number.POSITIVE_INFINITY;
  return holdCourse({ groups, ties: request.ties, voltage, leakageVoltage, resistance, hold: bank.hold });
}

/** The resistor of the bank, and one of a third and of three times its value beside it. */
function resistorsOf({ units, request, bank }: PlaceInput, placing: Placing): readonly ResistorEffect[] | null {
  if (placing.holding === null || bank.resistance === null) return null;
  const resistances = [bank.resistance * 3, bank.resistance, bank.resistance / 3];
  const asked = { ...request, moves: EFFECT_MOVES, goal: "both" } as const;
  const effect = resistorEffect(units, asked, { placing, resistances });
  return effect.ok ? effect.value : null;
}

function notesOf({ units, request }: PlaceInput, placing: Placing, flags: PlaceFlags): readonly string[] {
  const { charging, holding, rejected } = placing;
  const notes: string[] = [];
  if (flags.positions !== undefined)
    notes.push(
      "The positions are those of the list; the best possible is that of a free placing of all measured units.",
    );
  else if (holding !== null && request.goal === "both" && charging.gap > charging.attained * (1 + 1e-9))
    notes.push(
      "Some of the charging share was given up for holding, within what the meter can tell; --goal charging leaves it out.",
    );
  else if (holding !== null && request.goal === "charging" && request.series > 1)
    notes.push(
      "Placed for charging; holding only decided between equals. --goal both gives up charging within its floor for holding.",
    );
  if (request.uncertainty === undefined && units.every((unit) => unit.uncertainty === undefined))
    notes.push("The meter's uncertainty was not given: 0.3 % from unit to unit is assumed; --uncertainty sets it.");
  if (placing.spares.length > 0) notes.push(`Spares: ${SPARE_RULE}; then exchanged where the charging share gains.`);
  if (rejected.length > 0)
    notes.push("Units that do not belong to the lot were set aside; --outliers keep lets them be fitted.");
  return notes;
}
