// Mutation testing. A layer by all its tests: LAYER=quantity npx stryker run .stryker.conf.mjs
// One file by its own test alone, which is quicker and stricter: ONE=bank/share npx stryker run .stryker.conf.mjs
const one = process.env.ONE;
const layer = one === undefined ? (process.env.LAYER ?? "quantity") : one.slice(0, one.lastIndexOf("/"));
const cache = `node_modules/.cache/mutation/${(one ?? layer).replaceAll("/", "-")}`;

export default {
  testRunner: "vitest",
  plugins: ["@stryker-mutator/vitest-runner"],
  vitest: { configFile: ".stryker.vitest.mjs", dir: one === undefined ? `test/${layer}` : "test", related: false },
  mutate: one === undefined ? [`src/${layer}/**/*.ts`, "!src/**/index.ts"] : [`src/${one}.ts`],
  ignorePatterns: ["dist", ".git"],
  tempDirName: `${cache}/work`,
  incremental: true,
  incrementalFile: `${cache}/known.json`,
  concurrency: 1,
  coverageAnalysis: "perTest",
  // A file that is not there: the rewriter of type-checker settings does not know the installed compiler.
  tsconfigFile: "tsconfig.not-for-mutation.json",
  reporters: ["clear-text", "json"],
  clearTextReporter: { allowColor: false, logTests: false, reportTests: false, reportMutants: true },
  jsonReporter: { fileName: `${cache}/report.json` },
  timeoutMS: 4000,
};
