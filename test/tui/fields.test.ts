// The brief's fields: every one is a key that the brief knows, and shows its value as text.
import { expect, test } from "vitest";
import { BRIEF_KEYS, readBrief } from "../../src/search/index.ts";
import { FIELDS, fieldAt, shownValue, valueIn } from "../../src/tui/fields.ts";

test("every field is a key of the brief, once, and the three that must be given come first", () => {
  const keys = FIELDS.map(({ key }) => key);
  expect(keys.filter((key) => !BRIEF_KEYS.includes(key.split(".")[0] ?? ""))).toEqual([]);
  expect(new Set(keys).size).toBe(keys.length);
  expect(keys.slice(0, 3)).toEqual(["energy", "voltage", "ripple"]);
});

test("what a blank is said to stand for is what the brief takes it for", () => {
  const read = readBrief({ energy: 1, voltage: 1, ripple: 1 });
  if (!read.ok) throw new Error("a brief of three numbers is refused");
  const shown = Object.fromEntries(FIELDS.map((field) => [field.key, shownValue(field, valueIn(read.value, field))]));
  const said = Object.fromEntries(FIELDS.map(({ key, blank }) => [key, blank]));
  for (const key of ["basis", "hold", "touchSafe", "maxSeries", "maxUnits"])
    expect([key, said[key]]).toEqual([key, shown[key]]);
  expect([said.derating, shown.derating]).toEqual(["90 % of rated voltage", "90 %"]);
  expect([said.risk, shown.risk]).toEqual(["0.01 %", "0.01 %"]);
  for (const key of ["overshoot", "ageing"]) expect([key, said[key], shown[key]]).toEqual([key, "none", "0 %"]);
  expect([said.spares, shown.spares]).toEqual(["none", "0"]);
  for (const key of ["maxCost", "maxVolume", "maxMass"])
    expect([key, said[key], shown[key]]).toEqual([key, "no limit", ""]);
});

test("fieldAt(index) of an index that is not there is the first", () => {
  expect(fieldAt(-1).key).toBe("energy");
  expect(fieldAt(999).key).toBe("energy");
  expect(fieldAt(1).key).toBe("voltage");
});

test("valueIn(brief, field): a point in the key goes one level down; without a load there is no value", () => {
  const load = { resistance: "50 mohm", inductance: "20 uH" };
  const read = readBrief({ energy: 1, voltage: 1, ripple: 1, load });
  const without = readBrief({ energy: 1, voltage: 1, ripple: 1 });
  if (!read.ok || !without.ok) throw new Error("a brief with a load is refused");
  const fields = FIELDS.filter(({ key }) => key.startsWith("load."));
  expect(fields.map((field) => shownValue(field, valueIn(read.value, field)))).toEqual(["50 mohm", "20 \u00b5H", ""]);
  expect(fields.map((field) => shownValue(field, valueIn(without.value, field)))).toEqual(["", "", ""]);
  const field = FIELDS.find(({ key }) => key === "load.recorded") ?? fieldAt(0);
  expect(
    shownValue(field, [
      [0, 0],
      [1, 2],
    ]),
  ).toBe("2 samples");
});
