// What comes with the package: each dependency with its reason and licence, no script at installation, a list of components that is whole.
import { execFileSync, spawnSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { at, ROOT } from "./support/fakePorts.ts";

interface Locked {
  readonly version: string;
  readonly license?: string;
  readonly dev?: boolean;
  readonly devOptional?: boolean;
  readonly hasInstallScript?: boolean;
  readonly integrity?: string;
  readonly resolved?: string;
}
interface Component {
  readonly name: string;
  readonly version: string;
  readonly purl: string;
  readonly "bom-ref": string;
  readonly hashes: readonly { readonly alg: string; readonly content: string }[];
  readonly licenses: readonly unknown[];
}

const json = (path: string) => JSON.parse(readFileSync(at(path), "utf8"));
const PACKAGE = json("package.json");
const LOCK: Readonly<Record<string, Locked>> = json("package-lock.json").packages;
/** What an installation without development brings. */
const shipped = Object.entries(LOCK).filter(([key, one]) => key !== "" && !one.dev && !one.devOptional);

let folder = "";
let licences = "";
let parts: {
  readonly components: readonly Component[];
  readonly dependencies: readonly { readonly ref: string; readonly dependsOn: readonly string[] }[];
};
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "supply-"));
  execFileSync(process.execPath, [at(".ci/build.mjs"), folder, "bundle", "licences", "components"], { cwd: ROOT });
  licences = readFileSync(join(folder, "licences.txt"), "utf8");
  parts = JSON.parse(readFileSync(join(folder, "components.json"), "utf8"));
}, 60_000);
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe("dependencies", () => {
  test("each has its reason in a clause, and is pinned to one version", () => {
    const reasons: Readonly<Record<string, string>> = json(".ci/reasons.json");
    expect(Object.keys(reasons).sort()).toEqual(Object.keys(PACKAGE.dependencies).sort());
    for (const [name, reason] of Object.entries(reasons)) {
      expect(reason.length, name).toBeGreaterThan(15);
      expect(PACKAGE.dependencies[name], name).toMatch(/^\d+\.\d+\.\d+$/);
    }
  });

  test("none runs a script when it is installed", () => {
    expect(shipped.length).toBeGreaterThan(20);
    expect(shipped.filter(([, one]) => one.hasInstallScript).map(([key]) => key)).toEqual([]);
  });

  test("each is locked by its sum, and no registry is named", () => {
    for (const [key, one] of shipped) expect(one.integrity, key).toMatch(/^sha512-/);
    expect(readFileSync(at("package-lock.json"), "utf8")).not.toMatch(/"resolved"|https?:\/\/registry/);
    expect(readFileSync(at(".npmrc"), "utf8")).not.toMatch(/registry/);
  });

  test("licences are ones that let it be passed on under ours, and are named", () => {
    const known = ["MIT", "ISC", "BSD-2-Clause", "BSD-3-Clause", "Apache-2.0", "Unlicense", "0BSD", "(MIT OR CC0-1.0)"];
    expect(shipped.filter(([, one]) => !known.includes(one.license ?? "")).map(([key]) => key)).toEqual([]);
  });
});

describe("licences of what is bundled", () => {
  test("every package whose code is in the bundle is there, with a text that grants something", () => {
    const blocks = licences.split(`\n${"-".repeat(72)}\n`);
    const named = blocks.map((block) =>
      /^(?:This program holds[^\n]*\n\n)?\s*(\S+) (\S+), (\S.*)$/m.exec(block)?.slice(1, 3).join(" "),
    );
    const inside = new Set<string>();
    for (const [, name = ""] of bundleText().matchAll(/^\/\/ \S*node_modules\/((?:@[^/\s]+\/)?[^/\s]+)\//gm))
      inside.add(name);
    expect(inside.size).toBeGreaterThan(10);
    for (const name of inside)
      expect(
        named.some((one) => one?.startsWith(`${name} `)),
        name,
      ).toBe(true);
    for (const block of blocks)
      expect(block, block.slice(0, 80)).toMatch(/permission|permitted|unlicense|redistribution/i);
    expect(licences).not.toMatch(/\/home\/|\/tmp\/|node_modules/);
  });
});

function bundleText(): string {
  return execFileSync("sh", ["-c", `cat "${folder}"/*.js "${folder}"/chunks/*.js`], {
    encoding: "utf8",
    maxBuffer: 1 << 28,
  });
}

describe("list of components", () => {
  test("is every package that an installation brings, once, by the lock file", () => {
    const wanted = shipped.map(([key, one]) => `${key.slice(key.lastIndexOf("node_modules/") + 13)}@${one.version}`);
    const found = parts.components.map((one) => one["bom-ref"]);
    // The lock file also keeps what only an optional peer would need; nothing in it may be missing from a real installation.
    expect(found.filter((ref) => !wanted.includes(ref))).toEqual([]);
    for (const name of Object.keys(PACKAGE.dependencies))
      expect(
        found.some((ref) => ref.startsWith(`${name}@`)),
        name,
      ).toBe(true);
    expect(new Set(found).size).toBe(found.length);
    expect(wanted.filter((ref) => !found.includes(ref))).toEqual([]);
  });

  test("every reference in its tree of needs has its component, and the root needs the dependencies of the package", () => {
    const refs = new Set([`joulewright@${PACKAGE.version}`, ...parts.components.map((one) => one["bom-ref"])]);
    for (const { ref, dependsOn } of parts.dependencies)
      for (const one of [ref, ...dependsOn]) expect(refs.has(one), one).toBe(true);
    const root = parts.dependencies.find(({ ref }) => ref.startsWith("joulewright@"));
    expect(root?.dependsOn.map((ref) => ref.replace(/@[^@]*$/, "")).sort()).toEqual(
      Object.keys(PACKAGE.dependencies).sort(),
    );
  });

  test("names no address, no time and no serial; sums are 512 bits; the same bytes every time", () => {
    const text = readFileSync(join(folder, "components.json"), "utf8");
    expect(text).not.toMatch(/https?:|timestamp|serialNumber/);
    for (const { hashes, licenses, name } of parts.components) {
      expect(hashes[0]?.content, name).toMatch(/^[0-9a-f]{128}$/);
      expect(licenses, name).toHaveLength(1);
    }
    execFileSync(process.execPath, [at(".ci/build.mjs"), join(folder, "again"), "components"], { cwd: ROOT });
    expect(readFileSync(join(folder, "again/components.json"), "utf8")).toBe(text);
  });

  test("agrees with the package manager's own list in everything that it lists", () => {
    const ran = spawnSync(
      "npm",
      ["sbom", "--package-lock-only", "--offline", "--sbom-format", "cyclonedx", "--omit", "dev"],
      { cwd: ROOT, encoding: "utf8" },
    );
    expect(ran.status, ran.stderr).toBe(0);
    const theirs: readonly Component[] = JSON.parse(ran.stdout).components;
    expect(theirs.length).toBeGreaterThan(20);
    const facts = ({ name, version, purl, hashes }: Component) => ({ name, version, purl, hashes });
    const ours = new Map(parts.components.map((one) => [one.purl, facts(one)]));
    // npm 11 leaves out packages that development needs too (commander and zod among them), so that ours may hold more.
    for (const one of theirs) expect(ours.get(one.purl), one.purl).toEqual(facts(one));
  });
});
