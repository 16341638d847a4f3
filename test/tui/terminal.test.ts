// Whether and how the screens can be shown, from the environment.
import { describe, expect, test } from "vitest";
import { screenTrouble, terminalLook } from "../../src/tui/terminal.ts";

const facts = (env: Record<string, string>, input = true, output = true) => ({
  env,
  inputIsTerminal: input,
  outputIsTerminal: output,
});

describe("screenTrouble(facts)", () => {
  test("null where there is a terminal at both ends", () => {
    expect(screenTrouble(facts({ TERM: "xterm" }))).toBeNull();
    expect(screenTrouble(facts({}))).toBeNull();
  });
  test.each([
    [facts({}, false, true), "standard input"],
    [facts({}, true, false), "standard output"],
    [facts({ TERM: "dumb" }), "dumb"],
  ])("one line that says what is missing and the way out", (given, word) => {
    const trouble = screenTrouble(given) ?? "";
    expect(trouble).toContain(word);
    expect(trouble).toContain("joulewright plan");
    expect(trouble).not.toContain("\n");
  });
});

describe("terminalLook(facts)", () => {
  test.each([
    [{}, true],
    [{ NO_COLOR: "" }, true],
    [{ NO_COLOR: "1" }, false],
    [{ FORCE_COLOR: "0" }, false],
    [{ FORCE_COLOR: "false" }, false],
    [{ NO_COLOR: "1", FORCE_COLOR: "1" }, true],
    [{ NO_COLOR: "1", FORCE_COLOR: "" }, true],
  ] as const)("%j has colour: %s", (env, colour) => {
    expect(terminalLook(facts(env)).colour).toBe(colour);
  });
  test.each([
    [{}, false],
    [{ LANG: "en_GB.UTF-8" }, false],
    [{ LANG: "C" }, false],
    [{ LANG: "de_DE.ISO-8859-1" }, true],
    [{ LC_ALL: "C.utf8", LANG: "de_DE.ISO-8859-1" }, false],
    [{ TERM: "linux" }, true],
  ] as const)("%j is ASCII only: %s", (env, ascii) => {
    expect(terminalLook(facts(env)).ascii).toBe(ascii);
  });
  test("what was asked for on the command line beats the guess", () => {
    expect(terminalLook({ ...facts({ TERM: "linux" }), ascii: false }).ascii).toBe(false);
    expect(terminalLook({ ...facts({}), ascii: true }).ascii).toBe(true);
  });
});
