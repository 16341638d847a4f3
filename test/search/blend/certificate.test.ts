// Certificates say what was found and hold what is left open.
import { expect, test } from "vitest";
import { certificatePairs, certify, costBeyond } from "../../../src/search/blend/certificate.ts";
import { findBlend } from "../../../src/search/blend/findBlend.ts";
import { verifyCertificate } from "../../../src/search/blend/verify.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { inventInstance } from "../../support/blendInstances.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";

test("certify: every settled answer of 400 tiny models and 60 catalogues is verified", () => {
  const models = [
    ...Array.from({ length: 400 }, (_, seed) => tinyModel(seed)),
    ...Array.from(
      { length: 60 },
      (_, seed) => inventInstance({ parts: [5, 20, 100][seed % 3]!, seed: 500 + seed }).model,
    ),
  ];
  for (const model of models) {
    const answer = findBlend(model);
    const certificate = certify(model, answer)!;
    expect(certificate.cost).toBe(answer.best?.cost ?? null);
    expect(verifyCertificate(model, certificate)).toEqual({ verdict: "valid" });
  }
});

test("certify: a stopped answer has no certificate", () => {
  const { model } = inventInstance({
    parts: 100,
    seed: 9008,
    maxTypes: 6,
    energy: [20, 200],
    stock: 0.3,
    mostStrings: 400,
    ceiling: 0.95,
  });
  const answer = findBlend(model, { work: 1000 });
  expect(answer.status).toBe("stopped");
  expect(certify(model, answer)).toBeNull();
});

test("certify: it survives being written as JSON", () => {
  const { model } = inventInstance({ parts: 20, seed: 503 });
  const certificate = certify(model, findBlend(model))!;
  expect(verifyCertificate(model, JSON.parse(JSON.stringify(certificate)))).toEqual({ verdict: "valid" });
});

test("certificatePairs lists options and counts; costBeyond is above all blends", () => {
  const model = plainModel(10e-6, [
    { capacity: 3e-6, most: 4, price: 10 },
    { capacity: 4e-6, most: 4, price: 13 },
  ]);
  const certificate = certify(model, findBlend(model))!;
  // 3 + 3 + 4 = 10 for 33, the proven optimum.
  expect(certificate.cost).toBe(33);
  expect(certificatePairs(certificate).every(({ option, strings }) => option < 2 && strings >= 1 && strings <= 4)).toBe(
    true,
  );
  expect(costBeyond(model)).toBe(93);
  expect(bruteForce(model)).toBe(33);
});
