import axe from "axe-core";
import { HtmlValidate } from "html-validate";
import { JSDOM } from "jsdom";
import { describe, expect, test } from "vitest";
import { labelsOf, labelsToHtml } from "../../../src/sheet/index.ts";
import { ATTACKS } from "../../support/attack.ts";
import { RECOMMENDED, UNLAID } from "../../support/pageRules.ts";
import { placedIn, RATED, sheetInput } from "../../support/sheet.ts";

const input = (() => {
  const bare = sheetInput({ brief: { title: "Magnet", spares: 2 }, shape: { parallel: 6 } });
  return { ...bare, placed: placedIn(bare) };
})();
const PAGE = labelsToHtml(labelsOf(input), "A4");

describe("labelsToHtml(labels, paper)", () => {
  test("valid HTML by the recommended rules; no serious fault of accessibility", async () => {
    const report = await new HtmlValidate(RECOMMENDED).validateString(PAGE);
    expect(
      report.results.flatMap(({ messages }) => messages.map(({ ruleId, message }) => ({ ruleId, message }))),
    ).toEqual([]);
    const { window } = new JSDOM(PAGE, { runScripts: "outside-only" });
    window.eval(axe.source);
    const { violations } = await (window as unknown as { readonly axe: typeof axe }).axe.run(
      window.document as never,
      UNLAID,
    );
    expect(
      violations.filter(({ impact }) => impact === "serious" || impact === "critical").map(({ id }) => id),
    ).toEqual([]);
  }, 60_000);

  test("every label is on it, the cautions are in the footer, nothing is fetched or run", () => {
    const { document } = new JSDOM(PAGE).window;
    const words = document.querySelector("main")?.textContent ?? "";
    for (const label of ["Unit 1.1", "Unit 8.6", "Stage 8", "Spare 2"]) expect(words).toContain(label);
    expect(document.querySelector("footer")?.textContent).toMatch(/can kill/);
    expect(document.querySelectorAll("script, link, img, iframe, [style]")).toHaveLength(0);
    expect(PAGE).toBe(labelsToHtml(labelsOf(input), "A4"));
  });

  test("text of unknown origin adds no element", () => {
    const tagsOf = (page: string) =>
      new Set([...new JSDOM(page).window.document.querySelectorAll("*")].map(({ tagName }) => tagName));
    const attack = ATTACKS.join(" ");
    const bare = sheetInput({ unit: { ...RATED, part: attack }, brief: { title: ATTACKS[0] }, shape: { parallel: 3 } });
    const placed = placedIn(bare);
    const positions = placed.positions.map((p, i) => ({ ...p, serial: ATTACKS[i % ATTACKS.length] as string }));
    const page = labelsToHtml(labelsOf({ ...bare, placed: { ...placed, positions } }), "A4");
    const harmless = tagsOf(PAGE);
    expect([...tagsOf(page)].filter((tag) => !harmless.has(tag))).toEqual([]);
    expect(page).not.toMatch(/[^\n\P{C}]/u);
  });
});
