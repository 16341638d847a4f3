import { describe, expect, test } from "vitest";
import { dayOf, readHistory } from "../../src/catalog/history.ts";

const rowsOf = (text: string) => {
  const read = readHistory(text, "log.csv");
  if (!read.ok) throw new Error(read.refusals[0]?.code);
  return read.value;
};

describe("dayOf(date)", () => {
  test("2000-02-29 is day 11016, 1970-01-01 day 0; days that are none have none", () => {
    expect(["1970-01-01", "2000-02-29", "2026-12-31"].map(dayOf)).toEqual([0, 11016, 20818]);
    expect(["2026-02-29", "1900-02-29", "2026-13-01", "2026-04-31", "2026-1-1", "1.2.2026", ""].map(dayOf)).toEqual(
      Array(7).fill(null),
    );
  });
});

describe("readHistory(text, file)", () => {
  test("shots run on by date, whatever the order of the file; a measurement has the shots of its day", () => {
    const { rows, faults } = rowsOf(
      "date,fired,serial,capacitance [uF],esr [mohm],esr uncertainty [%]\n2026-03-01,,u1,470,200,5\n2026-02-01,100,,,,\n2026-01-01,50,,,,\n",
    );
    expect(faults).toEqual([]);
    expect(rows.map(({ shots }) => shots)).toEqual([50, 150, 150]);
    expect(rows[2]).toMatchObject({ serial: "u1", esr: expect.closeTo(0.2, 12), esrUncertainty: 0.05 });
  });

  test("before the first counter nobody knows; a counter is carried on, and may not go back", () => {
    const { rows, faults } = rowsOf(
      "date,shots,fired\n2026-01-01,,\n2026-01-02,500,\n2026-01-03,,10\n2026-01-04,505,\n2026-01-05,600,\n",
    );
    expect(rows.map(({ shots }) => shots)).toEqual([undefined, 500, 510, 600]);
    expect(faults).toMatchObject([{ code: "contradiction", place: { line: 5, field: "shots" }, read: "505" }]);
  });

  test("without shots none are made up; no such day, and a value without its unit, are faults of their row", () => {
    const { rows, faults } = rowsOf(
      "date,serial,capacitance [uF]\n2026-02-30,u1,470\n2026-02-01,,470\n2026-02-01,u1,469\n",
    );
    expect(rows).toMatchObject([{ serial: "u1", line: 4 }]);
    expect(rows[0]).not.toHaveProperty("shots");
    expect(faults.map(({ code, place }) => [code, place.line])).toEqual([
      ["bad-value", 2],
      ["missing-value", 3],
    ]);
  });
});
