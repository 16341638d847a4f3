// The ports as the tests fill them: types hold, and answers are plain data that survive being sent to another thread.
import { expect, test } from "vitest";
import type { EnginePort, ScreenPorts } from "../../src/tui/ports.ts";
import { BRIEF, engine, fakePorts } from "../support/stock.ts";

test("an engine's answers are plain data", () => {
  const port: EnginePort = engine;
  const read = port.readBrief(BRIEF);
  if (!read.ok) throw new Error("brief");
  const planned = port.plan(read.value, { rank: "cost", most: 9, frontOnly: false, quick: true });
  expect(structuredClone(planned)).toEqual(planned);
});

test("the ports of the tests say what real ones say about a file that is there", async () => {
  const ports: ScreenPorts = fakePorts();
  const opened = await ports.open();
  if (!opened.ok) throw new Error("open");
  const { exportBill } = opened.value;
  const read = engine.readBrief(BRIEF);
  if (!read.ok) throw new Error("brief");
  const layout = engine.check(read.value, { part: "flash-a", series: 7, parallel: 4, ties: "strings" });
  const bill = layout === null ? null : engine.bill(read.value, layout);
  if (bill === null) throw new Error("bill");
  expect(exportBill(bill, "a.csv", false)).toEqual({ kind: "saved", path: "a.csv" });
  expect(exportBill(bill, "a.csv", false)).toEqual({ kind: "exists", path: "a.csv" });
  expect(exportBill(bill, "a.csv", true)).toEqual({ kind: "saved", path: "a.csv" });
});
