import { expect, test } from "vitest";
import { list, text } from "../../src/sheet/model.ts";

test("text(words) and list(items) are blocks of their kind", () => {
  expect(text("a")).toEqual({ kind: "text", text: "a" });
  expect(list(["a", "b"])).toEqual({ kind: "list", items: ["a", "b"] });
});
