// Keys, pastes and reports: one example a key, then the promise that cutting the stream changes nothing.

import { describe, expect, test } from "vitest";
import { type InputEvent, makeTokeniser } from "../../src/tui/tokens.ts";
import fc from "../support/property.ts";

const all = (text: string): readonly InputEvent[] => {
  const tokens = makeTokeniser();
  return [...tokens.push(text), ...tokens.flush()];
};
/** Events in short: a key by its name, a typed one as name'text', a paste in <>, a report in []. */
const short = (events: readonly InputEvent[]): string =>
  events
    .map((e) =>
      e.kind === "key"
        ? e.text
          ? `${e.key}'${e.text}'`
          : e.key
        : e.kind === "paste"
          ? `<${e.text}>`
          : `[${e.text.replaceAll("\x1b", "^")}]`,
    )
    .join(" ");

describe("push(chunk): each key by example", () => {
  test.each([
    // typed
    ["a", "a'a'"],
    ["Z", "Z'Z'"],
    [" ", "space' '"],
    ["µΩ", "µ'µ' Ω'Ω'"],
    ["漢", "漢'漢'"],
    ["😀", "😀'😀'"],
    // control
    ["\r", "enter"],
    ["\n", "enter"],
    ["\t", "tab"],
    ["\x7f", "backspace"],
    ["\x08", "backspace"],
    ["\x00", "ctrl+space"],
    ["\x01", "ctrl+a"],
    ["\x03", "ctrl+c"],
    ["\x0c", "ctrl+l"],
    ["\x1a", "ctrl+z"],
    ["\x1c", "ctrl+\\"],
    ["\x1d", "ctrl+]"],
    ["\x1e", "ctrl+^"],
    ["\x1f", "ctrl+_"],
    // arrows and the block above them, both spellings
    ["\x1b[A", "up"],
    ["\x1b[B", "down"],
    ["\x1b[C", "right"],
    ["\x1b[D", "left"],
    ["\x1bOA", "up"],
    ["\x1bOB", "down"],
    ["\x1bOC", "right"],
    ["\x1bOD", "left"],
    ["\x1b[E", "begin"],
    ["\x1b[H", "home"],
    ["\x1b[F", "end"],
    ["\x1bOH", "home"],
    ["\x1bOF", "end"],
    ["\x1b[1~", "home"],
    ["\x1b[2~", "insert"],
    ["\x1b[3~", "delete"],
    ["\x1b[4~", "end"],
    ["\x1b[5~", "pageup"],
    ["\x1b[6~", "pagedown"],
    ["\x1b[7~", "home"],
    ["\x1b[8~", "end"],
    ["\x1b[Z", "shift+tab"],
    // function keys, four dialects
    ["\x1bOP", "f1"],
    ["\x1bOQ", "f2"],
    ["\x1bOR", "f3"],
    ["\x1bOS", "f4"],
    ["\x1b[[A", "f1"],
    ["\x1b[[E", "f5"],
    ["\x1b[11~", "f1"],
    ["\x1b[15~", "f5"],
    ["\x1b[17~", "f6"],
    ["\x1b[18~", "f7"],
    ["\x1b[19~", "f8"],
    ["\x1b[20~", "f9"],
    ["\x1b[21~", "f10"],
    ["\x1b[23~", "f11"],
    ["\x1b[24~", "f12"],
    // with modifiers
    ["\x1b[1;2A", "shift+up"],
    ["\x1b[1;3B", "alt+down"],
    ["\x1b[1;5C", "ctrl+right"],
    ["\x1b[1;8D", "ctrl+alt+shift+left"],
    ["\x1b[3;5~", "ctrl+delete"],
    ["\x1b[3^", "ctrl+delete"],
    ["\x1b[1;2P", "shift+f1"],
    ["\x1b[1;5R", "ctrl+f3"],
    ["\x1b[99;5u", "ctrl+c"],
    ["\x1b[27u", "escape"],
    ["\x1b[97u", "a'a'"],
    ["\x1b[32u", "space' '"],
    ["\x1b[27;5;9~", "ctrl+tab"],
    ["\x1b[13;2u", "shift+enter"],
    // escape and alt
    ["\x1b", "escape"],
    ["\x1b\x1b", "escape escape"],
    ["\x1b\x1b[A", "escape up"],
    ["\x1b\x03", "escape ctrl+c"],
    ["\x1bq", "alt+q"],
    ["\x1b ", "alt+space"],
    ["\x1b\x7f", "alt+backspace"],
    ["\x1bO", "alt+O"],
    ["\x1b[", "alt+["],
    ["\x1b]", "alt+]"],
    // number pad in application mode
    ["\x1bOM", "enter"],
    ["\x1bOk", "+'+'"],
    ["\x1bOn", ".'.'"],
    ["\x1bOy", "9'9'"],
    ["\x1bO!", "alt+O !'!'"],
    // reports are never typed
    ["\x1b[<0;3;4M", "[^[<0;3;4M]"],
    ["\x1b[I", "[^[I]"],
    ["\x1b[O", "[^[O]"],
    ["\x1b[12;40R", "[^[12;40R]"],
    ["\x1b[99~", "[^[99~]"],
    ["\x1b[?62;4c", "[^[?62;4c]"],
    ["\x1b]11;rgb:0/0/0\x07", "[^]11;rgb:0/0/0\x07]"],
    ["\x1b]11;rgb:0/0/0\x1b\\", "[^]11;rgb:0/0/0^\\]"],
    ["\x1bP1$r\x1b\\", "[^P1$r^\\]"],
    ["\u009b", "[\u009b]"],
    ["\x1b[201~", "[^[201~]"],
    ["\x1b[1114112u", "[code 1114112]"],
  ])("%j is %s", (text, want) => {
    expect(short(all(text))).toBe(want);
  });
});

