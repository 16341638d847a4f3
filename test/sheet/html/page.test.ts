import axe from "axe-core";
import { HtmlValidate } from "html-validate";
import { JSDOM } from "jsdom";
import { describe, expect, test } from "vitest";
import { sheetOf, sheetText } from "../../../src/sheet/index.ts";
import { ATTACKS } from "../../support/attack.ts";
import { RECOMMENDED, UNLAID } from "../../support/pageRules.ts";
import { LOAD, largeInput, placedIn, RATED, sheetInput, WORDS } from "../../support/sheet.ts";

const html = (input: ReturnType<typeof sheetInput>): string => sheetText(sheetOf(input), "html");

const FULL = (() => {
  const input = sheetInput({ brief: { ...LOAD, dumpResistance: "1 kohm" }, rule: "nec-460-6" });
  return { ...input, placed: placedIn(input) };
})();
const STRINGS = sheetInput({ shape: { ties: "strings" } });

const VALIDATOR = new HtmlValidate(RECOMMENDED);

async function faultsOf(page: string) {
  const { window } = new JSDOM(page, { runScripts: "outside-only" });
  window.eval(axe.source);
  const run = (window as unknown as { readonly axe: typeof axe }).axe.run;
  const { violations } = await run(window.document as never, UNLAID);
  return violations.filter(({ impact }) => impact === "serious" || impact === "critical");
}

describe("sheetToHtml(sheet, paper)", () => {
  test.each([
    ["everything known, measured", FULL],
    ["hardly anything known, strings", STRINGS],
  ])("%s: valid HTML by the recommended rules of a validator", async (_, input) => {
    const report = await VALIDATOR.validateString(html(input));
    expect(
      report.results.flatMap(({ messages }) =>
        messages.map(({ ruleId, message, line }) => ({ ruleId, message, line })),
      ),
    ).toEqual([]);
  });

  test.each([
    ["everything known, measured", FULL],
    ["hardly anything known, strings", STRINGS],
  ])(
    "%s: no serious fault of accessibility",
    async (_, input) => {
      expect((await faultsOf(html(input))).map(({ id, nodes }) => [id, nodes[0]?.html])).toEqual([]);
    },
    60_000,
  );

  test("one file: no script, nothing fetched, a language, a title, a style of its own", () => {
    const page = html(FULL);
    const { document } = new JSDOM(page).window;
    expect(document.documentElement.lang).toBe("en");
    expect(document.title).toBe(`Build sheet: ${FULL.layout.id}`);
    expect(
      document.querySelectorAll("script, link, img, iframe, object, embed, base, form, audio, video"),
    ).toHaveLength(0);
    expect(
      [...page.matchAll(/(?:src|href|srcset|action|data)="([^"]*)"/g)]
        .map((m) => m[1])
        .filter((at) => !at?.startsWith("#")),
    ).toEqual([]);
    expect(page).not.toMatch(/url\(|@import/);
    const external = [...page.matchAll(/https?:\/\/[^"\s<]+/g)].map((m) => m[0]);
    expect(new Set(external)).toEqual(new Set(["http://www.w3.org/2000/svg"]));
    expect(document.querySelectorAll("style")).toHaveLength(1);
  });

  test("tables have captions, column heads with scope, rows named by a head, and as many cells as columns", () => {
    const { document } = new JSDOM(html(FULL)).window;
    const tables = [...document.querySelectorAll("table")];
    expect(tables.length).toBeGreaterThan(20);
    for (const table of tables) {
      expect(table.caption?.textContent).not.toBe("");
      const heads = [...table.querySelectorAll("thead th")];
      expect(heads.every((head) => head.getAttribute("scope") === "col" && head.textContent !== "")).toBe(true);
      for (const row of table.querySelectorAll("tbody tr"))
        if (heads.length > 0) expect(row.children).toHaveLength(heads.length);
    }
    for (const head of document.querySelectorAll("tbody th")) expect(head.getAttribute("scope")).toBe("row");
  });

  test("every link of the contents goes to a section; no id stands twice", () => {
    const { document } = new JSDOM(html(FULL)).window;
    const ids = [...document.querySelectorAll("[id]")].map(({ id }) => id);
    expect(ids.filter((id, i) => ids.indexOf(id) !== i)).toEqual([]);
    for (const link of document.querySelectorAll("nav a")) expect(ids).toContain(link.getAttribute("href")?.slice(1));
  });

  test("the cautions of every page stand in the footer, all of them at the head", () => {
    const { document } = new JSDOM(html(FULL)).window;
    for (const words of ["can kill", "calculation", "codes in force"])
      expect(document.querySelector("footer")?.textContent).toContain(words);
    expect(document.querySelectorAll(".stop li")).toHaveLength(WORDS.cautions.length);
  });

  test("same input, same bytes; the paper changes nothing but the size of the page", () => {
    expect(html(FULL)).toBe(html(FULL));
    const letter = sheetText(sheetOf(FULL), "html", "Letter");
    expect(letter.replace("size: Letter", "size: A4")).toBe(html(FULL));
    expect(letter).not.toBe(html(FULL));
  });

  test.each(["cross-tied", "strings"] as const)("20s40p %s with all charts stays under 2 MB", (ties) => {
    const input = largeInput(ties);
    const page = html({ ...input, placed: placedIn(input) });
    expect(Buffer.byteLength(page)).toBeLessThan(2e6);
    expect(page).toContain("C20.1");
  });
});

describe("text of unknown origin", () => {
  const hostile = (attack: string) => {
    const unit = {
      ...RATED,
      part: attack,
      maker: attack,
      technology: `${attack} electrolytic`,
      note: attack,
      supplier: attack,
    };
    const base = sheetInput({
      unit,
      shape: { series: 2, parallel: 1, ties: "strings" },
      brief: { ...LOAD, energy: "10 J", voltage: "500 V", title: attack, touchSafeRule: attack },
      date: attack,
      revision: attack,
      words: {
        ...WORDS,
        asked: [{ label: attack, value: attack, given: true }],
        notes: [attack],
        charger: attack,
        switch: attack,
        load: attack,
      },
    });
    const placed = placedIn(base);
    const positions = placed.positions.map((p, i) =>
      i === 0 ? { ...p, serial: attack, lot: attack, note: attack } : p,
    );
    const groups = placed.groups.map((group, g) => (g === 0 ? [attack, ...group.slice(1)] : group));
    return { ...base, placed: { ...placed, positions, groups, spares: [attack] } };
  };
  const harmless = (() => {
    const { document } = new JSDOM(html(hostile("plain"))).window;
    return new Set([...document.querySelectorAll("*")].map(({ tagName }) => tagName.toLowerCase()));
  })();

  test.each(ATTACKS.map((attack) => [JSON.stringify(attack), attack]))(
    "%s adds no element and no handler",
    (_, attack) => {
      const page = html(hostile(attack));
      const { document } = new JSDOM(page).window;
      const tags = new Set([...document.querySelectorAll("*")].map(({ tagName }) => tagName.toLowerCase()));
      expect([...tags].filter((tag) => !harmless.has(tag))).toEqual([]);
      for (const element of document.querySelectorAll("*"))
        for (const name of element.getAttributeNames()) expect(name).not.toMatch(/^on|^style$|^srcdoc$|^formaction$/);
      expect(document.querySelectorAll("h1")).toHaveLength(1);
      expect(page).not.toMatch(/[^\n\P{C}]/u);
      expect(document.title).not.toBe("");
    },
  );
});
