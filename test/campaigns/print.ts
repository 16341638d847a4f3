// Prints sheets and labels on A4 and Letter with a headless browser and looks at every page: `node print.mjs [FOLDER [BANK...]]`, bundled with
// esbuild --packages=external. Wants chromium (CHROMIUM, else /usr/bin/chromium) and pdftotext. PDFs stay in FOLDER when it is named.
//
// Looked for: a table, drawing or line that passes the right edge; a cell whose text is cut; a page without the cautions; a heading,
// caption or table head that stands last on its page; a page that is empty.
import { execFileSync } from "node:child_process";
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { chromium, type Page } from "playwright-core";
import { labelsOf, labelsToHtml, PAPERS, type Paper, type Sheet, sheetOf, sheetText } from "../../src/sheet/index.ts";
import { BARE, LOAD, largeInput, placedIn, sheetInput } from "../support/sheet.ts";

const FLAGS = [
  "--headless",
  "--no-sandbox",
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];
/** Width between the margins of 15 mm, CSS pixels of 1/96 inch. */
const WIDTH: Readonly<Record<Paper, number>> = { A4: ((210 - 30) / 25.4) * 96, Letter: ((215.9 - 30) / 25.4) * 96 };

const measured = (input: ReturnType<typeof sheetInput>) => ({ ...input, placed: placedIn(input) });
const LONG = "a-part-name-that-goes-on-without-a-break-".repeat(4);
const BANKS: Readonly<Record<string, ReturnType<typeof sheetInput>>> = {
  "8s2p": measured(
    sheetInput({ brief: { ...LOAD, dumpResistance: "1 kohm", title: "Flash-lamp driver" }, rule: "nec-460-28" }),
  ),
  "8s2p-bare": sheetInput({ unit: BARE }),
  "8s3p-strings": sheetInput({ shape: { ties: "strings", parallel: 3 }, brief: LOAD }),
  "1s1p": sheetInput({
    shape: { series: 1, parallel: 1, ties: "strings" },
    brief: { voltage: "300 V", energy: "10 J" },
  }),
  "8s2p-long-names": measured(sheetInput({ unit: { ...BARE, part: LONG, note: LONG }, brief: { title: LONG } })),
  "20s40p": measured(largeInput()),
};

const one = (words: string): string => words.replace(/\s+/g, " ").trim();

/** Lines of each page of a PDF, blank ones left out. */
function pagesOf(pdf: string): readonly (readonly string[])[] {
  const text = execFileSync("pdftotext", ["-layout", pdf, "-"], { encoding: "utf8", maxBuffer: 1 << 28 });
  const pages = text.split("\f").slice(0, -1);
  return pages.map((page) =>
    page
      .split("\n")
      .map(one)
      .filter((line) => line !== ""),
  );
}

/** Text that must not stand last on a page. */
function headsOf(sheet: Sheet): { readonly lines: ReadonlySet<string>; readonly tables: readonly string[] } {
  // Under a head with blank rows alone a page has no more text, and that is as it should be.
  const tables = sheet.sections
    .flatMap(({ blocks }) => blocks)
    .filter((block) => block.kind === "table" && !block.rows.some((row) => row.every((cell) => cell === null)))
    .filter((block) => block.kind === "table");
  return {
    lines: new Set([...sheet.sections.map(({ title }) => one(title)), ...tables.map(({ caption }) => one(caption))]),
    tables: tables.map(({ columns }) => sorted(columns.map(({ heading }) => heading).join(" "))),
  };
}

const sorted = (words: string): string => one(words).split(" ").sort().join(" ");

/** Most lines that a table's head takes. */
const HEAD_LINES = 5;

function pageFaults(pages: readonly (readonly string[])[], footer: string, sheet: Sheet | null): readonly string[] {
  const opening = footer.split(" ").slice(0, 3).join(" ");
  const heads = sheet === null ? null : headsOf(sheet);
  return pages.flatMap((lines, i) => {
    const page = `page ${i + 1}`;
    const whole = lines.join(" ");
    const foot = lines.findLastIndex((line) => line.includes(opening));
    if (!whole.includes(one(footer))) return [`${page}: the cautions are not on it`];
    const body = foot < 0 ? lines : lines.slice(0, foot);
    if (body.length === 0) return [`${page}: nothing on it but the cautions`];
    if (heads === null) return [];
    const last = body.at(-1) as string;
    if (heads.lines.has(last)) return [`${page}: ends with the heading "${last}"`];
    for (let count = 1; count <= HEAD_LINES; count++)
      if (heads.tables.includes(sorted(body.slice(-count).join(" "))))
        return [`${page}: ends with the head of a table`];
    return [];
  });
}

/** What passes the right edge, or is cut inside its cell, when the page is laid out as wide as the paper's own text. */
async function edgeFaults(page: Page, width: number): Promise<readonly string[]> {
  await page.emulateMedia({ media: "print" });
  await page.setViewportSize({ width: Math.floor(width), height: 1000 });
  return page.evaluate((most: number) => {
    interface Box {
      readonly tagName: string;
      readonly id: string;
      readonly scrollWidth: number;
      readonly clientWidth: number;
      readonly textContent: string | null;
      readonly getBoundingClientRect: () => { readonly right: number };
    }
    const { document } = globalThis as unknown as {
      readonly document: { readonly querySelectorAll: (query: string) => Iterable<Box> };
    };
    const found: string[] = [];
    for (const element of document.querySelectorAll("table, svg, p, li, h1, h2, caption, figcaption"))
      if (element.getBoundingClientRect().right > most + 0.5)
        found.push(`${element.tagName} ${element.id} passes the right edge`);
    for (const element of document.querySelectorAll("td, th"))
      if (element.scrollWidth > element.clientWidth + 1)
        found.push(`cell is cut: ${(element.textContent ?? "").slice(0, 40)}`);
    return found;
  }, Math.floor(width));
}

const asked = process.argv[2];
const folder = asked ?? mkdtempSync(join(tmpdir(), "print-"));
mkdirSync(folder, { recursive: true });
const browser = await chromium.launch({ executablePath: process.env.CHROMIUM ?? "/usr/bin/chromium", args: FLAGS });
let bad = 0;
const names = process.argv.slice(3);
for (const [name, input] of Object.entries(BANKS).filter(([bank]) => names.length === 0 || names.includes(bank)))
  for (const paper of PAPERS) {
    const sheet = sheetOf(input);
    const labels = labelsOf(input);
    for (const [kind, html, of] of [
      ["sheet", sheetText(sheet, "html", paper), sheet],
      ["labels", labelsToHtml(labels, paper), null],
    ] as const) {
      const page = await browser.newPage();
      await page.setContent(html, { waitUntil: "load" });
      const pdf = join(folder, `${name}-${kind}-${paper}.pdf`);
      writeFileSync(pdf, await page.pdf({ preferCSSPageSize: true }));
      const pages = pagesOf(pdf);
      const faults = [...(await edgeFaults(page, WIDTH[paper])), ...pageFaults(pages, labels.footer.join(" "), of)];
      await page.close();
      bad += faults.length;
      console.log(
        `${name} ${kind} ${paper}: ${pages.length} pages, ${(html.length / 1e3).toFixed(0)} kB, ${faults.length} faults`,
      );
      for (const fault of faults.slice(0, 12)) console.log(`  ${fault}`);
    }
  }
await browser.close();
if (asked === undefined) rmSync(folder, { recursive: true, force: true });
console.log(`${bad} faults`);
process.exitCode = bad === 0 ? 0 : 1;
