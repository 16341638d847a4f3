import { describe, expect, test } from "vitest";
import { readSheet } from "../../src/cli/bankSheet.ts";
import { at, fakePorts } from "../support/fakePorts.ts";
import { cli, smallBank } from "../support/placeCli.ts";

const read = (text: string, wishes = {}) => readSheet("s.json", wishes, fakePorts({ "s.json": text }).files);

describe("readSheet(path, wishes, files)", () => {
  test("what is no sheet is refused with what would do", () => {
    for (const text of [
      "[]",
      "{}",
      '{"series":2,"parallel":2,"ties":"tied"}',
      '{"series":2,"parallel":1,"ties":"strings"}',
    ])
      expect(read(text)).toMatchObject({ ok: false, refusals: [{ code: "bad-sheet", place: { file: "s.json" } }] });
    expect(read("{")).toMatchObject({ ok: false, refusals: [{ code: "bad-json" }] });
  });

  test("a placing: stage sums, resistor, limit; a flag beats the sheet; a list cut short is refused", async () => {
    const { out, bank } = await smallBank();
    const sheet = read(out);
    if (!sheet.ok) throw new Error();
    const sum = bank.groups[0].reduce(
      (c: number, s: string) => c + bank.units.find((u: { serial: string }) => u.serial === s).capacitance,
      0,
    );
    expect(sheet.value.chains[0]?.[0]).toMatchObject({ capacitance: expect.closeTo(sum, 12), resistance: 1e5 });
    expect(sheet.value).toMatchObject({ limit: 360, voltage: 1000, notes: [] });
    const other = read(out, { limit: 340, resistance: "none" });
    expect(other.ok && [other.value.limit, other.value.chains[0]?.[0]?.resistance]).toEqual([
      340,
      Number.POSITIVE_INFINITY,
    ]);
    expect(read(JSON.stringify({ ...bank, groups: bank.groups.slice(1) }))).toMatchObject({ ok: false });
    expect(read(JSON.stringify({ ...bank, units: bank.units.slice(3) }))).toMatchObject({ ok: false });
  });

  test("a layout of check: nominal units, the tolerance as the doubt, said", async () => {
    const argv = [
      "check",
      "--energy",
      "100 J",
      "--voltage",
      "600 V",
      "--ripple",
      "100 %",
      "--catalog",
      at("catalogs/drawer.csv"),
    ];
    const { out } = await cli([
      ...argv,
      "--part",
      "drawer-pf-330-360",
      "--series",
      "2",
      "--parallel",
      "4",
      "--ties",
      "cross-tied",
      "--json",
    ]);
    const sheet = read(out);
    if (!sheet.ok) throw new Error();
    expect(sheet.value.chains[0]?.[0]?.capacitance).toBeCloseTo(4 * 330e-6, 9);
    expect(sheet.value.doubt.capacitance).toBeCloseTo((0.1 + 0.2) / 2 / Math.sqrt(3) / 2, 6);
    expect(sheet.value.notes.join()).toMatch(/no measured units/);
  });
});
