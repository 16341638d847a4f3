// Declaration files of the library: those that its contents page reaches, and no others.
import { execFileSync } from "node:child_process";
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { createRequire } from "node:module";
import { tmpdir } from "node:os";
import { dirname, join, resolve } from "node:path";

const IMPORT = /((?:from|import\()\s*")(\.[^"]+)\.tsx?"/g;

/** Writes them below `folder`. Throws with the compiler's own words when the types do not hold. */
export function declarations(root, folder) {
  const { compilerOptions } = JSON.parse(readFileSync(join(root, "tsconfig.json"), "utf8"));
  const options = {
    ...compilerOptions,
    noEmit: false,
    declaration: true,
    emitDeclarationOnly: true,
    rootDir: join(root, "src"),
    outDir: folder,
  };
  // In a folder of its own, so that the sources stay as they are; the tools are found from the root.
  const own = mkdtempSync(join(tmpdir(), "types-"));
  const project = join(own, "tsconfig.json");
  const typeRoots = [join(root, "node_modules/@types")];
  writeFileSync(
    project,
    JSON.stringify({ compilerOptions: { ...options, typeRoots }, files: [join(root, "src/index.ts")] }),
  );
  const bin = join(dirname(createRequire(join(root, "package.json")).resolve("typescript/package.json")), "bin/tsc");
  try {
    execFileSync(process.execPath, [bin, "-p", project], { stdio: ["ignore", "inherit", "inherit"], cwd: root });
  } finally {
    rmSync(own, { recursive: true, force: true });
  }
  keepReached(folder);
}

/** Follows the imports from the contents page, names them as they are when installed, and removes what nothing reaches. */
function keepReached(folder) {
  const reached = new Set();
  const follow = (file) => {
    if (reached.has(file)) return;
    reached.add(file);
    const text = readFileSync(file, "utf8");
    for (const [, , path] of text.matchAll(IMPORT)) follow(resolve(dirname(file), `${path}.d.ts`));
    writeFileSync(file, text.replace(IMPORT, '$1$2.js"'));
  };
  follow(join(folder, "index.d.ts"));
  for (const name of readdirSync(folder, { recursive: true }))
    if (name.endsWith(".d.ts") && !reached.has(join(folder, name))) rmSync(join(folder, name));
}
