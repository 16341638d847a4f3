// Headings and rows: what binds to what, decimal commas, and that a bad row costs only itself.
import { describe, expect, test } from "vitest";
import { above, type Column, text } from "../../src/catalog/column.ts";
import { MOST_FAULTS, readTable } from "../../src/catalog/table.ts";

const COLUMNS: readonly Column[] = [
  { heading: "name", key: "name", type: text(20), required: true },
  { heading: "capacitance", also: ["cap"], key: "capacitance", type: above("capacitance", 1e-12, 10) },
  { heading: "derating", key: "derating", type: above("fraction", 0.05, 1) },
  { heading: "tolerance", key: "tolerance", type: { kind: "tolerance" } },
  { heading: "shots", key: "shots", type: { kind: "quantity", dimension: "count", least: 1, most: 1e9 } },
  { heading: "currency", key: "currency", type: { kind: "currency" } },
  { heading: "price", key: "price", type: { kind: "price" } },
];

function table(source: string) {
  const rows: Record<string, unknown>[] = [];
  const lines: number[] = [];
  const made = readTable(source, COLUMNS, "t.csv", (row) => {
    const named = COLUMNS.map((column, i) => [column.key, row.values[i]] as const);
    rows.push(Object.fromEntries(named.filter(([, v]) => v !== undefined)));
    lines.push(row.line);
  });
  const say = (r: { code: string; place: { line?: number; column?: number } }) =>
    `${r.code} ${r.place.line ?? "-"}:${r.place.column ?? "-"}`;
  return made.ok
    ? { rows, lines, faults: made.value.faults.map(say), notes: made.value.notes.map(say), count: made.value.rowCount }
    : { refused: made.refusals.map(say) };
}

describe("headings", () => {
  test("a required one missing, one twice, a unit of another kind: refused as a whole, all told at once", () => {
    expect(table("cap [uF]\n1\n").refused).toEqual(["missing-heading 1:-"]);
    expect(table("name,cap [uF],capacitance [nF]\na,1,2\n").refused).toEqual(["duplicate-heading 1:3"]);
    expect(table("cap [V],cap [uF],derating [V]\n1,2,3\n").refused).toEqual([
      "unknown-unit 1:1",
      "unknown-unit 1:3",
      "missing-heading 1:-",
    ]);
  });
  test("case, spaces and order are free; an unknown heading is passed over and told", () => {
    const made = table("Colour,  CAP  [uF] ,Name\nred,470,a\n");
    expect(made.rows).toEqual([{ name: "a", capacitance: 470e-6 }]);
    expect(made.notes).toEqual(["unknown-heading 1:1"]);
  });
  test.each([
    ["u", 470e-6],
    ["µ", 470e-6],
    ["μ", 470e-6],
    ["m", 0.47],
    ["n", 470e-9],
    ["p", 470e-12],
  ])("[%sF]: 470 is %d F, to the last bit", (prefix, value) =>
    expect(table(`name,cap [${prefix}F]\na,470\n`).rows).toEqual([{ name: "a", capacitance: value }]),
  );
  test("a fraction without a unit is a fraction, with [%] hundredths; a tolerance without a unit needs its sign", () => {
    expect(table("name,derating\na,0.85\n").rows).toEqual([{ name: "a", derating: 0.85 }]);
    expect(table("name,derating [%]\na,85\n").rows).toEqual([{ name: "a", derating: 0.85 }]);
    expect(table("name,tolerance\na,20\nb,20 %\n").faults).toEqual(["missing-unit 2:2"]);
  });
});

describe("rows", () => {
  test("a bad row costs itself, and every fault in it is told", () => {
    const made = table("name,cap [uF],shots\na,1,5\n,x,0\nc,3,7\n");
    expect(made.rows?.map((r) => r.name)).toEqual(["a", "c"]);
    expect(made.faults).toEqual(["missing-value 3:1", "not-a-number 3:2", "out-of-range 3:3"]);
    expect(made.lines).toEqual([2, 4]);
    expect(made.count).toBe(3);
  });
  test("short rows leave blanks", () => expect(table("name,cap [uF]\na\n").rows).toEqual([{ name: "a" }]));
  test("plain numbers by the quick way are the doubles nearest to what was written", () => {
    for (const digits of ["0.1", "470", "4.7", "1000000", "0.047", "123.456"]) {
      expect(table(`name,cap [uF]\na,${digits}\n`).rows?.[0]?.capacitance).toBe(Number(`${digits}e-6`));
    }
  });
  test("a count may not carry a unit or a sign", () =>
    expect(table("name,shots\na,-5\nb,5 V\n").faults).toEqual(["out-of-range 2:2", "wrong-unit 3:2"]));
  test("currency before price, whatever the order in the file", () =>
    expect(table("name,price,currency\na,3.5,KWD\n").rows).toEqual([{ name: "a", price: 3500, currency: "KWD" }]));
  test("faults are listed to a bound, then counted", () =>
    expect(table(`name,cap [uF]\n${"a,x\n".repeat(MOST_FAULTS + 500)}`).faults?.length).toBe(MOST_FAULTS + 1));
});

describe("decimal comma", () => {
  test("semicolons or tabs: 4,7 is 4.7, and 1,500 beside it 1.5", () => {
    expect(table("name;cap [uF]\na;4,7\nb;1,500\n").rows?.map((r) => r.capacitance)).toEqual([4.7e-6, 1.5e-6]);
    expect(table("name\tcap [uF]\na\t4,7\n").rows?.map((r) => r.capacitance)).toEqual([4.7e-6]);
  });
  test("prices too", () => expect(table("name;price\na;3,90\n").rows).toEqual([{ name: "a", price: 390 }]));
  test("commas: 1,500 in quotes is refused, nobody can tell", () =>
    expect(table('name,cap [uF]\na,"1,500"\n').faults).toEqual(["ambiguous-comma 2:2"]));
  // Where commas are decimal marks a point groups thousands: 1.500 is 1500 to the writer and 1.5 to us.
  test("semicolons and decimal commas: 1.500 is refused, nobody can tell", () =>
    expect(table("name;cap [uF]\na;4,7\nb;1.500\n").faults).toEqual(["ambiguous-comma 3:2"]));
});
