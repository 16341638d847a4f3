import { describe, expect, test } from "vitest";
import { readPositions } from "../../src/catalog/positions.ts";

describe("readPositions(text, file)", () => {
  test("stage or string counts from 1, a blank one is a spare, other columns of a written list do no harm", () => {
    const text = "stage,place,serial,use,capacitance [uF],share [%]\n2,1,a,fitted,470,25\n,,b,spare,471,\n";
    const read = readPositions(text, "l.csv");
    expect(read).toMatchObject({ ok: true, value: { faults: [] } });
    expect(read.ok && read.value.units).toEqual([
      { serial: "a", group: 2, place: 1, line: 2 },
      { serial: "b", line: 3 },
    ]);
    expect(readPositions("string,serial\n1,a\n", "l")).toMatchObject({ ok: true, value: { units: [{ group: 1 }] } });
  });

  test("a stage that is no whole number costs its row; no serial heading refuses the file", () => {
    expect(readPositions("stage,serial\n0,a\n1.5,b\n1,c\n", "l")).toMatchObject({
      ok: true,
      value: { units: [{ serial: "c" }], faults: [{ place: { line: 2 } }, { place: { line: 3 } }] },
    });
    expect(readPositions("stage\n1\n", "l")).toMatchObject({ ok: false, refusals: [{ code: "missing-heading" }] });
  });
});
