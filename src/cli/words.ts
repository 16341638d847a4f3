// Every refusal as a sentence: where, what is wrong, what stood there, what would be accepted.

import { visible } from "../order/index.ts";
import type { Place, Refusal } from "../quantity/index.ts";

/** What each code means, in a clause. Every code used in src has one (a test). */
export const WORDS: Readonly<Record<string, string>> = {
  "ambiguous-comma": "the comma may group thousands or mark the decimals",
  "bad-balance": "this is no balancing resistor",
  "bad-breaks": "the price breaks cannot be read",
  "bad-brief": "this is no brief",
  "bad-choice": "this is not among the choices",
  "bad-count": "this is no whole number in range",
  "bad-currency": "this is no currency code",
  "bad-json": "this is not JSON",
  "bad-blend": "this is no blend",
  "bad-layout": "this is no layout",
  "bad-path": "the system cannot use this path",
  "bad-position": "the bank has no such place",
  "bad-price": "this is no price",
  "bad-sheet": "this is no sheet of a placed bank",
  "bad-tolerance": "this is no tolerance",
  "bad-value": "the value cannot be used",
  "bad-yes-no": "this is neither yes nor no",
  "binary-file": "the file is not text",
  "broken-quotes": "the quotes do not match",
  "row-too-long": "the row has more cells than there are headings",
  "set-by-hand": "values of this catalogue are set by hand",
  commission: "the readings cannot be judged",
  contradiction: "values contradict each other",
  "disk-full": "the disk is full; nothing was written",
  "duplicate-heading": "a heading stands twice",
  "duplicate-line": "a line stands twice",
  "duplicate-key": "a key stands twice",
  "duplicate-part": "a part stands twice",
  "duplicate-serial": "a serial stands twice",
  empty: "the value is blank",
  "empty-file": "there is nothing to read",
  "file-exists": "the file exists already; it was left as it is",
  "input-twice": "standard input can be read once",
  "is-directory": "this is a folder",
  "missing-heading": "a heading is missing",
  "missing-option": "something needed was not given",
  "missing-unit": "the unit is missing",
  "missing-value": "a value is missing",
  "more-faults": "there are more faults than are listed",
  "newer-version": "the file was written by a newer version of this program",
  "no-input": "standard input is closed",
  "no-parts": "no part could be read",
  "no-permission": "the system does not allow it",
  "no-rows": "there are no rows",
  "no-such-file": "there is no such file",
  "not-a-number": "this is no number",
  "not-finite": "the number is not finite",
  "not-utf8": "the text is not UTF-8",
  "out-of-range": "the value is out of range",
  place: "the measured units or the shape cannot be placed",
  "place.another-part": "the measured units are not of this part",
  "place.duplicate-serial": "a serial stands twice",
  "place.list-shape": "the list does not fit the shape of the bank",
  "place.list-unknown": "no measured unit has this serial",
  "place.not-fitted": "this unit is not in the bank",
  "place.pin-full": "more units are pinned than there is room for",
  "place.pin-group": "there is no such place to pin to",
  "place.room-group": "there is no such stage or string",
  "place.room-twice": "a stage or string is given two groups",
  "place.room-unknown": "no measured unit is of this group",
  "place.pin-twice": "a unit is pinned twice",
  "place.pin-unknown": "no unit with the pinned serial",
  "place.too-few": "there are too few units",
  "pulse.bus": "the bus cannot be reckoned with",
  "pulse.charge": "the charger cannot be reckoned with",
  "pulse.circuit": "the circuit cannot be reckoned with",
  "pulse.drop": "the switch drop leaves nothing for the load",
  "pulse.steady": "the bank cannot hold this current for so long",
  "pulse.lamp": "the lamp cannot be reckoned with",
  "pulse.lampDrive": "the lamp circuit cannot be sized",
  "pulse.loop": "the loop cannot be reckoned with",
  "pulse.samples": "the waveform cannot be read",
  "read-only": "the place is read-only; nothing was written",
  "tolerance-range": "the tolerance is out of range",
  "small-lot": "there are too few measured units",
  "too-deep": "the nesting is too deep",
  "too-large": "the file is too large",
  "too-long": "the text is too long",
  "two-currencies": "prices are in different currencies",
  "unknown-column-name": "no column has this name",
  "unknown-heading": "the heading is not known",
  "unknown-key": "the key is not known",
  "unknown-part": "no catalogue has this part",
  "unknown-supplier": "no catalogue has this supplier",
  "unknown-unit": "the unit is not known",
  unreadable: "the system cannot use this file",
  "wrong-kind": "this is another kind of file",
  "wrong-unit": "the unit is one of another quantity",
};

/** Words of a code; `pulse.lamp.bore` has those of its family `pulse.lamp`. */
export const wordsOf = (code: string): string => WORDS[code] ?? WORDS[code.replace(/\.[^.]*$/, "")] ?? visible(code);

/** `file:line:column heading`, as much of it as is known; empty when nothing is. */
export function placeWords({ file, line, column, field }: Place): string {
  const spot = [file, line, line === undefined ? undefined : column].filter((part) => part !== undefined).join(":");
  return visible([spot, field ?? ""].filter((part) => part !== "").join(" "));
}

/** Longest piece of input that is repeated, characters: enough to find it again. */
const LONGEST_READ = 200;

const clipped = (text: string): string =>
  text.length <= LONGEST_READ ? text : `${text.slice(0, LONGEST_READ)}... (${text.length} characters)`;

/** One sentence, safe to print. */
export function refusalWords({ code, place, read, want }: Refusal): string {
  const where = placeWords(place);
  const what = `${wordsOf(code)}: read ${visible(clipped(read))}; accepted: ${visible(want)}`;
  return where === "" ? what : `${where}: ${what}`;
}
