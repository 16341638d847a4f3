import { expect, test } from "vitest";
import { bugText } from "../../src/cli/bug.ts";

test("bugText(error, argv, version): the stack, how to report, nothing raw", () => {
  const text = bugText(new Error("boom\u001b[2J"), ["plan", "a b", "\u202e"], "1.2.3");
  expect(text).toContain("joulewright 1.2.3: this is a bug of ours");
  expect(text).toContain("bug.test.ts");
  expect(text).toContain('joulewright plan "a b"');
  expect(text).not.toMatch(/\u001b|\u202e/);
  expect(bugText("thrown text", [], "1")).toContain("thrown text");
});
