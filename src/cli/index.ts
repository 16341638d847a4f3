// The command line: what the screens and the entry share with it.
export { type CautionLine, cautionsOf } from "./cautions.ts";
export { type Files, filesOn } from "./files.ts";
export { titleOf } from "./findingWords.ts";
export { readMeasuredInput } from "./measuredInput.ts";
export { placeCsv } from "./placeCsv.ts";
export { type Ports, textWidth } from "./ports.ts";
export { clampWords, withoutBalanceWords } from "./restText.ts";
export { rateBlocks } from "./shotRateText.ts";
export { refusalWords } from "./words.ts";
