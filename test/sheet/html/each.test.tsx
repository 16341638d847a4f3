/** @jsxImportSource preact */
import { expect, test } from "vitest";
import { each } from "../../../src/sheet/html/each.ts";
import { rendered } from "../../../src/sheet/render.ts";

test("each(items, draw): one element an item, in order, told its index", () => {
  const list = (
    <ul>
      {each(["a", "<b>"], (item, i) => (
        <li>
          {i}
          {item}
        </li>
      ))}
    </ul>
  );
  expect(rendered(list)).toBe("<ul><li>0a</li><li>1&lt;b></li></ul>");
});
