// Lists of serials with their stage or string: pins, and the builder's own positions.

import { type ListedUnit, readPositions } from "../catalog/index.ts";
import type { Pin, Room, Ties } from "../place/index.ts";
import { accepted, type Read, refused } from "../quantity/index.ts";
import type { Files } from "./files.ts";

function readList(path: string, files: Files): Read<readonly ListedUnit[]> {
  const text = files.read(path);
  if (!text.ok) return text;
  const read = readPositions(text.value, path === "-" ? "standard input" : path);
  if (!read.ok) return read;
  // A wish or a position that cannot be read may not be passed over: the bank would be another one.
  return read.value.faults.length > 0 ? refused(...read.value.faults) : accepted(read.value.units);
}

/** Pins from files, and from `serial=stage` written out. Stages and strings count from 1. */
export function readPins(given: readonly string[], files: Files): Read<readonly Pin[]> {
  const pins: Pin[] = [];
  for (const text of given) {
    const written = /^(.+)=(\d{1,6})$/.exec(text);
    if (written !== null) {
      pins.push({ serial: written[1] as string, group: Number(written[2]) - 1 });
      continue;
    }
    const list = readList(text, files);
    // What looks like no path is a serial without its place.
    if (!list.ok && list.refusals[0]?.code === "no-such-file" && !/[./\\]/.test(text)) {
      const want = "SERIAL=PLACE, the stage or string from 1, such as K001=2; or the path of a list of positions";
      return refused({ code: "bad-value", place: { field: "--pins" }, read: JSON.stringify(text), want });
    }
    if (!list.ok) return list;
    for (const { serial, group } of list.value) if (group !== undefined) pins.push({ serial, group: group - 1 });
  }
  return accepted(pins);
}

/** Rooms written `3=snap-in`: stage or string 3 takes only units of that group. */
export function readRooms(given: readonly string[]): Read<readonly Room[]> {
  const rooms: Room[] = [];
  for (const text of given) {
    const written = /^(\d{1,6})=(.+)$/.exec(text.trim());
    if (written === null) {
      const want = "a stage or string and what it takes: 3=snap-in";
      return refused({ code: "bad-value", place: { field: "--rooms" }, read: JSON.stringify(text), want });
    }
    rooms.push({ group: Number(written[1]) - 1, takes: written[2] as string });
  }
  return accepted(rooms);
}

export interface Shape {
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
}

/** Positions as groups of serials: by stage or string, in the order of `place` where it is given, else of the list. */
export function readGroups(path: string, { series, parallel, ties }: Shape, files: Files): Read<string[][]> {
  const list = readList(path, files);
  if (!list.ok) return list;
  const count = ties === "cross-tied" ? series : parallel;
  const wrong = list.value.find(({ group }) => group !== undefined && group > count);
  if (wrong !== undefined) {
    const file = path === "-" ? "standard input" : path;
    const place = { file, line: wrong.line, field: ties === "cross-tied" ? "stage" : "string" };
    return refused({ code: "place.list-shape", place, read: String(wrong.group), want: `1 to ${count}` });
  }
  const groups: ListedUnit[][] = Array.from({ length: count }, () => []);
  for (const unit of list.value) if (unit.group !== undefined) groups[unit.group - 1]?.push(unit);
  return accepted(
    groups.map((group) =>
      group
        .map((unit, i) => ({ serial: unit.serial, at: unit.place ?? i + 1, i }))
        .sort((a, b) => a.at - b.at || a.i - b.i)
        .map(({ serial }) => serial),
    ),
  );
}
