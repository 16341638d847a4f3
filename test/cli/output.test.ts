import { expect, test } from "vitest";
import { outputTrouble } from "../../src/cli/output.ts";

test("outputTrouble(error): a reader that went away is quiet, a full disk is said", () => {
  expect(outputTrouble({ code: "EPIPE", message: "x" })).toEqual({ status: 0, words: "" });
  expect(outputTrouble({ code: "ENOSPC", message: "x" })).toMatchObject({
    status: 1,
    words: expect.stringMatching(/full/),
  });
  expect(outputTrouble({ message: "odd" })).toMatchObject({ status: 1, words: expect.stringMatching(/odd/) });
});
