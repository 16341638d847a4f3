// The proof by names, and the second engine's word, also when it contradicts.
import { describe, expect, test } from "vitest";
import { findBlend } from "../../src/search/blend/findBlend.ts";
import { type Proof, proofOf, type SolveApart, secondOpinion } from "../../src/search/blendProof.ts";
import { solveWhole } from "../../src/search/solve.ts";
import { partsOf, workOf } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

const brief = briefOf({ energy: (1e-3 * 400 ** 2) / 2, voltage: 400, basis: "nominal" });
const work = workOf(
  partsOf({ price: 3, available: 6 }, { capacitance: 150, price: 4, available: 5 }, { capacitance: 220, price: 9 }),
  brief,
);
const { model, types } = work;
const answer = findBlend(model);
const proof = proofOf(work, answer, "EUR") as Proof;
const clock = () => performance.now();

describe("proofOf(work, answer, currency)", () => {
  test("names what the search knows by number, and the verifier agrees", () => {
    expect(proof.named).toMatchObject({
      claim: "cheapest",
      cost: answer.best!.cost,
      compared: 3,
      verdict: "valid",
      why: null,
    });
    expect(proof.named.survivors.map(({ part }) => part)).toEqual(
      proof.plain.survivors.map(({ option }) => types[option]!.unit.part),
    );
  });
  test("a false claim is called invalid, with the reason", () => {
    const dearer = { ...answer, best: { counts: [{ option: 2, strings: 5 }], cost: 4500 } };
    const named = proofOf(work, dearer, "EUR")!.named;
    expect(named.verdict).toBe("invalid");
    expect(named.why).toMatch(/cheaper|missing/);
  });
  test("a bound less than a cent below the cost settles it: no survivor is listed, none is wanted", () => {
    const asked = { ...brief, maxVolume: 0.0009 };
    const tight = workOf(
      partsOf({ price: 3, available: 6 }, { capacitance: 150, price: 4, pack: 4 }, { capacitance: 220, price: 7.5 }),
      asked,
    );
    const { named } = proofOf(tight, findBlend(tight.model), "EUR")!;
    expect(named.bound).toBeGreaterThan(named.cost! - 1);
    expect(named.bound).toBeLessThan(named.cost! - 0.5);
    expect([named.verdict, named.survivors]).toEqual(["valid", []]);
  });
  test("a search that was stopped has none", () =>
    expect(proofOf(work, { ...answer, status: "stopped" }, "EUR")).toBeNull());
});

describe("secondOpinion(model, proof, asking)", () => {
  /** All pairs left open, as if arithmetic had ruled out nothing. */
  const survivors = model.options.map(({ maxStrings }, option) => ({
    option,
    strings: Array.from({ length: maxStrings }, (_, x) => x + 1),
  }));
  test("agrees on a true proof, in this thread and apart from it", async () => {
    const open = { ...proof, plain: { ...proof.plain, survivors } };
    expect(await secondOpinion(model, open, { clock })).toEqual({ said: "agrees", blend: null });
    const apart = (program: Parameters<SolveApart>[0]) => Promise.resolve(solveWhole(program));
    expect(await secondOpinion(model, open, { apart })).toEqual({ said: "agrees", blend: null });
  });
  test("an engine apart that was ended has no answer", async () => {
    const open = { ...proof, plain: { ...proof.plain, survivors } };
    const apart: SolveApart = () => Promise.resolve({ status: "unknown", why: "time" });
    expect((await secondOpinion(model, open, { apart })).said).toBe("no answer");
  });
  test("disagrees where the claim is too dear, with a blend that fits and costs what the optimum does", async () => {
    const plain = { ...proof.plain, survivors, cost: answer.best!.cost + 1 };
    const { said, blend } = await secondOpinion(model, { ...proof, plain }, { clock });
    expect(said).toBe("disagrees");
    expect(blend!.cost).toBe(answer.best!.cost);
  });
  test("disagrees where nothing is claimed to fit", async () => {
    const plain = { ...proof.plain, cost: null, counts: [], survivors: [] };
    expect((await secondOpinion(model, { ...proof, plain }, { clock })).said).toBe("disagrees");
  });
  test("is not asked without a clock, without survivors, or of too many; apart from this thread of more", async () => {
    const said = async (plain: Proof["plain"], asking: Parameters<typeof secondOpinion>[2]) =>
      (await secondOpinion(model, { ...proof, plain }, asking)).said;
    expect(await said(proof.plain, {})).toBe("not asked");
    expect(await said({ ...proof.plain, survivors: [] }, { clock })).toBe("not asked");
    const many = (count: number) => ({
      ...proof.plain,
      survivors: [{ option: 0, strings: Array.from({ length: count }, (_, x) => x + 1) }],
    });
    expect(await said(many(121), { clock })).toBe("not asked");
    expect(await said(many(251), { apart: () => Promise.reject(new Error("asked")) })).toBe("not asked");
  });
});
