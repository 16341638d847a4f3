// The blend that check and order are about: the same as the plan's, part by part, cent by cent.
import { expect, test } from "vitest";
import { checkedBlend } from "../../src/cli/checkedBlend.ts";
import { run } from "../../src/cli/program.ts";
import { rowsOf } from "../support/blendLab.ts";
import { fakePorts } from "../support/fakePorts.ts";

const csv = rowsOf(
  { price: 3, available: 26, supplier: "North", leakage: 300 },
  { capacitance: 150, price: 5, supplier: "South", "on hand": 4, leakage: 250 },
);
const resistors =
  "family,tolerance [%],power [W],voltage [V],price,currency,pack,supplier\nlab,5,2,350,0.10,EUR,10,North\ndear,5,2,350,0.90,EUR,1,South";
const asked = ["--energy", "300 J", "--voltage", "1200 V", "--ripple", "100 %", "--basis", "nominal"];
const line = [...asked, "--catalog", "c.csv", "--resistors", "r.csv"];
const texts = { "c.csv": csv, "r.csv": resistors };

async function cli(argv: readonly string[], more: Record<string, string> = {}) {
  const ports = fakePorts({ ...texts, ...more });
  const status = await run(argv, ports);
  return { status, out: ports.printed(), err: ports.told() };
}

test("check --layout and --blend of a plan's blend give the plan's figures; order's bill comes to its cost", async () => {
  for (const cost of ["0", "2", "North: 9; 1"]) {
    const more = ["--shipment-cost", cost];
    const { blends } = JSON.parse((await cli(["plan", ...line, "--blend", "--json", ...more])).out);
    const [best] = blends;
    expect(best.strings.length, cost).toBe(2);
    const { certificate: _, ...found } = best;
    const file = { "b.json": JSON.stringify(best) };
    const checked = await cli(["check", ...line, "--layout", "b.json", "--json", ...more], file);
    expect(checked.status).toBe(0);
    expect(JSON.parse(checked.out)).toMatchObject(found);
    const bill = await cli(["order", ...line, "--layout", "b.json", "--json", ...more], file);
    const { totals, layout, lines } = JSON.parse(bill.out);
    expect([layout, totals.purchase]).toEqual([best.id, best.cost.total]);
    expect(lines.filter((one: { line: string }) => one.line === "shipment")).toHaveLength(best.shipments.length);
    expect(lines.filter((one: { line: string }) => one.line === "dump resistor")).toHaveLength(1);
  }
});

test("check of a blend as text: groups, faults with what the others bring, cautions; 1 when a check fails", async () => {
  const good = await cli(["check", ...line, "--blend", "a 4s6p cross-tied + b 4s2p cross-tied"]);
  expect(good.out).toMatch(/In?f? one thing fails/i);
  expect(good.out).toContain("Cautions");
  expect(good.out).toContain("both at most");
  const short = await cli(["check", ...line, "--blend", "a 2s6p cross-tied + b 4s1p"]);
  expect([short.status, /CHECKS? FAILED/.test(short.out)]).toEqual([1, true]);
  const bill = await cli(["order", ...line, "--blend", "a 2s6p cross-tied + b 4s1p", "--format", "md"]);
  expect([bill.status, /Do not buy this bank/.test(bill.err)]).toEqual([1, true]);
});

test.each([
  [["--blend", "a 4s6p cross-tied + c 4s2p cross-tied"], "unknown-part"],
  [["--blend", "nothing"], "bad-blend"],
  [["--blend", "a 4s1p", "--shipment-cost", "x"], "bad-value"],
  [["--blend", "a 4s1p", "--witness", "1e4"], "contradiction"],
  [["--blend", "a 4s1p", "--measured", "m.csv"], "contradiction"],
])("check %j is refused: %s", async (flags, code) => {
  const { status, out } = await cli(["check", ...line, ...flags, "--json"]);
  expect(status).toBe(2);
  expect(JSON.stringify(JSON.parse(out))).toContain(code);
});

test("checkedBlend(brief, flags, ports): null where the flags speak of one layout; a fuse catalogue is not for blends", async () => {
  const flags = { part: "a", series: "4", parallel: "1" };
  expect(checkedBlend(undefined, flags, fakePorts(texts))).toEqual({ ok: true, value: null });
  expect((await cli(["order", ...line, "--blend", "a 4s1p", "--fuses", "f.csv"])).status).toBe(2);
});
