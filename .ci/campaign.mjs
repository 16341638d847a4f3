// Runs a long campaign: `npm run campaign -- NAME [ARGUMENTS]`; without a name it lists them. Bundled first, since node 20 reads no types.
import { spawnSync } from "node:child_process";
import { existsSync, readdirSync } from "node:fs";
import { buildSync } from "esbuild";

const [name, ...rest] = process.argv.slice(2);
const source = `test/campaigns/${name}.ts`;
if (name === undefined || !existsSync(source)) {
  const names = readdirSync("test/campaigns").filter((file) => file.endsWith(".ts"));
  console.log(`campaigns: ${names.map((file) => file.slice(0, -3)).join(", ")}; each opens with what it takes`);
  process.exit(name === undefined ? 0 : 2);
}
const outfile = `node_modules/.cache/campaign-${name}.mjs`;
buildSync({
  entryPoints: [source],
  outfile,
  bundle: true,
  platform: "node",
  format: "esm",
  packages: "external",
  logLevel: "error",
});
process.exit(spawnSync(process.execPath, [outfile, ...rest], { stdio: "inherit" }).status ?? 1);
