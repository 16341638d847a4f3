import { describe, expect, test } from "vitest";
import { dateOf, dueWords } from "../../src/cli/watchedText.ts";
import { cli, smallBank } from "../support/placeCli.ts";

describe("dueWords(due)", () => {
  const due = { axis: "shots", best: 5000, soonest: 4120.4, latest: 7001, stretch: 2 } as const;
  test("the interval is rounded outward; no more is said than the readings hold", () => {
    expect(dueWords(due)).toBe("5000 (4120 to 7010)");
    expect(dueWords({ ...due, best: 8116, soonest: 8116 })).toBe("8110 (8110 to 7010)");
    expect(dueWords({ ...due, latest: null })).toBe("5000 (4120 to no telling how late)");
    expect(dueWords({ ...due, best: null, latest: null })).toBe("not before 4120");
    expect(dueWords({ ...due, stretch: 11 })).toBe("not within 10 times what was watched");
    expect(dueWords({ ...due, best: null, soonest: null, latest: null, stretch: null })).toBe("no drift towards it");
  });
  test("days are dates, as long as there are dates", () => {
    expect(dateOf(11016)).toBe("2000-02-29");
    expect(dateOf(4e6)).toBeNull();
    expect(dueWords({ axis: "day", best: 11016.2, soonest: 11015.9, latest: 4e6, stretch: 1 })).toBe(
      "2000-02-29 (2000-02-28 to after the year 9999)",
    );
  });
});

describe("commission SHEET --history FILE", () => {
  const log =
    "date,fired,serial,capacitance [uF],uncertainty [%]\n2026-01-01,100,u0,469,0.3\n2026-07-01,900,u0,400,0.3\n2026-07-01,,u1,470,0.3\n";
  const run = async (...more: string[]) => {
    const { out } = await smallBank();
    return cli(["commission", "bank.json", "--history", "log.csv", ...more], { "bank.json": out, "log.csv": log });
  };

  test("without readings: the log alone; a unit that is due ends with 1", async () => {
    const { status, out } = await run("--capacitance-lost", "10 %");
    expect(status).toBe(1);
    expect(out).toMatch(/^Log: 1000 shots, 2026-01-01 to 2026-07-01/);
    expect(out).toMatch(/u0 +capacitance +-14\.9 % \+-0\.\d+ % +yes +DUE/);
    expect(out).toMatch(/FAIL, capacitance lost: Due: u0\. Take out/);
    expect((await run("--capacitance-lost", "30 %")).status).toBe(0);
  });

  test("without an end of life nothing is judged; JSON says not assessed and holds no verdict", async () => {
    const { status, out } = await run("--json");
    expect(status).toBe(0);
    const found = JSON.parse(out);
    expect(found).toMatchObject({
      verdict: null,
      suspects: [],
      next: null,
      history: { shots: 1000, from: "2026-01-01" },
    });
    expect(found.history.units.every((one: { verdict: string }) => one.verdict === "not assessed")).toBe(true);
  });

  test("an end of life without a log is refused", async () => {
    const { out } = await smallBank();
    const { status, err } = await cli(["commission", "b", "--readings", "r", "--esr-grown", "100 %"], {
      b: out,
      r: "",
    });
    expect([status, err]).toEqual([2, expect.stringMatching(/--history FILE beside it/)]);
  });
});
