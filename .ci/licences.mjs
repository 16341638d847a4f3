// The licences of everything that is bundled, whole, and the reason for every dependency.
import { existsSync, readdirSync, readFileSync, realpathSync } from "node:fs";
import { join } from "node:path";

const REASONS = JSON.parse(readFileSync(new URL("./reasons.json", import.meta.url), "utf8"));

/** Folders of the packages that the inputs of a bundle lie in. */
function packagesOf(root, inputs) {
  const folders = inputs.flatMap((input) => {
    const found = /^(.*node_modules\/(?:@[^/]+\/)?[^/]+)\//.exec(input.replaceAll("\\", "/"));
    return found === null ? [] : [found[1]];
  });
  return [...new Set(folders)].map((folder) => realpathSync(join(root, folder)));
}

/** Text of a package's licence; null where the package brings none. */
function licenceText(folder) {
  const name = readdirSync(folder).find((file) => /^(licen[cs]e|copying)[^/]*$/i.test(file));
  return name === undefined ? null : readFileSync(join(folder, name), "utf8").trim();
}

/** The wording of the licence that many packages name and do not bring: our own copy of it, with another name. */
const mit = (root, name) =>
  readFileSync(join(root, "LICENSE"), "utf8")
    .trim()
    .replace(/^Copyright.*$/m, `Copyright (c) ${name}`);

const author = ({ author: given }) => (typeof given === "string" ? given : (given?.name ?? "its authors"));

/** Throws when a dependency lacks its reason, a reason its dependency, or a package any word on its licence. */
export function licences(root, inputs, { dependencies }) {
  const [wanted, given] = [Object.keys(dependencies).sort(), Object.keys(REASONS).sort()];
  if (wanted.join() !== given.join()) throw new Error(`reasons for ${given.join()} but dependencies ${wanted.join()}`);
  const direct = wanted
    .map((name) => join(root, "node_modules", name))
    .filter(existsSync)
    .map((path) => realpathSync(path));
  const found = [...new Set([...packagesOf(root, inputs), ...direct])].map((folder) => {
    const about = JSON.parse(readFileSync(join(folder, "package.json"), "utf8"));
    if (typeof about.license !== "string") throw new Error(`${folder}: no licence named`);
    return { about, text: licenceText(folder) };
  });
  const blocks = found
    .sort((a, b) => (a.about.name < b.about.name ? -1 : 1))
    .map(({ about, text }) => {
      const why =
        REASONS[about.name] === undefined ? "needed by one of the others" : `here for: ${REASONS[about.name]}`;
      if (text === null && about.license !== "MIT") throw new Error(`${about.name}: no text of its licence`);
      const words =
        text ?? `(No text comes with the package; this is the one that it names.)\n\n${mit(root, author(about))}`;
      return `${about.name} ${about.version}, ${about.license}\n${why}\n\n${words}\n`;
    });
  return `This program holds or needs the following packages.\n\n${blocks.join(`\n${"-".repeat(72)}\n\n`)}`;
}
