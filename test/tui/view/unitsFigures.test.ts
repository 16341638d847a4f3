import { describe, expect, test } from "vitest";
import { faces, gapRow } from "../../../src/tui/view/unitsFigures.ts";

describe("faces and gapRow", () => {
  const face = { groups: [["a"]], size: 1, ties: "cross-tied", capacitances: new Map([["a", 1]]) } as const;
  const look = { colour: false, ascii: true };
  test("side by side where there is room, else the later first", () => {
    expect(faces(face, face, { columns: 80, look, done: true })).toHaveLength(2);
    expect(faces(face, face, { columns: 20, look, done: true })[0]?.left[0]?.text).toBe("Placed");
  });
  test("a gap's row has its name and its value", () => {
    expect(
      gapRow("bound", 2e-6, 0, { columns: 60, ascii: true })
        .left.map((s) => s.text)
        .join(""),
    ).toMatch(/^bound +#+\.+ +2\.00 ppm$/);
  });
});