describe("push(chunk): many keys in one chunk", () => {
  test.each([
    ["\x7f\x7f\x7fx", "backspace backspace backspace x'x'"],
    ["j\x03", "j'j' ctrl+c"],
    ["abc\r", "a'a' b'b' c'c' enter"],
    ["\x1b[B\x1b[B\x7f", "down down backspace"],
    ["\t\t", "tab tab"],
    // a broken sequence ends before what broke it
    ["\x1b[12\x03", "[^[12] ctrl+c"],
    ["\x1b[1;\x1b[A", "[^[1;] up"],
    ["\x1b]0;x\x03", "[^]0;x] ctrl+c"],
  ])("%j is %s", (text, want) => {
    expect(short(all(text))).toBe(want);
  });

  test("an endless sequence is given up after 64 characters, and an endless answer after 4096", () => {
    expect(short(all(`\x1b[${"1".repeat(70)}`))).toBe(`[^[${"1".repeat(62)}] ${"1'1' ".repeat(8).trim()}`);
    expect(all(`\x1b]${"x".repeat(5000)}`).length).toBe(1 + 5000 - 4094);
  });
});

describe("bracketed paste", () => {
  test.each([
    ["\x1b[200~2.4 kJ\x1b[201~", "<2.4 kJ>"],
    ["\x1b[200~\x1b[201~", "<>"],
    ["a\x1b[200~q\x03\x1b[A\r\x1b[201~b", "a'a' <q\x03\x1b[A\r> b'b'"],
    ["\x1b[200~a\x1b[200~b\x1b[201~", "<a\x1b[200~b>"],
  ])("%j is %j", (text, want) => {
    expect(short(makeTokeniser().push(text))).toBe(want);
  });

  test("is held until its end, and flush gives what there is", () => {
    const tokens = makeTokeniser();
    expect(tokens.push("\x1b[200~1 k\x1b[20")).toEqual([]);
    expect(tokens.pending()).toBe("paste");
    expect(tokens.flush()).toEqual([{ kind: "paste", text: "1 k\x1b[20" }]);
    expect(tokens.pending()).toBe("nothing");
    expect(short(tokens.push("q"))).toBe("q'q'");
  });

  test("is cut at a million characters, and the rest of it never becomes keys", () => {
    const events = makeTokeniser().push(`\x1b[200~${"q".repeat(2 ** 20 + 5)}\x1b[201~`);
    expect(events).toHaveLength(1);
    expect(events[0]?.kind === "paste" && events[0].text.length).toBe(2 ** 20);
  });
});

describe("pending()", () => {
  test("tells a lone Escape from Escape and more", () => {
    const tokens = makeTokeniser();
    expect(tokens.push("\x1b")).toEqual([]);
    expect(tokens.pending()).toBe("escape");
    expect(short(tokens.push("[A"))).toBe("up");
    expect(tokens.pending()).toBe("nothing");
  });
});

describe("splitting", () => {
  const atoms = fc.oneof(
    fc.constantFrom(
      "\x1b",
      "\x1b[",
      "\x1bO",
      "A",
      "[",
      "~",
      "\x7f",
      "\r",
      "\x03",
      "5",
      ";",
      "<",
      "M",
      "\x1b[200~",
      "\x1b[201~",
      "\x1b]",
      "\x07",
      "\\",
      "µ",
      "😀",
    ),
    fc.string({ unit: "binary", maxLength: 3 }),
  );
  test("cutting the stream anywhere gives the same events", () => {
    fc.assert(
      fc.property(fc.array(atoms, { maxLength: 30 }), fc.array(fc.nat(200), { maxLength: 12 }), (parts, cuts) => {
        const text = parts.join("");
        const whole = makeTokeniser();
        const want = [...whole.push(text), ...whole.flush()];
        const pieces = makeTokeniser();
        const got: InputEvent[] = [];
        let at = 0;
        for (const cut of [...cuts.map((c) => c % (text.length + 1)).sort((a, b) => a - b), text.length]) {
          got.push(...pieces.push(text.slice(at, cut)));
          at = cut;
        }
        got.push(...pieces.flush());
        expect(got).toEqual(want);
      }),
      { numRuns: 2000, seed: 20240501 },
    );
  });

  test("nothing that came in is lost: keys and reports spell the input when there is no paste", () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom("a", "9", "µ", "漢", " ") }), (text) => {
        expect(
          all(text)
            .map((e) => e.text)
            .join(""),
        ).toBe(text);
      }),
      { numRuns: 300, seed: 7 },
    );
  });
});
