import { expect, test } from "vitest";
import { placeCsv } from "../../src/cli/placeCsv.ts";
import type { Position } from "../../src/place/index.ts";

const row: Position = {
  use: "fitted",
  group: 2,
  place: 1,
  serial: '=a,"b',
  capacitance: 470.1e-6,
  leakage: 1.23e-4,
  esr: null,
  lot: "A",
  part: null,
  note: null,
  share: 0.25,
};

test("placeCsv: in bench units without dust, unknown is blank, no serial is a formula", () => {
  const lines = placeCsv([row], "cross-tied", 1000).split("\r\n");
  expect(lines[0]).toBe(
    "stage,place,serial,use,capacitance [uF],leakage [uA],esr [mohm],lot,part,share [%],voltage [V],note",
  );
  expect(lines[1]).toBe('2,1,"\'=a,""b",fitted,470.1,123,,A,,25,250,');
  expect(placeCsv([{ ...row, group: null, place: null, share: null }], "strings", null).split("\r\n")[1]).toMatch(
    /^,,"'=a/,
  );
  expect(placeCsv([row], "strings", null)).toMatch(/^string,/);
});
