import { expect, test } from "vitest";
import { manualPage } from "../../../src/cli/manual.ts";
import { run } from "../../../src/cli/program.ts";
import { TREE } from "../../support/commandTree.ts";
import { fakePorts } from "../../support/fakePorts.ts";

test("manual: prints the page and nothing else; takes no argument", async () => {
  const ports = fakePorts();
  expect(await run(["manual"], ports)).toBe(0);
  expect([ports.printed(), ports.told()]).toEqual([manualPage(TREE), ""]);
  expect(await run(["manual", "x"], fakePorts())).toBe(2);
});
