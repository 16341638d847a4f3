import { describe, expect, test } from "vitest";
import { PAGE } from "../../../src/sheet/draw/drawing.tsx";
import { LABEL_GRID, LABEL_PAPERS, LABEL_SIZE, type Label, labelPages } from "../../../src/sheet/draw/label.ts";

const label = (position: string): Label => ({
  kind: "unit",
  position,
  part: "DEMO",
  polarised: true,
  voltage: 450,
  capacitance: 1e-3,
});

test("LABEL_GRID: fits each paper upright at margins of 15 mm, with a line of caption to spare", () => {
  const height = { A4: 297, Letter: 279.4 };
  for (const paper of LABEL_PAPERS) {
    const { columns, rows } = LABEL_GRID[paper];
    expect(rows * LABEL_SIZE.height).toBeLessThanOrEqual(((height[paper] - 30) / 25.4) * 72 - 12);
    expect((rows + 1) * LABEL_SIZE.height).toBeGreaterThan(((height[paper] - 30) / 25.4) * 72 - 12);
    expect(columns * LABEL_SIZE.width).toBe(PAGE.width);
  }
});

describe("labelPages(labels, paper)", () => {
  test("pages are full but the last; order is kept", () => {
    const labels = Array.from({ length: 62 }, (_, index) => label(`${index}`));
    expect(labelPages(labels, "A4").map((page) => page.length)).toEqual([30, 30, 2]);
    expect(labelPages(labels, "Letter").map((page) => page.length)).toEqual([27, 27, 8]);
    expect(labelPages(labels, "Letter").flat()).toEqual(labels);
    expect(labelPages([], "A4")).toEqual([]);
  });
});
