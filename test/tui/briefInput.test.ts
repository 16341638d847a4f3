// A brief to the form and back: nothing lost, nothing made up.
import { describe, expect, test } from "vitest";
import { briefInput, formValues } from "../../src/tui/briefInput.ts";

describe("briefInput({ values, extra })", () => {
  test("blanks are left to the brief's defaults", () => {
    expect(briefInput({ values: { a: "", b: "  ", c: "1" }, extra: {} })).toEqual({ c: "1" });
  });
  test("a key with a point goes one level down, beside what is there", () => {
    const extra = { load: { lamp: { bore: 1 } }, bus: 2 };
    expect(briefInput({ values: { "load.inductance": "20 uH", "load.resistance": " " }, extra })).toEqual({
      load: { lamp: { bore: 1 }, inductance: "20 uH" },
      bus: 2,
    });
    expect(extra).toEqual({ load: { lamp: { bore: 1 } }, bus: 2 });
  });
  test.each([
    ["load", "x"],
    ["load", [1]],
    ["load", null],
  ])("%s of %j stays as it is, for the reader to refuse", (key, odd) => {
    expect(briefInput({ values: { "load.resistance": "1 ohm" }, extra: { [key]: odd } })).toEqual({ load: odd });
  });
});

describe("formValues(brief)", () => {
  test.each([null, undefined, 7, "x", [1]])("%j is an empty form", (brief) => {
    expect(formValues(brief)).toEqual({ brief: {}, extra: {} });
  });
  test("numbers become text, what has no field is kept apart", () => {
    expect(formValues({ energy: 2400, voltage: "2 kV", rate: 1, hold: null })).toEqual({
      brief: { energy: "2400", voltage: "2 kV" },
      extra: { rate: 1, hold: null },
    });
  });
  test("the load's own fields go into the form, the rest of it stays apart", () => {
    expect(formValues({ load: { resistance: 0.05, inductance: "20 uH" } })).toEqual({
      brief: { "load.resistance": "0.05", "load.inductance": "20 uH" },
      extra: {},
    });
    const lamp = { bore: "13 mm", arc: "150 mm", gas: "xenon", pressure: "60 kPa" };
    expect(formValues({ load: { inductance: 1, lamp } })).toEqual({
      brief: { "load.inductance": "1" },
      extra: { load: { lamp } },
    });
  });
  test.each([
    { load: {} },
    { load: { resistance: [1] } },
    { load: "none" },
    { energy: 1, load: { short: true }, switch: { drop: 1 } },
  ])("there and back: %j", (brief) => {
    const { brief: values, extra } = formValues(brief);
    expect(briefInput({ values, extra })).toEqual({ ...brief, ...("energy" in brief ? { energy: "1" } : {}) });
  });
});
