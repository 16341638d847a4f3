// `check --blend --json`: one object with the blend, its faults, the brief, cautions and inputs.
import { expect, test } from "vitest";
import { checkedBlend } from "../../../src/cli/checkedBlend.ts";
import { blendChecked } from "../../../src/cli/commands/checkBlend.ts";
import { rowsOf } from "../../support/blendLab.ts";
import { fakePorts } from "../../support/fakePorts.ts";

test("blendChecked(checked, json, ports): keys, exit status, and rows that were lost on the error stream", () => {
  const ports = fakePorts({ "c.csv": `${rowsOf({}, { voltage: 1600 })}\nlost;;;` });
  const flags = {
    energy: "10 J",
    voltage: "1200 V",
    ripple: "100 %",
    catalog: ["c.csv"],
    blend: "a 4s2p strings + b 1s2p",
  };
  const read = checkedBlend(undefined, flags, ports);
  if (!read.ok || read.value === null) throw new Error(JSON.stringify(read));
  expect(blendChecked(read.value, true, ports)).toBe(0);
  const json = JSON.parse(ports.printed());
  for (const key of ["id", "strings", "capacitance", "share", "findings", "faults", "brief", "cautions", "inputs"])
    expect(json[key], key).toBeDefined();
  expect(json.faults).toHaveLength(16);
  expect(ports.told()).toContain("c.csv");
});
