// The file beside a catalogue: laid over by plan and parts alike, refused when it cannot be read, written beside and nowhere else.
import { expect, test } from "vitest";
import { partsCommand } from "../../src/cli/commands/parts.ts";
import { laidOver, overridesOf, overridesPath, saveOverrides } from "../../src/cli/overrides.ts";
import { readStock } from "../../src/cli/stock.ts";
import { fakePorts } from "../support/fakePorts.ts";

const catalogue = "part,capacitance [uF],voltage [V]\none,100,400\n";
const beside = "a.csv.overrides.json";
const withHand = { "a.csv": catalogue, [beside]: '{"version":1,"parts":{"one":{"esr":"20 mohm"}}}' };

test("overridesPath(catalogue): beside it; standard input has no place", () => {
  expect([overridesPath("x/a.csv"), overridesPath("-")]).toEqual(["x/a.csv.overrides.json", null]);
});

test("overridesOf(catalogue, files): none where there is no file; broken JSON is refused with its line", () => {
  expect(overridesOf("a.csv", fakePorts({ "a.csv": catalogue }).files)).toEqual({ ok: true, value: {} });
  expect(overridesOf("-", fakePorts().files)).toEqual({ ok: true, value: {} });
  const broken = overridesOf("a.csv", fakePorts({ [beside]: '{"parts":\n{' }).files);
  expect(broken).toMatchObject({ ok: false, refusals: [{ place: { file: beside, line: 2 } }] });
});

test("a stock and `parts` have the values set by hand, and say so with their file", () => {
  const ports = fakePorts(withHand);
  const stock = readStock({ catalog: ["a.csv"] }, ports.files);
  if (!stock.ok) throw new Error("must read");
  expect(stock.value.parts[0]?.esr).toBeCloseTo(0.02, 12);
  expect(stock.value.sources[0]).toMatchObject({
    overrides: { one: { esr: "20 mohm" } },
    notes: [{ code: "set-by-hand", place: { file: beside }, read: "1 value set by hand" }],
  });
  expect(partsCommand(["a.csv"], {}, ports)).toBe(0);
  expect(ports.printed()).toMatch(/esr 20 mohm \(set by hand beside the catalogue\)/);
});

test("laidOver: a bad override keeps the catalogue's value and is a fault", () => {
  const ports = fakePorts({ "a.csv": catalogue, [beside]: '{"parts":{"one":{"esr":"much"}}}' });
  const stock = readStock({ catalog: ["a.csv"] }, ports.files);
  expect(stock.ok && [stock.value.parts[0]?.esr, stock.value.sources[0]?.faults.length]).toEqual([undefined, 1]);
  expect(laidOver("-", [], ports.files)).toMatchObject({ ok: true, value: { parts: [], notes: [] } });
});

test("saveOverrides(catalogue, overrides, files): what was saved reads back; standard input is refused", () => {
  const ports = fakePorts();
  expect(saveOverrides("a.csv", { one: { esr: "1 ohm" } }, ports.files).ok).toBe(true);
  expect([...ports.written.keys()]).toEqual([beside]);
  const again = fakePorts({ [beside]: ports.written.get(beside) ?? "" });
  expect(overridesOf("a.csv", again.files)).toEqual({ ok: true, value: { one: { esr: "1 ohm" } } });
  expect(saveOverrides("-", {}, ports.files).ok).toBe(false);
});
