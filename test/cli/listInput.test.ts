import { describe, expect, test } from "vitest";
import { readGroups, readPins, readRooms } from "../../src/cli/listInput.ts";
import { fakePorts } from "../support/fakePorts.ts";

const { files } = fakePorts({
  "l.csv": "serial,stage,place\na,2,2\nb,2,1\nc,1,\nd,,\n",
  "bad.csv": "serial,stage\na,x\n",
});

describe("readPins(given, files)", () => {
  test("written out or listed, counted from 1; a blank stage is no pin", () => {
    expect(readPins(["a=b=3", "l.csv"], files)).toEqual({
      ok: true,
      value: [
        { serial: "a=b", group: 2 },
        { serial: "a", group: 1 },
        { serial: "b", group: 1 },
        { serial: "c", group: 0 },
      ],
    });
  });
  test("a row that cannot be read refuses the list", () => {
    expect(readPins(["bad.csv"], files)).toMatchObject({ ok: false, refusals: [{ place: { line: 2 } }] });
    expect(readPins(["none.csv"], files)).toMatchObject({ ok: false, refusals: [{ code: "no-such-file" }] });
  });
});

describe("readRooms(given)", () => {
  test("counted from 1; the group may hold anything", () => {
    expect(readRooms(["3=snap-in", "1=a=b"])).toEqual({
      ok: true,
      value: [
        { group: 2, takes: "snap-in" },
        { group: 0, takes: "a=b" },
      ],
    });
  });
  test("anything else is refused", () => {
    for (const text of ["snap-in", "snap-in=3", "3=", ""])
      expect(readRooms([text])).toMatchObject({ ok: false, refusals: [{ place: { field: "--rooms" } }] });
  });
});

describe("readGroups(path, shape, files)", () => {
  test("by stage, in the order of place", () => {
    expect(readGroups("l.csv", { series: 2, parallel: 2, ties: "cross-tied" }, files)).toEqual({
      ok: true,
      value: [["c"], ["b", "a"]],
    });
  });
  test("a stage that the bank has not is refused with its line", () => {
    expect(readGroups("l.csv", { series: 1, parallel: 2, ties: "cross-tied" }, files)).toMatchObject({
      refusals: [{ code: "place.list-shape", place: { file: "l.csv", line: 2, field: "stage" } }],
    });
  });
});
