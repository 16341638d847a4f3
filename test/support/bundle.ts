// Builds the program as it ships, into a folder of its own, for tests and benches that run it as a process.
import { cpSync, mkdtempSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join, resolve } from "node:path";
import { build } from "esbuild";

const ROOT = resolve(import.meta.dirname, "../..");

/** Bundles entries (paths from the root) and gives the folder; its caller removes it. */
export async function bundle(entries: Readonly<Record<string, string>>): Promise<string> {
  const folder = mkdtempSync(join(tmpdir(), "bundle-"));
  await build({
    absWorkingDir: ROOT,
    entryPoints: Object.entries(entries).map(([out, path]) => ({ in: path, out })),
    outdir: join(folder, "dist"),
    bundle: true,
    platform: "node",
    target: "node20",
    format: "esm",
    splitting: true,
    chunkNames: "chunks/[name]-[hash]",
    define: { "process.env.NODE_ENV": '"production"' },
    external: ["react-devtools-core"],
    banner: {
      js: "import { createRequire as makeRequire } from 'node:module'; const require = makeRequire(import.meta.url);",
    },
    logLevel: "warning",
  });
  cpSync(join(ROOT, "catalogs"), join(folder, "catalogs"), { recursive: true });
  writeFileSync(join(folder, "package.json"), '{"type":"module"}\n');
  return folder;
}
