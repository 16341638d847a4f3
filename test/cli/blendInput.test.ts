// The text and the file of a blend, read; and what is refused.
import { expect, test } from "vitest";
import { blendName, readBlendGroups, readBlendText } from "../../src/cli/blendInput.ts";
import { fakePorts } from "../support/fakePorts.ts";

const groups = (text: string) => {
  const read = readBlendText(text);
  return read.ok ? read.value.map(({ layout }) => layout) : read.refusals.map(({ read: what }) => what);
};
const fromFile = (value: unknown, more: object = {}) =>
  readBlendGroups({ layout: "b.json", ...more }, fakePorts({ "b.json": JSON.stringify(value) }).files);

test("readBlendText(text): names with spaces and plus signs, ties left out where there is one, and back to the same name", () => {
  const text = "demo A 4s7p cross-tied + C + D 2s1p + 3s2p 1s12p strings";
  expect(groups(text)).toEqual([
    { part: "demo A", series: 4, parallel: 7, ties: "cross-tied" },
    { part: "C + D", series: 2, parallel: 1, ties: "strings" },
    { part: "3s2p", series: 1, parallel: 12, ties: "strings" },
  ]);
  const read = readBlendText(text);
  expect(read.ok && blendName(read.value)).toBe("demo A 4s7p cross-tied + C + D 2s1p strings + 3s2p 1s12p strings");
});

test.each([
  "",
  "  ",
  "a",
  "a 4s2p",
  "a 0s1p",
  "a 4s2p woven",
  "a 4s1p strings +",
  "a 4s1p strings + b",
  "a 9999999s1p",
  "a 1s1p + a 2s1p",
])("readBlendText(%j) is refused", (text) => expect(readBlendText(text).ok).toBe(false));

test("readBlendGroups(flags, files): an element of a plan's blends with its families; one layout is nothing to it", () => {
  const strings = [
    { part: "a", series: 4, parallel: 2, ties: "cross-tied", balance: { family: "lab" } },
    { part: "b", series: 1, parallel: 3, ties: "strings", balance: null },
  ];
  const read = fromFile({ strings });
  expect(read.ok && read.value?.map(({ family }) => family)).toEqual(["lab", null]);
  expect(fromFile({ part: "a", series: 4 })).toEqual({ ok: true, value: null });
  expect(fromFile(7)).toEqual({ ok: true, value: null });
  expect(fromFile({ strings: [] }).ok).toBe(false);
  expect(fromFile({ strings: [{ part: "a" }, null] })).toMatchObject({ ok: false, refusals: [{}, {}] });
  expect(fromFile({ strings: [strings[0], strings[0]] }).ok).toBe(false);
  expect(fromFile({ strings }, { balance: "24 kohm" })).toMatchObject({ refusals: [{ code: "contradiction" }] });
});

test("readBlendGroups: --blend with the flags of one layout beside it is a contradiction", () => {
  const { files } = fakePorts();
  expect(readBlendGroups({ blend: "a 1s1p", part: "a" }, files)).toMatchObject({
    refusals: [{ code: "contradiction" }],
  });
  expect(readBlendGroups({ part: "a" }, files)).toEqual({ ok: true, value: null });
});
