// Which arguments open the screens.
import { expect, test } from "vitest";
import { screenFlags } from "../../src/tui/screenFlags.ts";

const none = { catalog: [], resistors: null, brief: null, ascii: false, ground: null };

test.each([
  [[], none],
  [["--ascii"], { ...none, ascii: true }],
  [["--catalog", "a.csv"], { ...none, catalog: ["a.csv"] }],
  [["--catalog=a.csv"], { ...none, catalog: ["a.csv"] }],
  [
    ["--catalog", "a.csv", "b.csv", "--resistors", "r.csv"],
    { ...none, catalog: ["a.csv", "b.csv"], resistors: "r.csv" },
  ],
  [
    ["--catalog", "a.csv", "--catalog", "b.csv", "--brief", "b.json"],
    { ...none, catalog: ["a.csv", "b.csv"], brief: "b.json" },
  ],
  [["--light"], { ...none, ground: "light" }],
  [["--dark", "--ascii"], { ...none, ground: "dark", ascii: true }],
  [["--dark", "--light"], null],
  // not ours
  [["plan"], null],
  [["plan", "--catalog", "a.csv"], null],
  [["--help"], null],
  [["--version"], null],
  [["--catalog"], { missing: "--catalog" }],
  [["--catalog", "--ascii"], { missing: "--catalog" }],
  [["--ascii", "--brief"], { missing: "--brief" }],
  [["plan", "--catalog"], null],
  [["--resistors"], { missing: "--resistors" }],
  [["--ascii=yes"], null],
  [["--catalogue", "a.csv"], null],
  [["a.csv"], null],
  [["--"], none],
])("screenFlags(%j)", (argv, want) => {
  expect(screenFlags(argv)).toEqual(want);
});
