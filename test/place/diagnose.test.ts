import { describe, expect, test } from "vitest";
import { diagnose } from "../../src/place/diagnose.ts";
import { FAULT_KINDS } from "../../src/place/diagnoseFaults.ts";
import type { Diagnosis } from "../../src/place/diagnoseRequest.ts";
import { seeded } from "../../src/place/random.ts";
import { trial } from "./faults.ts";

const done = (request: Parameters<typeof diagnose>[0]): Diagnosis => {
  const read = diagnose(request);
  if (!read.ok) throw new Error(read.refusals[0]!.code);
  return read.value;
};

describe("diagnose(request): simulated banks, voltages from the exact course, with meter noise", () => {
  test("21 faults: right place and kind first in at least 20, never a false agreement", { timeout: 60_000 }, () => {
    const random = seeded(11);
    let right = 0;
    for (let k = 0; k < 21; k++) {
      const kind = FAULT_KINDS[k % FAULT_KINDS.length]!;
      const { request, position } = trial(kind, random);
      const made = done(request);
      expect(made.verdict).not.toBe("agrees");
      if (made.suspects[0]?.kind === kind && made.suspects[0].position === position) right++;
    }
    expect(right).toBeGreaterThanOrEqual(20);
  });
  test("5 sound banks: agreement", { timeout: 60_000 }, () => {
    const random = seeded(12);
    for (let k = 0; k < 5; k++) {
      const made = done(trial(null, random).request);
      expect(made.verdict).toBe("agrees");
      expect(made.sound).toBeGreaterThan(0.5);
    }
  });
});

describe("diagnose(request): the answer", () => {
  const stages = [1, 2, 3].map(() => ({ capacitance: 1e-2, conductance: 2e-6, resistance: 47e3 }));
  const row = (volts: readonly (number | null)[], more: object = {}) => ({
    seconds: 0,
    bank: 900,
    volts,
    total: 900,
    ...more,
  });
  const asked = { stages, rows: [row([300, 300, 300])], meter: { relative: 0.001, absolute: 0.1 }, limit: 405 };

  test("even readings agree; only read at once, the next is a reading after a hold", () => {
    const made = done(asked);
    expect(made).toMatchObject({ verdict: "agrees", suspects: [], actions: [], unexplained: false });
    expect(made.next?.action).toBe("read after a hold");
  });
  test("a reading over the limit stops, with the order of actions and where", () => {
    const made = done({ ...asked, rows: [row([410, 245, 245])] });
    expect(made.verdict).toBe("stop");
    expect(made.actions.length).toBeGreaterThan(5);
    expect(made.findings.find((f) => f.id === "commission.over-limit")!.note).toContain("Stage 1");
    expect(made.suspects[0]).toMatchObject({ position: 0, kind: "low capacitance" });
  });
  test("readings that do not add up are flagged, whatever the verdict", () => {
    const made = done({ ...asked, rows: [row([300, 280, 300])] });
    expect(made.findings.map((f) => f.id)).toContain("commission.sum");
    expect(made.verdict).toBe("differs");
  });
  test("a swapped lead is told from a reversed unit", () => {
    const lead = done({ ...asked, rows: [row([300, -300, 300])] });
    expect(lead.suspects[0]).toMatchObject({ position: 1, kind: "meter lead swapped" });
    const reversed = done({ ...asked, limit: 600, rows: [row([449.5, 1, 449.5])] });
    expect(reversed.suspects[0]).toMatchObject({ position: 1, kind: "reversed unit" });
    expect(reversed.verdict).toBe("stop");
  });
  test("two stages at once differ from any single fault: unexplained", () => {
    const made = done({ ...asked, rows: [row([330, 250, 320])] });
    expect(made).toMatchObject({ verdict: "differs", unexplained: true });
  });
  test("going on: a step that a likely fault would carry over the limit is not safe; no limit, not assessed", () => {
    const rows = [row([320, 290, 290])];
    const next = { bank: 1150, seconds: 60 };
    expect(done({ ...asked, rows, next }).goOn).toMatchObject({ safe: false, position: 0 });
    expect(done({ ...asked, next: { bank: 1000, seconds: 60 } }).goOn).toMatchObject({ safe: true });
    const { limit: _, ...unlimited } = asked;
    expect(done({ ...unlimited, next }).goOn!.safe).toBeNull();
  });
  test("refusals: no readings, a wrong count, no uncertainty", () => {
    const codes = (request: Parameters<typeof diagnose>[0]) => {
      const read = diagnose(request);
      return read.ok ? [] : read.refusals.map((r) => r.code);
    };
    expect(codes({ ...asked, rows: [] })).toContain("commission.no-readings");
    expect(codes({ ...asked, rows: [row([300, 300])] })).toContain("commission.count");
    expect(codes({ ...asked, rows: [row([300, 300, Number.NaN])] })).toContain("commission.number");
    expect(codes({ ...asked, meter: { relative: 0, absolute: 0 } })).toContain("commission.meter");
  });
});
