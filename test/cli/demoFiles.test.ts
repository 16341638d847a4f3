import { readdirSync, readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { DEMO_CATALOGS, DEMO_RESISTORS, demoBrief, demoFile } from "../../src/cli/demoFiles.ts";
import { at, fakePorts } from "../support/fakePorts.ts";

test("the shipped demo brief is the fixture's, and every shipped capacitor catalogue is in the demo", () => {
  expect(readFileSync(at("catalogs/demo-brief.json"), "utf8")).toBe(
    readFileSync(at("fixtures/briefs/flash-lamp.json"), "utf8"),
  );
  const shipped = readdirSync(at("catalogs")).filter((name) => name.endsWith(".csv"));
  expect([...DEMO_CATALOGS, DEMO_RESISTORS, "fuses.csv"].sort()).toEqual(shipped.sort());
});

test("demoBrief(ports): the brief to start with, refused when the package is not whole", () => {
  const brief = demoBrief(fakePorts());
  expect(brief.ok && brief.value.value).toMatchObject({ energy: "2.4 kJ" });
  expect(demoBrief({ ...fakePorts(), catalogs: "/none" }).ok).toBe(false);
  expect(demoFile({ catalogs: "/some" }, "film.csv")).toBe("/some/film.csv");
});
