import { JSDOM } from "jsdom";
import { describe, expect, test } from "vitest";
import { labelsCommand } from "../../../src/cli/commands/labels.ts";
import { run } from "../../../src/cli/program.ts";
import type { SheetFlags } from "../../../src/cli/sheetFlags.ts";
import { at, fakePorts } from "../../support/fakePorts.ts";

const FLAGS: SheetFlags = {
  catalog: [at("catalogs/electrolytic.csv")],
  resistors: at("catalogs/resistors.csv"),
  part: "lab-pf-330-360",
  series: "9",
  parallel: "4",
  ties: "cross-tied",
};
const BRIEF = at("fixtures/briefs/flash-lamp.json");
function labels(flags: SheetFlags) {
  const ports = fakePorts();
  const status = labelsCommand(BRIEF, { ...FLAGS, ...flags }, ports);
  return { status, out: ports.printed(), err: ports.told(), written: ports.written };
}

describe("labels", () => {
  test("one page after another of labels; the bank is small, so its checks fail and it says so", () => {
    const { status, out, err } = labels({});
    expect([status, err]).toEqual([1, expect.stringMatching(/Do not build/)]);
    // 36 units and 9 stages, 30 a page.
    expect(new JSDOM(out).window.document.querySelectorAll("svg")).toHaveLength(2);
    expect(labels({ paper: "letter" }).out).toContain("size: Letter portrait");
  });

  test("as data, and to a file", () => {
    const data = JSON.parse(labels({ json: true }).out);
    expect(data.labels).toHaveLength(45);
    expect(labels({ output: "labels.html" }).written.get("labels.html")).toMatch(/^<!DOCTYPE html>/);
    expect(labels({ format: "md" })).toMatchObject({ status: 2, err: expect.stringMatching(/--format/) });
  });

  test("from the command line", async () => {
    const ports = fakePorts();
    expect(await run(["labels", "--help"], ports)).toBe(0);
    expect(ports.printed()).toMatch(/cut along the frames/);
    expect(ports.printed()).not.toMatch(/--rule/);
  });
});
