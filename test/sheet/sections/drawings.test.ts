import { describe, expect, test } from "vitest";
import { faceSection, schematicOf, schematicSection } from "../../../src/sheet/sections/drawings.ts";
import { BARE, LOAD, placedIn, sheetInput, WORDS, wordsIn } from "../../support/sheet.ts";

describe("schematicOf(input)", () => {
  test("what the brief does not say is a blank, never a part that is not there", () => {
    expect(schematicOf(sheetInput())).toMatchObject({
      charger: null,
      isolation: [{ kind: "resistor", resistance: null }],
      dump: { resistance: null },
      switch: { kind: "unknown", words: null },
      load: { kind: "unknown", words: null, coil: false },
      bleeds: [],
      fuse: null,
      isolating: null,
      chargeVoltage: 2000,
    });
  });

  test("what it says is drawn: supply resistor, dump, clamp, one-way switch, lamp with its coil", () => {
    const lamp = { bore: "8 mm", arc: "100 mm", gas: "xenon", pressure: "450 torr" };
    const props = schematicOf({
      ...sheetInput({
        brief: {
          charger: { supply: "2.2 kV", resistance: "10 kohm" },
          dumpResistance: "1 kohm",
          clamp: { drop: "1 V" },
          switch: { oneWay: true },
          isolating: "10 mohm",
        },
      }),
      words: { ...WORDS, charger: "2.2 kV behind 10 kohm" },
    });
    expect(props).toMatchObject({
      charger: "2.2 kV behind 10 kohm",
      isolation: [{ resistance: 10e3 }],
      dump: { resistance: 1000 },
      switch: { kind: "thyristor" },
      clamps: { bank: true },
      isolating: { resistance: 0.01 },
    });
    const brief = sheetInput({ brief: { load: { lamp, inductance: "100 uH" } } }).brief;
    expect(schematicOf({ ...sheetInput(), brief }).load).toMatchObject({ kind: "lamp", coil: true });
    expect(schematicOf(sheetInput({ brief: LOAD })).load).toMatchObject({ kind: "coil", coil: false });
  });

  test("no chain: a bleed resistor to be chosen; a polarised bank of several stages has clamp diodes", () => {
    const single = { shape: { series: 1, ties: "strings" }, brief: { voltage: "300 V", energy: "10 J" } } as const;
    expect(schematicOf(sheetInput(single)).bleeds).toEqual([{ resistance: null, words: null }]);
    expect(schematicOf(sheetInput()).clamps.positions).toBe(true);
    expect(schematicOf(sheetInput({ unit: { ...BARE, polarised: false } })).clamps.positions).toBe(false);
  });

  test("schematicSection(input) tells in words what is drawn", () => {
    expect(wordsIn(schematicSection(sheetInput()))).toMatch(
      /bank of 8 in series by 2 in parallel, cross-tied, between TP0 \(negative end\) and TP8/,
    );
    expect(wordsIn(schematicSection(sheetInput({ earth: "none" })))).toMatch(/no end is earthed/);
  });
});

describe("faceSection(input)", () => {
  test("serials of the placing where there is one, lines to fill in where there is none", () => {
    const drawn = (input: ReturnType<typeof sheetInput>) => {
      const block = faceSection(input).blocks.find(({ kind }) => kind === "drawing");
      if (block?.kind !== "drawing" || block.drawn.kind !== "face") throw new Error("no face");
      return block.drawn.props;
    };
    const bare = sheetInput({ brief: { spares: 3 } });
    expect(drawn(bare)).toMatchObject({ groups: null, spares: [null, null, null], series: 8, parallel: 2 });
    const placed = placedIn(bare);
    expect(drawn({ ...bare, placed })).toMatchObject({ groups: placed.groups, spares: placed.spares });
  });
});
