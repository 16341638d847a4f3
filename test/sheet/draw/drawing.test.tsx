/** @jsxImportSource preact */
// Tests of the sheet of every drawing.
import { describe, expect, test } from "vitest";
import { at, Drawing, PAGE, SIZES } from "../../../src/sheet/draw/drawing.tsx";
import { rendered } from "../../../src/sheet/render.ts";
import { wellFormed } from "../../support/svg.ts";

describe("Drawing({ id, title, description, width, height })", () => {
  const svg = rendered(<Drawing id="a" title="A <b>" description="What is seen" height={20} />);

  test("is an image with a title and a description, and no size in pixels", () => {
    expect(svg).toContain('role="img"');
    expect(svg).toContain('aria-labelledby="a-title a-desc"');
    expect(svg).toContain('<title id="a-title">A &lt;b></title>');
    expect(svg).toContain('<desc id="a-desc">What is seen</desc>');
    expect(svg).toContain(`viewBox="0 0 ${PAGE.width} 20"`);
    expect(svg).not.toMatch(/ (width|height|style)="/);
    expect(wellFormed(svg)).toBe(true);
  });

  test("fits A4 and Letter upright at margins of 15 mm, with letters of 7 pt and more", () => {
    const points = (mm: number): number => (mm / 25.4) * 72;
    expect(PAGE.width).toBeLessThanOrEqual(Math.min(points(210 - 30), points(215.9 - 30)));
    expect(PAGE.height).toBeLessThanOrEqual(Math.min(points(297 - 30), points(279.4 - 30)));
    expect(Math.min(...Object.values(SIZES))).toBeGreaterThanOrEqual(7);
  });
});

test("at(value): a tenth, and no minus zero", () => {
  expect(at(1.26)).toBe(1.3);
  expect(Object.is(at(-0.01), 0)).toBe(true);
});
