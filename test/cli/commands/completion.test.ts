import { describe, expect, test } from "vitest";
import { run } from "../../../src/cli/program.ts";
import { fakePorts, UNSAFE } from "../../support/fakePorts.ts";

const ran = async (...argv: readonly string[]) => {
  const ports = fakePorts();
  const status = await run(["completion", ...argv], ports);
  return { status, out: ports.printed(), err: ports.told() };
};

describe("completion", () => {
  test("no shell, or one that is not known, is refused with the nearest", async () => {
    expect(await ran()).toMatchObject({ status: 2, out: "" });
    expect(await ran("bsah")).toMatchObject({
      status: 2,
      out: "",
      err: expect.stringMatching(/^shell: .*perhaps "bash"/),
    });
    expect((await ran("tcsh")).err).toMatch(/one of bash, zsh, fish/);
  });

  test("each shell gets its own script, the same every time", async () => {
    for (const [shell, opens] of [
      ["bash", "# Completion"],
      ["ZSH", "#compdef joulewright"],
      ["fish", "# Completion"],
    ] as const) {
      const { status, out, err } = await ran(shell);
      expect([status, err]).toEqual([0, ""]);
      expect(out.startsWith(opens)).toBe(true);
      expect(out).not.toMatch(UNSAFE);
      expect((await ran(shell)).out).toBe(out);
    }
  });
});
