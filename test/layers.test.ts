// The laws of the house, each a test: layers, single owners of outside packages, no clock or chance in the core, test twins.
import { existsSync, readdirSync, readFileSync } from "node:fs";
import { dirname, join, relative, resolve } from "node:path";
import { describe, expect, test } from "vitest";

const SRC = resolve(import.meta.dirname, "../src");
const TEST = resolve(import.meta.dirname);

/** Lowest first. A file outside these folders (main.ts, index.ts) may import any of them. */
const LAYERS = [
  "quantity",
  "catalog",
  "bank",
  "pulse",
  "hazard",
  "search",
  "place",
  "order",
  "sheet",
  "cli",
  "tui",
] as const;

/** Outside packages and the only files or layers that may import them. */
const OWNERS: Readonly<Record<string, readonly string[]>> = {
  "node:fs": ["cli/files.ts"],
  "node:worker_threads": ["cli/jobs.ts", "cli/thread.ts", "worker.ts"],
  "csv-parse": ["catalog/csv.ts"],
  commander: ["cli/"],
  ink: ["tui/"],
  react: ["tui/"],
  zod: ["catalog/", "search/", "place/", "pulse/", "cli/", "tui/"],
  "javascript-lp-solver": ["search/solve.ts"],
  highs: ["search/highs.ts"],
  "d3-scale": ["sheet/draw/scales.ts"],
  "d3-shape": ["sheet/draw/paths.ts"],
  preact: ["sheet/"],
  "preact-render-to-string": ["sheet/render.ts"],
};

const files = readdirSync(SRC, { recursive: true, encoding: "utf8" })
  .filter((name) => /\.tsx?$/.test(name))
  .map((name) => name.replaceAll("\\", "/"))
  .sort();

const text = (file: string): string => readFileSync(join(SRC, file), "utf8");
const code = (file: string): string => text(file).replace(/\/\*[\s\S]*?\*\/|(^|\s)\/\/[^\n]*/g, "");
const layerOf = (file: string): string => (file.includes("/") ? file.slice(0, file.indexOf("/")) : "main");

function importsOf(file: string): readonly string[] {
  const found = code(file).matchAll(/(?<!["'.])\b(?:from|import)\s*\(?\s*"([^"]+)"/g);
  return [...found].map((m) => m[1] ?? "");
}

/** The file under src that a relative import means. */
const target = (file: string, spec: string): string =>
  relative(SRC, resolve(join(SRC, dirname(file)), spec)).replaceAll("\\", "/");

describe("layers", () => {
  test("every folder of src is a known layer", () => {
    const folders = new Set(files.map(layerOf).filter((name) => name !== "main"));
    expect([...folders].filter((name) => !(LAYERS as readonly string[]).includes(name))).toEqual([]);
  });

  test("a layer imports only layers below it, and only through their index", () => {
    const faults: string[] = [];
    for (const file of files) {
      const own = LAYERS.indexOf(layerOf(file) as (typeof LAYERS)[number]);
      if (own < 0) continue;
      for (const spec of importsOf(file).filter((s) => s.startsWith("."))) {
        const to = target(file, spec);
        const layer = layerOf(to);
        if (layer === layerOf(file)) continue;
        const rank = LAYERS.indexOf(layer as (typeof LAYERS)[number]);
        if (rank < 0 || rank >= own) faults.push(`${file} imports ${to}: not a layer below`);
        else if (to !== `${layer}/index.ts`) faults.push(`${file} imports ${to}: not through its index`);
        if (layerOf(file) === "tui" && layer === "cli" && to !== "cli/index.ts") faults.push(`${file} imports ${to}`);
      }
    }
    expect(faults).toEqual([]);
  });

  test("files of one layer import each other without cycles", () => {
    const graph = new Map(
      files.map((file) => [
        file,
        importsOf(file)
          .filter((s) => s.startsWith("."))
          .map((s) => target(file, s)),
      ]),
    );
    const state = new Map<string, "open" | "done">();
    const cycles: string[] = [];
    const visit = (file: string, path: readonly string[]): void => {
      if (state.get(file) === "done") return;
      if (state.get(file) === "open") {
        cycles.push([...path, file].join(" -> "));
        return;
      }
      state.set(file, "open");
      for (const next of graph.get(file) ?? []) visit(next, [...path, file]);
      state.set(file, "done");
    };
    for (const file of files) visit(file, []);
    expect(cycles).toEqual([]);
  });
});

describe("owners", () => {
  test("each outside package is imported only by its owner", () => {
    const faults: string[] = [];
    for (const file of files) {
      for (const spec of importsOf(file).filter((s) => !s.startsWith("."))) {
        const owner = Object.entries(OWNERS).find(([name]) => spec === name || spec.startsWith(`${name}/`));
        if (owner && !owner[1].some((place) => file === place || (place.endsWith("/") && file.startsWith(place)))) {
          faults.push(`${file} imports ${spec}`);
        }
        if (!owner && !spec.startsWith("node:"))
          faults.push(`${file} imports ${spec}, which has no owner in this test`);
      }
    }
    expect(faults).toEqual([]);
  });

  test("no clock, chance or process below cli", () => {
    const core = LAYERS.slice(0, LAYERS.indexOf("cli")) as readonly string[];
    const faults = files
      .filter((file) => core.includes(layerOf(file)))
      .filter((file) => /Date\.now|new Date\b|performance\.now|Math\.random|\bprocess\.|\bconsole\./.test(code(file)));
    expect(faults).toEqual([]);
  });
});

describe("the same numbers on every engine", () => {
  test("no power but a square, or one of two written numbers, outside quantity/power.ts", () => {
    // Engines round x ** 3, x ** -1, x ** 1.5 and 10 ** -5 differently in the last figure.
    const faults = files
      .filter((file) => file !== "quantity/power.ts")
      .flatMap((file) =>
        code(file)
          .replace(/(["'`])(?:\\.|(?!\1)[^\\])*\1/g, "")
          .split("\n")
          .filter((line) => /Math\.pow|\*\*(?! *2\b(?!\.))/.test(line.replace(/\b2 \*\* -?\d+\b/g, "")))
          .map((line) => `${file}: ${line.trim()}`),
      );
    expect(faults).toEqual([]);
  });
});

describe("companions", () => {
  test("every source file but an index, the entry and the tables of looks has a test of the same name", () => {
    const exempt = /(^|\/)(index|main|worker|theme)\.tsx?$|^tui\/view\//;
    const missing = files.filter((file) => {
      if (exempt.test(file)) return false;
      const stem = file.replace(/\.tsx?$/, "");
      return !existsSync(join(TEST, `${stem}.test.ts`)) && !existsSync(join(TEST, `${stem}.test.tsx`));
    });
    expect(missing).toEqual([]);
  });

  test("every source file opens with a sentence that says its job", () => {
    const silent = files.filter((file) => !/^(#!.*\n)?(\/\/ \S|\/\*\*?\s)/.test(text(file)));
    expect(silent).toEqual([]);
  });

  test("every source key is listed in DEVELOPERS.md", () => {
    const page = readFileSync(resolve(TEST, "../DEVELOPERS.md"), "utf8");
    const keys = new Set(
      files.flatMap((file) => [...text(file).matchAll(/Source: \[([A-Za-z0-9-]+)\]/g)].map((m) => m[1])),
    );
    expect([...keys].filter((key) => !page.includes(`[${key}]`))).toEqual([]);
  });
});
