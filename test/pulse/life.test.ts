// life: no exponent is ever assumed, then the worked factors.
import { describe, expect, test } from "vitest";
import { lifeRatio } from "../../src/pulse/life.ts";
import { near } from "./near.ts";

describe("lifeRatio(stresses)", () => {
  test("nothing stressed is one", () => expect(lifeRatio({}).ratio).toBe(1));

  test("a missing exponent leaves the ratio unknown and says which, unless the stress stays at its reference", () => {
    const voltage = { value: 0.9, reference: 1, exponent: null };
    expect(lifeRatio({ voltage })).toMatchObject({ voltage: null, ratio: null, missing: ["voltage"] });
    expect(lifeRatio({ voltage: { ...voltage, value: 1 } })).toMatchObject({ ratio: 1, missing: [] });
  });

  test("every missing exponent is named, in order; a law that has no value is not", () => {
    const stress = { value: 2, reference: 1, exponent: null };
    expect(lifeRatio({ voltage: stress, reversal: stress, temperature: stress })).toEqual({
      voltage: null,
      reversal: null,
      temperature: null,
      ratio: null,
      missing: ["voltage", "reversal", "temperature"],
    });
    const known = { value: 1, reference: 2, exponent: 3 };
    expect(lifeRatio({ voltage: known, reversal: known, temperature: stress })).toMatchObject({
      voltage: 8,
      reversal: 8,
      temperature: null,
      ratio: null,
      missing: ["temperature"],
    });
    expect(lifeRatio({ voltage: stress, temperature: known }).ratio).toBeNull();
    expect(lifeRatio({ reversal: stress, temperature: known }).ratio).toBeNull();
  });

  test("no reversal at all has no law: unknown, never infinite", () => {
    const reversal = { value: 0, reference: 0.1, exponent: 1.6 };
    expect(lifeRatio({ reversal })).toMatchObject({ reversal: null, ratio: null, missing: [] });
  });

  test("worked, film: 0.9 of the voltage to the 7.5, reversal 0.1 to 0.35 to the 1.6", () => {
    const film = lifeRatio({
      voltage: { value: 0.9, reference: 1, exponent: 7.5 },
      reversal: { value: 0.35, reference: 0.1, exponent: 1.6 },
    });
    near(film.ratio, 0.296942464);
  });

  test("worked, electrolytic: 85 to 55 degC halving per 10 K, 0.8 of the voltage to the 4", () => {
    const can = lifeRatio({
      temperature: { value: 328.15, reference: 358.15, exponent: 10 },
      voltage: { value: 0.8, reference: 1, exponent: 4 },
    });
    near(can.ratio, 19.53125, 1e-12);
  });

  test("published: 20 % against 85 % reversal to the 1.6 is about a tenth", () => {
    near(lifeRatio({ reversal: { value: 0.85, reference: 0.2, exponent: 1.6 } }).ratio, 0.0987592, 1e-6);
  });
});
