// Files of earlier formats still read to what they meant; files of later ones are refused as such, by file, line and column.
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { filesOn } from "../src/cli/index.ts";
import { run } from "../src/cli/program.ts";
import { isNewer, readSaved } from "../src/tui/saved.ts";
import { at, fakePorts } from "./support/fakePorts.ts";

const AT = "fixtures/versions";
const old = (name: string): string => at(`${AT}/${name}`);
const read = (name: string): string => readFileSync(old(name), "utf8");
const CATALOG = ["--catalog", at("catalogs/drawer.csv"), "--resistors", at("catalogs/resistors.csv")];
const ASKED = ["--energy", "2.4 kJ", "--voltage", "2.2 kV", "--ripple", "100 %", ...CATALOG];
const SHAPE = ["--part", "drawer-sc-4700-450", "--series", "8", "--parallel", "2", "--ties", "cross-tied"];

let folder = "";
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "versions-"));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

async function ran(...argv: readonly string[]) {
  const ports = { ...fakePorts(), files: filesOn() };
  const status = await run(argv, ports);
  return { status, out: ports.printed(), err: ports.told() };
}
const later = (name: string, text: string): string => {
  const path = join(folder, name);
  writeFileSync(path, text);
  return path;
};
const withVersion = (name: string, version: unknown): string =>
  later(name, JSON.stringify({ ...JSON.parse(read(name)), version }, null, 2));

test("every file of an earlier format is read by a test here", () => {
  const self = readFileSync(join(import.meta.dirname, "versions.test.ts"), "utf8");
  const unread = readdirSync(at(AT)).filter((name) => name !== "README.md" && !self.includes(`"${name}"`));
  expect(unread).toEqual([]);
});

describe("earlier formats", () => {
  test("brief without a version: the plan is that of the same brief as the first version", async () => {
    const plan = async (brief: string) => JSON.parse((await ran("plan", brief, ...CATALOG, "--json")).out);
    const [before, first] = [await plan(old("brief-before.json")), await plan(withVersion("brief-before.json", 1))];
    expect(before.layouts).toHaveLength(6);
    expect(first.layouts).toEqual(before.layouts);
    expect(first.brief).toEqual(before.brief);
  });

  test("layout without a version: the same bank, its resistor included; what is written now reads back too", async () => {
    const before = await ran("check", "--layout", old("layout-before.json"), ...ASKED, "--json");
    expect([before.status, before.err]).toEqual([0, ""]);
    const { version, id, balance } = JSON.parse(before.out);
    expect([version, id, balance]).toEqual([
      1,
      "drawer-sc-4700-450 8s2p cross-tied",
      JSON.parse(read("layout-before.json")).balance,
    ]);
    const again = await ran("check", "--layout", later("layout-1.json", before.out), ...ASKED, "--json");
    expect(again.out).toBe(before.out);
  });

  test("placing without a version: readings are judged against it as against one of the first", async () => {
    const readings = later(
      "readings.csv",
      "time [s],charge voltage [V],stage,voltage [V]\n1,300,1,100.1\n1,300,2,99.9\n1,300,3,100\n",
    );
    const judged = (sheet: string) => ran("commission", sheet, "--readings", readings, "--json");
    const [before, first] = [
      await judged(old("placing-before.json")),
      await judged(withVersion("placing-before.json", 1)),
    ];
    expect(JSON.parse(before.out).verdict).toBe("agrees");
    expect(first.out).toBe(before.out);
  });

  test.each(["bill-before.csv", "bill-1.csv"])(
    "%s: the builder's price, pack, value and own row are in the new bill",
    async (name) => {
      const { status, out, err } = await ran("order", ...ASKED, ...SHAPE, "--edited", old(name), "--json");
      expect(status, err).toBe(0);
      const bill = JSON.parse(out);
      const of = (kind: string) => bill.lines.find(({ line }: { line: string }) => line === kind);
      expect(of("lugs")).toMatchObject({
        value: "M6 ring",
        needed: 32,
        pack: 50,
        toBuy: 50,
        purchase: 12.5,
        state: "priced",
      });
      expect(of("own line")).toMatchObject({ item: "red wire", purchase: 13.2 });
      expect(bill.totals.purchase).toBe(245.76 + 12.5 + 13.2);
      const fresh = JSON.parse((await ran("order", ...ASKED, ...SHAPE, "--json")).out);
      expect(bill.lines).toHaveLength(fresh.lines.length + 1);
      // Nothing but what was written in is taken for the builder's.
      expect(err).not.toMatch(/\((?!lugs)[a-z ]+\), /);
    },
  );

  test("session of the first version: brief and place are back", () => {
    expect(readSaved(read("session-1.json"))).toMatchObject({
      values: { energy: "3 kJ", voltage: "2.2 kV" },
      screen: "brief",
      rank: "cost",
    });
    expect(isNewer(read("session-1.json"))).toBe(false);
  });
});

describe("later formats", () => {
  const refused = async (...argv: readonly string[]) => {
    const { status, out, err } = await ran(...argv);
    expect([status, out]).toEqual([2, ""]);
    expect(err).toMatch(/newer version/);
    return err;
  };

  test("brief, layout and placing are refused by file, line and column, and nothing else is said of them", async () => {
    const layout = withVersion("layout-before.json", 2);
    const placing = withVersion("placing-before.json", 9);
    const brief = later("brief.json", '{\n  "version": 2,\n  "watts": 3\n}');
    expect(await refused("plan", brief, ...CATALOG)).toMatch(
      /^\S*brief\.json:2:\d+ version: .*read version 2; accepted: version 1; .*\n$/,
    );
    expect(await refused("check", "--layout", layout, ...ASKED)).toMatch(/layout-before\.json:\d+:\d+ version/);
    expect(await refused("commission", placing, "--readings", at("fixtures/units/lot-200.csv"))).toMatch(
      /placing-before\.json:\d+:\d+ version.*read version 9/,
    );
    expect(await refused("commission", layout, "--readings", at("fixtures/units/lot-200.csv"))).toMatch(/version 2/);
  });

  test("a bill with a later mark is refused by the cell", async () => {
    const edited = later("bill.csv", read("bill-1.csv").replaceAll(",v1.", ",v2."));
    expect(await refused("order", ...ASKED, ...SHAPE, "--edited", edited)).toMatch(/bill\.csv:2:\d+ mark: /);
  });

  test("a session of a later version gives nothing, and is known for what it is", () => {
    const text = read("session-1.json").replace('"version": 1', '"version": 2');
    expect(readSaved(text)).toBeNull();
    expect(isNewer(text)).toBe(true);
    for (const ruin of ["", "{", "[2]", '{"version":"2"}', '{"version":1}']) expect(isNewer(ruin), ruin).toBe(false);
  });

  test("a version that is none is refused as a value, not passed over", async () => {
    const { status, err } = await ran("plan", withVersion("brief-before.json", "new"), ...CATALOG);
    expect([status, err]).toEqual([2, expect.stringMatching(/brief-before\.json:\d+:\d+ version: .*"new"/)]);
  });
});
