// The package's own bill of materials, CycloneDX 1.5: every package that it needs or holds, from the lock file.
//
// No serial number and no time, so that the same lock file gives the same bytes; no address of any registry.

const purl = (name, version) => `pkg:npm/${name.replace("@", "%40")}@${version}`;
const refOf = (name, version) => `${name}@${version}`;

/** An SPDX name, or an expression of several. */
const licenceOf = (text) => [
  /[ ()]/.test(text) ? { expression: text.replace(/^\((.*)\)$/, "$1") } : { license: { id: text } },
];

const hashOf = (integrity) => {
  const found = /sha512-(\S+)/.exec(integrity ?? "");
  return found === null ? [] : [{ alg: "SHA-512", content: Buffer.from(found[1], "base64").toString("hex") }];
};

/** Where the lock file has a package that another asks for: as node looks for it, the nearest folder first. */
function found(packages, from, name) {
  for (let at = from; ; at = at.slice(0, Math.max(0, at.lastIndexOf("node_modules/") - 1))) {
    const key = `${at}${at === "" ? "" : "/"}node_modules/${name}`;
    if (packages[key] !== undefined) return key;
    if (at === "") return null;
  }
}

/** Throws when a package names no licence: then nobody knows whether it may be passed on. */
export function billOfMaterials({ packages }, { name, version, license, description }) {
  const nameAt = (key) => key.slice(key.lastIndexOf("node_modules/") + "node_modules/".length);
  // Reached from the root by what is needed to run, optional peers left out.
  const reached = new Map([["", refOf(name, version)]]);
  const needs = new Map();
  const follow = (key) => {
    const {
      dependencies = {},
      optionalDependencies = {},
      peerDependencies = {},
      peerDependenciesMeta = {},
    } = packages[key];
    const peers = Object.keys(peerDependencies).filter((peer) => !peerDependenciesMeta[peer]?.optional);
    const wanted = [...Object.keys(dependencies), ...Object.keys(optionalDependencies), ...peers];
    const keys = wanted.map((one) => found(packages, key, one)).filter((one) => one !== null);
    needs.set(key, [...new Set(keys)].sort());
    for (const one of keys) {
      if (reached.has(one)) continue;
      reached.set(one, refOf(nameAt(one), packages[one].version));
      follow(one);
    }
  };
  follow("");
  const components = [...reached.keys()]
    .filter((key) => key !== "")
    .sort()
    .map((key) => {
      const one = packages[key];
      if (typeof one.license !== "string") throw new Error(`${key}: no licence named`);
      return {
        type: "library",
        "bom-ref": reached.get(key),
        name: nameAt(key),
        version: one.version,
        scope: "required",
        hashes: hashOf(one.integrity),
        licenses: licenceOf(one.license),
        purl: purl(nameAt(key), one.version),
      };
    });
  const self = {
    type: "application",
    "bom-ref": refOf(name, version),
    name,
    version,
    description,
    licenses: licenceOf(license),
    purl: purl(name, version),
  };
  return {
    bomFormat: "CycloneDX",
    specVersion: "1.5",
    version: 1,
    metadata: { component: self },
    components,
    dependencies: [...needs].map(([key, list]) => ({
      ref: reached.get(key),
      dependsOn: list.map((one) => reached.get(one)),
    })),
  };
}
