// What we rely on of the CSV library, checked again: separators, quotes, line numbers, broken records, long texts.
import { describe, expect, test } from "vitest";
import { readRecords, separatorOf } from "../../src/catalog/csv.ts";

const records = (text: string) => {
  const rows: (readonly [number, ...string[]])[] = [];
  const made = readRecords(text, (cells, line) => rows.push([line, ...cells]));
  return made.ok
    ? { rows, faults: made.value.faults.map((f) => `${f.code} ${f.place.line ?? "-"}`) }
    : { refused: made.refusals[0]?.code };
};

describe("separatorOf(text)", () => {
  test.each([
    ["a,b,c", ","],
    ["a;b;c", ";"],
    ["a\tb\tc", "\t"],
    ["a", ","],
    ['"x;y;z",b', ","],
    ["a,b;c;d", ";"],
    ["a,b\n1;2;3;4", ","],
    ["a;b\r\n1,2", ";"],
  ])("%j: %j", (text, mark) => expect(separatorOf(text)).toBe(mark));
});

describe("separatorOf(text) past blank lines", () => {
  // The library passes over blank lines, the search for the separator does not: the whole heading becomes one cell.
  test("blank lines above the heading do not hide its semicolons", () =>
    expect(separatorOf("\n\na;b;c\n1;2;3")).toBe(";"));
});

describe("readRecords(text, take)", () => {
  test.each([
    ["", "empty-file"],
    [" \r\n\t\n", "empty-file"],
    ["\ufeff", "empty-file"],
    ["a,b\n1,\u0000", "binary-file"],
  ])("%j is refused: %s", (text, code) => expect(records(text)).toEqual({ refused: code }));

  test("line ends of all kinds, blank lines passed over but counted", () => {
    const rows = [
      [1, "a", "b"],
      [2, "1", "2"],
      [4, "3", "4"],
    ];
    expect(records("a,b\n1,2\n\n3,4").rows).toEqual(rows);
    expect(records("a,b\r\n1,2\r\n\r\n3,4\r\n").rows).toEqual(rows);
  });
  test("a byte order mark is no part of the first cell", () =>
    expect(records("\ufeffa,b\n").rows).toEqual([[1, "a", "b"]]));
  test("quotes: a separator, a doubled quote and a newline inside; the line is where the record starts", () =>
    expect(records('a,b\n"x,y","say ""so"""\n"one\ntwo",2\nlast,1').rows).toEqual([
      [1, "a", "b"],
      [2, "x,y", 'say "so"'],
      [3, "one\ntwo", "2"],
      [5, "last", "1"],
    ]));
  test("the same with carriage returns in the quoted newline", () =>
    expect(records('a,b\r\n"one\r\ntwo",2\r\nlast,1\r\n').rows?.map((r) => r[0])).toEqual([1, 2, 4]));
  test("a stray quote costs its record alone", () => {
    const made = records('a,b\n1,2\nx"y,3\n4,5\n');
    expect(made.rows?.map((r) => r[1])).toEqual(["a", "1", "4"]);
    expect(made.faults).toEqual(["broken-quotes 3"]);
  });
  // The library swallows the good records after it until a quote closes again: lines 3 to 5 are lost, line 3 without a word.
  test("text behind a closing quote costs its record alone", () =>
    expect(records('a,b\n"x"y,3\n4,5\n"p\nq",6\n7,8\n').rows).toEqual([
      [1, "a", "b"],
      [3, "4", "5"],
      [4, "p\nq", "6"],
      [6, "7", "8"],
    ]));

  test("a text of 6 million characters with quoted newlines all along: every record, every line", () => {
    const count = 150000;
    const line = (i: number): string =>
      i % 3 === 0 ? `part-${i},"two\nlines, ${i}",${"x".repeat(20)}\n` : `part-${i},plain,${"y".repeat(28)}\n`;
    const text = `a,b,c\n${Array.from({ length: count }, (_, i) => line(i)).join("")}`;
    expect(text.length).toBeGreaterThan(6e6);
    let [seen, wrong, expected] = [0, 0, 2];
    readRecords(text, (cells, at) => {
      if (cells[0] === "a") return;
      if (cells[0] !== `part-${seen}` || at !== expected || cells.length !== 3) wrong++;
      expected += seen % 3 === 0 ? 2 : 1;
      seen++;
    });
    expect([seen, wrong]).toEqual([count, 0]);
  });

  test("a broken quote late in a long text: what stands before it is kept, and its line is right", () => {
    const body = "p,q\n".repeat(550000);
    const made = records(`a,b\n${body}x"y,1\nlast,2\n`);
    expect(made.rows?.length).toBe(550002);
    expect(made.faults).toEqual(["broken-quotes 550002"]);
    expect(made.rows?.at(-1)).toEqual([550003, "last", "2"]);
  });
});
