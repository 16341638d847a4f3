import { describe, expect, test } from "vitest";
import { nextWords, sizeWords, spotWords } from "../../src/cli/commissionText.ts";

test("spotWords: stage or string and place, the first four serials", () => {
  expect(spotWords({ position: 3, string: null, serials: [] })).toBe("stage 3");
  expect(spotWords({ position: 3, string: 2, serials: ["a"] })).toBe("string 2, place 3 (a)");
  expect(spotWords({ position: 1, string: null, serials: ["a", "b", "c", "d", "e"] })).toBe(
    "stage 1 (a, b, c, d, ...)",
  );
});

test("sizeWords: what each size is a size of", () => {
  expect(sizeWords({ kind: "low capacitance", size: 0.1 })).toBe("about 10 % less than measured");
  expect(sizeWords({ kind: "resistor wrong value", size: 10 })).toBe("about 10 times its value");
  expect(sizeWords({ kind: "meter lead swapped", size: 1 })).toBe("");
});

describe("nextWords(found)", () => {
  const verdict = "differs" as const;
  test("every kind of next measurement has words", () => {
    const at = { position: 2, string: null, serials: [] };
    expect(nextWords({ verdict, next: { action: "read stage", seconds: 60, expect: [250, 260], ...at } })).toMatch(
      /read stage 2 60 s after a charge: 250 V speaks for the first/,
    );
    expect(nextWords({ verdict, next: { action: "read after a hold", seconds: 600 } })).toMatch(/hold of 10 min/);
    expect(nextWords({ verdict, next: { action: "with the bank dead", measure: "polarity", ...at } })).toMatch(
      /stage 2 look at its polarity/,
    );
    expect(nextWords({ verdict, next: { action: "change the leads and read again", ...at } })).toMatch(
      /leads at stage 2/,
    );
    expect(nextWords({ verdict, next: null })).toMatch(/nothing more/);
    expect(nextWords({ verdict: "stop", next: null })).toMatch(/proven dead/);
  });
});
