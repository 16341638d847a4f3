import { describe, expect, test } from "vitest";
import { readOnce } from "../../src/cli/readOnce.ts";
import { accepted, refused } from "../../src/quantity/index.ts";
import { fakePorts } from "../support/fakePorts.ts";

describe("readOnce(files)", () => {
  test("a path is read once, also when it was refused; writing goes through", () => {
    const asked: string[] = [];
    const written: string[] = [];
    const files = readOnce({
      ...fakePorts().files,
      read: (path) => {
        asked.push(path);
        return path === "no" ? refused({ code: "x", place: {}, read: "", want: "" }) : accepted(`${path} text`);
      },
      write: (path) => {
        written.push(path);
        return accepted(path);
      },
      move: (path) => accepted(path),
      watch: () => () => {},
    });
    expect([files.read("-"), files.read("-")]).toEqual([accepted("- text"), accepted("- text")]);
    expect([files.read("no").ok, files.read("no").ok]).toEqual([false, false]);
    expect(asked).toEqual(["-", "no"]);
    files.write("a", "b", false);
    expect(written).toEqual(["a"]);
  });
});
