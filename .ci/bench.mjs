// Runs the benches: `npm run bench [-- GROUP...]`. In production form, as the program ships: ink's development form keeps a record of every frame.
import { spawnSync } from "node:child_process";
import { buildSync } from "esbuild";

const outfile = "node_modules/.cache/bench.mjs";
const entryPoints = ["test/bench/main.ts"];
buildSync({
  entryPoints,
  outfile,
  bundle: true,
  platform: "node",
  format: "esm",
  packages: "external",
  logLevel: "error",
});
const env = { ...process.env, NODE_ENV: "production" };
process.exit(spawnSync(process.execPath, [outfile, ...process.argv.slice(2)], { stdio: "inherit", env }).status ?? 1);
