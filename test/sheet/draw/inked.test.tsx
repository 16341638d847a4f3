/** @jsxImportSource preact */
// Tests of ink as markup.
import { expect, test } from "vitest";
import { Drawing } from "../../../src/sheet/draw/drawing.tsx";
import { across, down, type Ink } from "../../../src/sheet/draw/ink.ts";
import { Inked } from "../../../src/sheet/draw/inked.tsx";
import { rendered } from "../../../src/sheet/render.ts";
import { countRole, textsOf, wellFormed } from "../../support/svg.ts";

const markup = (ink: Ink): string =>
  rendered(
    <Drawing id="a" title="t" description="d" height={40}>
      <Inked inks={[ink]} />
    </Drawing>,
  );

test("Inked({ inks }): wires of one kind are one path; symbols are one each, in their roles", () => {
  const mark = { role: "unit", name: "capacitor", y: 0, way: "down" } as const;
  const svg = markup({
    wires: [across(0, 5, 1), down(2, 0, 9), { x: 0, y: 0, toX: 3, toY: 4 }],
    joints: [
      { x: 1, y: 2 },
      { x: 3, y: 4 },
    ],
    points: [{ x: 7, y: 8 }],
    marks: [
      { ...mark, x: 0 },
      { ...mark, x: 9 },
    ],
  });
  expect(svg).toContain('<path d="M0 1H5M2 0V9M0 0L3 4"');
  expect(svg).toContain('d="M1 2h0M3 4h0"');
  expect(countRole(svg, "unit")).toBe(2);
  expect(countRole(svg, "points")).toBe(1);
  expect(wellFormed(svg)).toBe(true);
});

test("Inked({ inks }): nothing is nothing; a plate is broken to its room and stands over the lines", () => {
  expect(markup({})).not.toContain("<path");
  const svg = markup({ wires: [across(0, 50, 20)], plates: [{ x: 25, y: 20, text: "37 more alike", room: 36 }] });
  expect(textsOf(svg).map(({ text }) => text)).toEqual(["37 more", "alike"]);
  expect(svg.indexOf('fill="#fff"')).toBeGreaterThan(svg.indexOf("M0 20H50"));
});
