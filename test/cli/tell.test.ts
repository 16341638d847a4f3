import { expect, test } from "vitest";
import { tell } from "../../src/cli/tell.ts";
import { fakePorts } from "../support/fakePorts.ts";

const refusal = { code: "empty-file", place: { file: "a" }, read: "nothing", want: "something" };

test("tell(ports, refusals, json): words to the error stream, status 2, and data only with --json", () => {
  const plain = fakePorts();
  expect(tell(plain, [refusal])).toBe(2);
  expect(plain.printed()).toBe("");
  expect(plain.told()).toBe("a: there is nothing to read: read nothing; accepted: something\n");
  const json = fakePorts();
  expect(tell(json, [refusal], true)).toBe(2);
  expect(JSON.parse(json.printed())).toMatchObject({ refusals: [{ ...refusal, words: expect.any(String) }] });
});
