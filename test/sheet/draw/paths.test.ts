import { expect, test } from "vitest";
import { linePath } from "../../../src/sheet/draw/paths.ts";

test("linePath(points): straight from point to point, to a tenth of a point; nothing for nothing", () => {
  expect(linePath([])).toBe("");
  expect(linePath([{ x: 1, y: 2 }])).toBe("M1,2Z");
  expect(
    linePath([
      { x: 0, y: 0 },
      { x: 1.26, y: 3 },
      { x: 5, y: -4.04 },
    ]),
  ).toBe("M0,0L1.3,3L5,-4");
});
