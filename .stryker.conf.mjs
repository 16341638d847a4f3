// Mutation testing, one layer at a time: LAYER=quantity npx stryker run .stryker.conf.mjs
const layer = process.env.LAYER ?? "quantity";
const files = process.env.FILES ?? `src/${layer}/**/*.ts`;
const cache = `node_modules/.cache/mutation/${layer.replaceAll("/", "-")}`;

export default {
  testRunner: "vitest",
  plugins: ["@stryker-mutator/vitest-runner"],
  vitest: { dir: `test/${layer}`, related: false },
  mutate: [files, "!src/**/index.ts"],
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
