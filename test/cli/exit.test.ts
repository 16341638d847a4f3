import { expect, test } from "vitest";
import { EXIT } from "../../src/cli/exit.ts";

test("EXIT: 0 done, 1 unsafe or impossible, 2 wrong use, 70 our bug", () => {
  expect(EXIT).toEqual({ done: 0, unsafe: 1, wrongUse: 2, bug: 70 });
});
