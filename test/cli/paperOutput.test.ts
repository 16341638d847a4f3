import { describe, expect, test } from "vitest";
import { outputOf, writePaper } from "../../src/cli/paperOutput.ts";
import { fakePorts } from "../support/fakePorts.ts";

describe("outputOf(output)", () => {
  test("no name and - are the output, a blank is refused", () => {
    expect([outputOf(undefined), outputOf("-"), outputOf("a.html")]).toEqual([
      { ok: true, value: null },
      { ok: true, value: null },
      { ok: true, value: "a.html" },
    ]);
    expect(outputOf(" ")).toMatchObject({ ok: false, refusals: [{ code: "empty", place: { field: "--output" } }] });
  });
});

describe("writePaper(paper, read, flags, ports)", () => {
  const paper = { text: "T", what: "3 labels", output: null };
  const whole = { lost: [], failed: false };

  test("to the output, or to a file with what was written told", () => {
    const ports = fakePorts();
    expect(writePaper(paper, whole, {}, ports)).toBe(0);
    expect([ports.printed(), ports.told()]).toEqual(["T", ""]);
    expect(writePaper({ ...paper, output: "x\u0007.html" }, whole, {}, ports)).toBe(0);
    expect([...ports.written]).toEqual([["x\u0007.html", "T"]]);
    expect(ports.told()).toBe("x\\u{7}.html: 3 labels written\n");
  });

  test("a paper that tells no checks names where they are told", () => {
    const ports = fakePorts();
    writePaper({ ...paper, failing: "FAIL: see check." }, { lost: [], failed: true }, {}, ports);
    expect(ports.told()).toBe("FAIL: see check.\n");
  });

  test("what was lost and what fails is told; a failing bank ends with 1", () => {
    const ports = fakePorts();
    expect(writePaper(paper, { lost: ["a row"], failed: true }, {}, ports)).toBe(1);
    expect(ports.told()).toMatch(/^a row\n.*Do not build this bank\.\n$/);
  });
});
