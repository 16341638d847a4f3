// The flags of a blend: read, held within their ranges, and refused when there is no blend to speak of.

import { accepted, parseQuantity, type Read, type Refusal, refused } from "../quantity/index.ts";
import { FRONT_NAMES, type FrontName, type ShipmentWish } from "../search/index.ts";

export interface BlendFlags {
  readonly blend?: boolean;
  readonly explain?: boolean;
  readonly maxTypes?: string;
  readonly within?: string;
  readonly lineCost?: string;
  readonly shipmentCost?: string;
  readonly front?: string;
  readonly ladder?: string;
  readonly solverTime?: string;
}

export interface BlendWish {
  readonly explain: boolean;
  readonly maxTypes?: number;
  readonly within?: number;
  readonly lineCost?: number;
  readonly shipments?: ShipmentWish;
  readonly fronts?: readonly FrontName[];
  readonly ladder?: number;
  readonly seconds?: number;
}

const NAMES = [
  ["explain", "--explain"],
  ["maxTypes", "--max-types"],
  ["within", "--within"],
  ["lineCost", "--line-cost"],
  ["shipmentCost", "--shipment-cost"],
  ["front", "--front"],
  ["ladder", "--ladder"],
  ["solverTime", "--solver-time"],
] as const;

/** True when any of these flags stands on the line. */
export const wantsBlend = (flags: BlendFlags): boolean =>
  flags.blend === true || NAMES.some(([key]) => flags[key] !== undefined);

const refusal = (field: string, read: string, want: string): Refusal => ({
  code: "bad-value",
  place: { field },
  read: JSON.stringify(read),
  want,
});

const SHIPMENTS = 'an amount such as "6.50", or by supplier: "North: 4.90; South: 12; 6.50"';
const AMOUNT = /^\d{1,9}(\.\d{1,4})?$/;

/** "6.50" for all, "North: 4.90; South: 12" by supplier, or both: the bare amount is for whoever is not named. Each once. */
function readShipments(text: string): ShipmentWish | null {
  const named: Record<string, number> = Object.create(null);
  let each: number | undefined;
  for (const item of text.split(";").map((one) => one.trim())) {
    const colon = item.lastIndexOf(":");
    const name = item.slice(0, Math.max(0, colon)).trim();
    const amount = item.slice(colon + 1).trim();
    if (!AMOUNT.test(amount)) return null;
    if (colon < 0) {
      if (each !== undefined) return null;
      each = Number(amount);
    } else {
      if (name === "" || name in named) return null;
      named[name] = Number(amount);
    }
  }
  return { ...(each === undefined ? {} : { each }), named: { ...named } };
}

/** The same flag where it stands alone, beside a blend that is already chosen. */
export function readShipmentFlag(text: string | undefined): Read<ShipmentWish | undefined> {
  if (text === undefined) return accepted(undefined);
  const read = readShipments(text);
  return read === null ? refused(refusal("--shipment-cost", text, SHIPMENTS)) : accepted(read);
}

/** What is wished of blends, or null when none is. */
export function readBlendFlags(flags: BlendFlags): Read<BlendWish | null> {
  if (flags.blend !== true) {
    const lonely = NAMES.find(([key]) => flags[key] !== undefined);
    if (lonely === undefined) return accepted(null);
    return refused({
      code: "missing-option",
      place: { field: lonely[1] },
      read: "no --blend",
      want: "--blend beside it",
    });
  }
  const faults: Refusal[] = [];
  const { maxTypes, within, lineCost, shipmentCost, front, ladder, solverTime } = flags;
  const wish: { -readonly [K in keyof BlendWish]: BlendWish[K] } = { explain: flags.explain === true };
  if (maxTypes !== undefined) {
    if (/^\d{1,3}$/.test(maxTypes) && Number(maxTypes) >= 1 && Number(maxTypes) <= 100)
      wish.maxTypes = Number(maxTypes);
    else faults.push(refusal("--max-types", maxTypes, "a whole number from 1 to 100"));
  }
  if (within !== undefined) {
    const read = parseQuantity(within, "fraction");
    if (read.ok && read.value >= 0 && read.value <= 1) wish.within = read.value;
    else faults.push(refusal("--within", within, 'a fraction such as "2 %", up to 100 %'));
  }
  if (lineCost !== undefined) {
    if (AMOUNT.test(lineCost)) wish.lineCost = Number(lineCost);
    else faults.push(refusal("--line-cost", lineCost, 'an amount in the currency of the plan, such as "2.50"'));
  }
  if (shipmentCost !== undefined) {
    const read = readShipments(shipmentCost);
    if (read !== null) wish.shipments = read;
    else faults.push(refusal("--shipment-cost", shipmentCost, SHIPMENTS));
  }
  if (front !== undefined) {
    const names = front.split(",").map((name) => name.trim());
    const known = names.flatMap((name) => FRONT_NAMES.filter((one) => one === name));
    if (known.length === names.length && new Set(known).size === known.length) wish.fronts = known;
    else faults.push(refusal("--front", front, `one or more of ${FRONT_NAMES.join(", ")}, with commas between`));
  }
  if (ladder !== undefined) {
    const read = parseQuantity(ladder, "fraction");
    if (read.ok && read.value > 0 && read.value <= 0.95) wish.ladder = read.value;
    else
      faults.push(refusal("--ladder", ladder, 'how far below and above the energy asked, such as "50 %", up to 95 %'));
  }
  if (solverTime !== undefined) {
    const read = parseQuantity(solverTime, "time");
    if (read.ok && read.value >= 0.1 && read.value <= 86_400) wish.seconds = read.value;
    else faults.push(refusal("--solver-time", solverTime, 'a time such as "10 s", from 100 ms to 24 h'));
  }
  return faults.length > 0 ? refused(...faults) : accepted(wish);
}
