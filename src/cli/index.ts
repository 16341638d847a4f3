// The command line: what the screens and the entry share with it.
export { besideWords } from "./blendBeside.ts";
export { loosenWords, proofSentence } from "./blendWords.ts";
export { type CautionLine, cautionsOf } from "./cautions.ts";
export { type Files, filesOn } from "./files.ts";
export { titleOf } from "./findingWords.ts";
export { readMeasuredInput } from "./measuredInput.ts";
export { saveOverrides } from "./overrides.ts";
export { placeCsv } from "./placeCsv.ts";
export { type Ports, textWidth } from "./ports.ts";
export { reasonWords } from "./reasonWords.ts";
export { clampWords, withoutBalanceWords } from "./restText.ts";
export { withRecord } from "./settings.ts";
export { rateBlocks } from "./shotRateText.ts";
export type { Source } from "./stock.ts";
export { capacitorValues, type ValueWords, valueText } from "./valueWords.ts";
export { refusalWords } from "./words.ts";
