// Builds the package into a folder: node .ci/build.mjs [folder] [step...]. Without a folder: dist. Without steps: all of them.
import { execFileSync } from "node:child_process";
import { mkdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join, resolve } from "node:path";
import { build } from "esbuild";
import { billOfMaterials } from "./components.mjs";
import { licences } from "./licences.mjs";
import { declarations } from "./types.mjs";

const ROOT = resolve(import.meta.dirname, "..");
const [folder = join(ROOT, "dist"), ...asked] = process.argv.slice(2);
const STEPS = ["bundle", "types", "licences", "components", "manual"];
const steps = asked.length > 0 ? asked : STEPS;
const wrong = steps.filter((step) => !STEPS.includes(step));
if (wrong.length > 0) throw new Error(`no step ${wrong.join(", ")}; there are ${STEPS.join(", ")}`);

const read = (path) => JSON.parse(readFileSync(join(ROOT, path), "utf8"));
const write = (name, text) => writeFileSync(join(folder, name), text);

rmSync(folder, { recursive: true, force: true });
mkdirSync(folder, { recursive: true });
const { metafile } = await build({
  absWorkingDir: ROOT,
  entryPoints: ["src/main.ts", "src/worker.ts", "src/index.ts"],
  outdir: folder,
  bundle: true,
  splitting: true,
  platform: "node",
  target: "node20",
  format: "esm",
  entryNames: "[name]",
  chunkNames: "chunks/[name]-[hash]",
  define: { "process.env.NODE_ENV": '"production"' },
  // Ink's debugger is never loaded; the solver finds its own binary beside itself.
  external: ["react-devtools-core", "highs"],
  banner: { js: "import{createRequire}from'node:module';const require=createRequire(import.meta.url);" },
  metafile: true,
  logLevel: "warning",
});
if (steps.includes("types")) declarations(ROOT, join(folder, "types"));
if (steps.includes("licences"))
  write("licences.txt", licences(ROOT, Object.keys(metafile.inputs), read("package.json")));
if (steps.includes("components"))
  write(
    "components.json",
    `${JSON.stringify(billOfMaterials(read("package-lock.json"), read("package.json")), null, 2)}\n`,
  );
if (steps.includes("manual"))
  write("joulewright.1", execFileSync(process.execPath, [join(folder, "main.js"), "manual"], { encoding: "utf8" }));
