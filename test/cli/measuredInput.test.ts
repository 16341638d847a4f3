import { describe, expect, test } from "vitest";
import { readMeasuredInput } from "../../src/cli/measuredInput.ts";
import { at, fakePorts } from "../support/fakePorts.ts";

const read = (text: string, part?: string) => readMeasuredInput("m.csv", part, fakePorts({ "m.csv": text }).files);
const HEAD = "serial,capacitance [uF],part,polarity\n";

describe("readMeasuredInput(path, part, files)", () => {
  test("none, another kind of file, a serial twice: refused", () => {
    expect(readMeasuredInput(undefined, undefined, fakePorts().files)).toMatchObject({
      refusals: [{ code: "missing-option" }],
    });
    expect(readMeasuredInput(at("catalogs/fuses.csv"), undefined, fakePorts().files)).toMatchObject({
      refusals: [{ code: "wrong-kind" }],
    });
    expect(read(`${HEAD}a,1,,\na,2,,\n`)).toMatchObject({
      ok: false,
      refusals: [{ code: "duplicate-serial", place: { line: 3 } }],
    });
  });

  test("of the part asked for where any is; else all", () => {
    const text = `${HEAD}a,1,x,+\nb,2,y,\n`;
    const serials = (part?: string) => {
      const found = read(text, part);
      return found.ok && found.value.units.map((unit) => unit.serial);
    };
    expect(serials("x")).toEqual(["a"]);
    expect(serials("z")).toEqual(["a", "b"]);
    expect(serials()).toEqual(["a", "b"]);
    expect(read(text)).toMatchObject({ value: { units: [{ group: "+" }, {}] } });
  });
});
