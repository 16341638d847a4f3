// The package as it ships: built, packed, and unpacked into the modules of a small consumer; nothing is fetched.
import { execFileSync } from "node:child_process";
import { cpSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, symlinkSync, writeFileSync } from "node:fs";
import { createRequire } from "node:module";
import { tmpdir } from "node:os";
import { dirname, join, resolve } from "node:path";

const ROOT = resolve(import.meta.dirname, "../..");

export interface Packed {
  /** Folder of the consumer; its caller removes it. */
  readonly folder: string;
  /** The installed package. */
  readonly installed: string;
  /** Names of the files in the package. */
  readonly files: readonly string[];
}

/** Builds beside the sources, so that no other test sees a half-built folder. */
export function packed(): Packed {
  const folder = mkdtempSync(join(tmpdir(), "consumer-"));
  const stage = join(folder, "stage");
  const about = JSON.parse(readFileSync(join(ROOT, "package.json"), "utf8"));
  mkdirSync(stage);
  for (const name of ["package.json", ...about.files.filter((name: string) => name !== "dist")])
    cpSync(join(ROOT, name), join(stage, name), { recursive: true });
  execFileSync(process.execPath, [join(ROOT, ".ci/build.mjs"), join(stage, "dist")], {
    stdio: ["ignore", "ignore", "inherit"],
  });
  execFileSync("npm", ["pack", "--ignore-scripts", "--offline", "--pack-destination", folder], {
    cwd: stage,
    stdio: "ignore",
  });
  const tarball = readdirSync(folder).find((name) => name.endsWith(".tgz"));
  if (tarball === undefined) throw new Error("npm pack wrote nothing");
  const modules = join(folder, "node_modules");
  const installed = join(modules, about.name);
  mkdirSync(installed, { recursive: true });
  execFileSync("tar", ["-xzf", join(folder, tarball), "-C", installed, "--strip-components=1"]);
  // What an installation would bring: the production dependencies and no others.
  for (const name of Object.keys(about.dependencies))
    symlinkSync(join(ROOT, "node_modules", name), join(modules, name));
  rmSync(stage, { recursive: true });
  writeFileSync(join(folder, "package.json"), '{"type":"module","private":true}\n');
  const files = readdirSync(installed, { recursive: true, encoding: "utf8" }).map((name) => name.replaceAll("\\", "/"));
  return { folder, installed, files };
}

/** Type-checks files of the consumer as strictly as there is; the compiler's words, empty when all is well. */
export function typeFaults({ folder }: Packed, files: readonly string[]): string {
  const compilerOptions = {
    target: "ES2023",
    // Of what a browser has, zod's own declarations name URL; nothing of Node is here.
    lib: ["ES2023", "DOM"],
    module: "NodeNext",
    moduleResolution: "NodeNext",
    strict: true,
    exactOptionalPropertyTypes: true,
    noUncheckedIndexedAccess: true,
    // The declarations themselves are checked too.
    skipLibCheck: false,
    types: [],
    noEmit: true,
  };
  writeFileSync(join(folder, "tsconfig.json"), JSON.stringify({ compilerOptions, files }));
  const bin = join(dirname(createRequire(join(ROOT, "package.json")).resolve("typescript/package.json")), "bin/tsc");
  try {
    execFileSync(process.execPath, [bin, "-p", folder], { encoding: "utf8" });
    return "";
  } catch (error) {
    return String((error as { readonly stdout?: string }).stdout);
  }
}
