import { expect, test } from "vitest";
import { changeLines } from "../../src/cli/billChanges.ts";
import type { BillChange } from "../../src/order/index.ts";

const change: BillChange = { kind: "kept", item: "lug", line: "lugs", at: 4, heading: "value", made: "", read: "M6" };

test("changeLines(bill, path): nothing for a bill made anew; a sentence where nothing in the file is the builder's", () => {
  expect(changeLines({}, "a.csv")).toEqual([]);
  expect(changeLines({ changes: [] }, "a.csv")).toEqual(["a.csv: nothing in it is yours; the bill is made anew"]);
});

test("changeLines(bill, path): file, line, what was written over what; nothing hidden comes through", () => {
  const whole = { ...change, heading: "", read: "" };
  const changes: readonly BillChange[] = [
    change,
    { ...change, read: "", made: "x" },
    { ...change, kind: "not taken over", heading: "unit price", read: "4" },
    { ...change, kind: "check again", heading: "rating", made: "at least 3 kV dc", read: "at least 2 kV dc" },
    { ...whole, kind: "own line", line: "own line", item: "wire\u202e" },
    { ...whole, kind: "put back", at: null },
    { ...whole, kind: "not counted" },
  ];
  expect(changeLines({ changes }, "-")).toEqual([
    'standard input:4: lug (lugs), value: yours is kept, "M6" in place of a blank',
    'standard input:4: lug (lugs), value: yours is kept, a blank in place of "x"',
    'standard input:4: lug (lugs), unit price: yours, "4", was beside another part and is not taken over',
    'standard input:4: lug (lugs): CHECK AGAIN what you chose: rating was "at least 2 kV dc", now it is "at least 3 kV dc"',
    "standard input:4: wire\\u{202e}: your own line is kept",
    "standard input: lug (lugs): the line was missing and is put back",
    "standard input:4: lug (lugs): the bank no longer takes it; what you wrote is kept, at a quantity of 0",
  ]);
});
