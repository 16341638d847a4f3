import { describe, expect, test } from "vitest";
import { clearanceBlocks } from "../../../src/sheet/sections/clearances.ts";

describe("clearanceBlocks(voltage)", () => {
  test("1.5 kV: 0.5 mm by the table from memory, 4.5 mm by the bench rule, which is the larger; within the scope", () => {
    const table = clearanceBlocks(1500).find((block) => block.kind === "table");
    expect(table?.kind === "table" && table.rows[0]).toEqual([
      "up to 2 000 m",
      "1",
      "500 µm",
      "4.5 mm",
      "4.5 mm",
      "within its scope",
    ]);
    expect(table?.kind === "table" && table.rows[3]).toEqual([
      "5000 m",
      "1.48",
      "740 µm",
      "6.66 mm",
      "6.66 mm",
      "beyond the table's scope",
    ]);
  });

  test("beyond the tables there is no advice", () => {
    expect(clearanceBlocks(200e3)).toEqual([{ kind: "text", text: expect.stringMatching(/no advice/) }]);
  });
});
