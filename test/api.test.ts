// The library as it ships: packed, installed without a network, type-checked and run; every example of its page included.
// To write the outputs of the page anew: API=write npx vitest run test/api.test.ts
import { execFileSync } from "node:child_process";
import { readFileSync, rmSync, writeFileSync } from "node:fs";
import { join, resolve } from "node:path";
import { transformSync } from "esbuild";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { type Packed, packed, typeFaults } from "./support/packed.ts";

const PAGE = resolve(import.meta.dirname, "../src/api.md");
const page = readFileSync(PAGE, "utf8");
const BLOCK = /```ts\n([\s\S]*?)```\n\n```text\n([\s\S]*?)```/g;
const blocks = [...page.matchAll(BLOCK)].map(([whole, code = "", shown = ""], i) => ({
  whole,
  code,
  shown,
  name: `example-${i + 1}`,
}));

let library: Packed;
beforeAll(() => {
  library = packed();
}, 120_000);
afterAll(() => rmSync(library.folder, { recursive: true, force: true }));

/** What a program of the consumer prints. Every console is as wide as a page. */
function printed(name: string, code: string): string {
  const { code: script } = transformSync(code, { loader: "ts", format: "esm", target: "node20" });
  writeFileSync(join(library.folder, `${name}.mjs`), script);
  return execFileSync(process.execPath, [`${name}.mjs`], {
    cwd: library.folder,
    encoding: "utf8",
    env: { NO_COLOR: "1" },
  });
}

describe("the package", () => {
  test("holds the program, the library, its types, its papers, and no sources", () => {
    const { files } = library;
    expect(files).toEqual(
      expect.arrayContaining([
        "dist/main.js",
        "dist/worker.js",
        "dist/index.js",
        "dist/types/index.d.ts",
        "dist/licences.txt",
        "dist/components.json",
        "dist/joulewright.1",
        "src/api.md",
        "src/changes.md",
        "catalogs/demo-brief.json",
        "LICENSE",
        "README.md",
      ]),
    );
    expect(files.filter((name) => /(?<!\.d)\.tsx?$|\.map$|^test|^fixtures/.test(name))).toEqual([]);
  });

  test("asks for no script at installation", () => {
    const { scripts } = JSON.parse(readFileSync(join(library.installed, "package.json"), "utf8"));
    expect(Object.keys(scripts).filter((name) => /^(pre|post)?install$/.test(name))).toEqual([]);
  });

  test("its manual page is one that an installation links: a list, of files that it brings, of section 1", () => {
    const { man } = JSON.parse(readFileSync(join(library.installed, "package.json"), "utf8"));
    expect(man).toEqual(["./dist/joulewright.1"]);
    expect(readFileSync(join(library.installed, man[0]), "utf8")).toMatch(/^\.TH JOULEWRIGHT 1 /);
  });

  test("the program runs from where it was installed", () => {
    const version = execFileSync(process.execPath, [join(library.installed, "dist/main.js"), "--version"], {
      encoding: "utf8",
    });
    expect(version.trim()).toBe(JSON.parse(readFileSync(join(library.installed, "package.json"), "utf8")).version);
  });

  test("a consumer without Node's types, and with the library's own checked, type-checks; a slip of it does not", () => {
    writeFileSync(
      join(library.folder, "good.ts"),
      `import { type Brief, plan, type PlanResult, type Read, readBrief } from "joulewright";
       import * as whole from "joulewright";
       const brief: Read<Brief> = readBrief({});
       export const answer = (given: Brief): Read<PlanResult> => plan({ brief: given, parts: [] });
       export const volts: number = whole.bank.storedEnergy(1, 2);
       export const code: string = brief.ok ? "" : (brief.refusals[0]?.code ?? "");
      `,
    );
    expect(typeFaults(library, ["good.ts"])).toBe("");
    writeFileSync(
      join(library.folder, "bad.ts"),
      'import { plan } from "joulewright";\nexport const a: string = plan({ brief: 1 });\n',
    );
    expect(typeFaults(library, ["bad.ts"])).toMatch(/bad\.ts\(2,/);
  }, 60_000);

  test("the library reaches neither screens nor command line", () => {
    const listed = printed(
      "reach",
      'import * as whole from "joulewright"; console.log(Object.keys(whole).length, typeof whole.plan);',
    );
    expect(listed).toMatch(/^\d{2,3} function\n$/);
    const seen = new Set<string>();
    const follow = (name: string): void => {
      if (seen.has(name)) return;
      seen.add(name);
      const text = readFileSync(join(library.installed, "dist", name), "utf8");
      for (const [, path = ""] of text.matchAll(/(?:from|import)\s*\(?"(\.[^"]+)"/g)) follow(join(name, "..", path));
    };
    follow("index.js");
    const text = [...seen].map((name) => readFileSync(join(library.installed, "dist", name), "utf8")).join("\n");
    expect(seen.size).toBeGreaterThan(1);
    expect(text).not.toMatch(/^\/\/ \S*node_modules\/(ink|react|commander|yoga-layout)\//m);
  });
});

if (process.env.API === "write") {
  test("written anew", () => {
    let text = page;
    for (const { whole, name, code } of blocks)
      text = text.replace(whole, () => `\`\`\`ts\n${code}\`\`\`\n\n\`\`\`text\n${printed(name, code)}\`\`\``);
    writeFileSync(PAGE, text);
    expect(blocks.length).toBeGreaterThan(5);
  });
} else {
  describe("the page of the library", () => {
    test("has examples, and names nothing that the library lacks", () => {
      expect(blocks.length).toBeGreaterThan(5);
      const table = page.slice(page.indexOf("## What else there is"));
      const named = [...table.matchAll(/`([A-Za-z]+)`/g)].map((m) => m[1]);
      const there = printed(
        "names",
        'import * as whole from "joulewright"; console.log(JSON.stringify(Object.keys(whole)));',
      );
      expect(named.filter((name) => !JSON.parse(there).includes(name))).toEqual([]);
    });

    test("its examples type-check", () => {
      for (const { name, code } of blocks) writeFileSync(join(library.folder, `${name}.ts`), `${code}export {};\n`);
      expect(
        typeFaults(
          library,
          blocks.map(({ name }) => `${name}.ts`),
        ),
      ).toBe("");
    }, 60_000);

    test.each(blocks)("$name prints what the page shows", ({ name, code, shown }) => {
      expect(printed(name, code)).toBe(shown);
    });
  });
}
